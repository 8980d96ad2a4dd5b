import { describe, expect, it } from "vitest";
import { beltRouteAddress } from "../../../client/features/families/beltRouteAddress";
import { beltCodec } from "../../../client/features/gauges/belt-route/beltCodec";
import { solveState } from "../../../client/features/gauges/belt-route/solveState";

const wheel = (id: string, xMm: number, yMm: number, diameterMm: number) =>
  ({ id, role: "pulley", label: `The ${id}`, xMm, yMm, diameterMm }) as const;
const map = {
  widthMm: 300,
  heightMm: 200,
  wheels: [wheel("motor", 50, 100, 16), wheel("flywheel", 200, 90, 80), wheel("idler", 120, 180, 20)],
  belts: [
    { wheels: ["motor", "flywheel", "idler"], label: "main belt" },
    { wheels: ["motor", "nowhere"], label: "lost belt" },
  ],
};
const read = (address: string | null) =>
  beltCodec.read(new URL(address ?? "", "http://idlewright.example").searchParams);

describe("beltRouteAddress", () => {
  it("lays the wheels of the plan out on the board, y upwards, in an order that closes", () => {
    const state = read(beltRouteAddress(map, "main belt", [], "some-family"));
    expect(state.pulleys).toHaveLength(3);
    expect(state.pulleys.find(({ name }) => name === "The idler")).toMatchObject({ x: 120, y: -180, diameter: 20 });
    expect(solveState(state, "mm").route?.wrapsDeg.reduce((sum, wrap) => sum + wrap)).toBeCloseTo(360, 9);
    expect(state.handedOn.family).toBe("some-family");
  });

  it("takes the kind of belt from the service point of the same name", () => {
    const place = { id: "a", number: 1, note: "", xMm: 0, yMm: 0, sizes: {}, partCount: 0 };
    const point = { ...place, name: "main belt", partKind: "round-belt" as const };
    expect(read(beltRouteAddress(map, "main belt", [point], "f")).kind).toBe("round-belt");
    expect(read(beltRouteAddress(map, "main belt", [], "f")).kind).toBe("flat-belt");
  });

  it("gives nothing for a belt whose wheels are not known", () => {
    expect(beltRouteAddress(map, "lost belt", [], "f")).toBeNull();
    expect(beltRouteAddress(map, "no such belt", [], "f")).toBeNull();
  });
});
