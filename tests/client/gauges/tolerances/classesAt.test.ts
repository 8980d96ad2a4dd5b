import { describe, expect, it } from "vitest";
import { conformanceProbability } from "#shared/domain/conformance";
import { classesAt } from "../../../../client/features/gauges/tolerances/classesAt";
import { magnificationFor, magnificationWords } from "../../../../client/features/gauges/tolerances/magnification";
import {
  mouldedSizes,
  readPlace,
  type ToleranceState,
  toleranceCodec,
} from "../../../../client/features/gauges/tolerances/toleranceState";
import table from "../../../reference/iso3302Table.json";

const example = toleranceCodec.read(new URLSearchParams());
const at = (change: Partial<ToleranceState>) => classesAt({ ...example, ...change }, "mm");

describe("classesAt", () => {
  it("gives all four classes of the table's row, fixed and closure (ISO 3302-1:2014 Table 1)", () => {
    const row = table.rows.find(([above, upTo]) => above! < 44.1 && 44.1 <= upTo!)!;
    const fixed = at({ size: "44.1" }).result!;
    expect(fixed.classes.map(({ plusMinusMm }) => plusMinusMm)).toEqual([row[2], row[4], row[6], row[8]]);
    expect(fixed.range).toEqual([40, 63]);
    const closure = at({ size: "44.1", mould: "closure" }).result!;
    expect(closure.classes.map(({ plusMinusMm }) => plusMinusMm)).toEqual([row[3], row[5], row[7], row[9]]);
  });
  it("takes the chance of each class in the usual band, with its half width over root three", () => {
    const { classes, band } = at({ size: "44.1" }).result!;
    expect(band).toEqual({ lowerMm: 43.6, upperMm: 44.6 });
    for (const { plusMinusMm, chance } of classes) {
      const { lowerMm, upperMm } = band!;
      expect(chance).toBe(conformanceProbability(44.1, plusMinusMm / Math.sqrt(3), { lowerMm, upperMm }));
    }
    expect(classes.map(({ chance }) => Math.round(chance! * 100))).toEqual([100, 97, 72, 41]);
  });
  it("lays the band around the size that is needed, where that is another", () => {
    const { needMm, band, classes } = at({ size: "44.1", need: "44.6" }).result!;
    expect(needMm).toBe(44.6);
    expect(band?.lowerMm).toBeCloseTo(44.1, 9);
    expect(classes[0]!.chance).toBeCloseTo(0.5, 2);
  });
  it("has no chance without a place", () => {
    const { band, classes } = at({ place: null }).result!;
    expect(band).toBeNull();
    expect(classes.every(({ chance }) => chance === null)).toBe(true);
  });
  it("knows which sizes have the rubber around them", () => {
    const inside = (place: string) => at({ place: readPlace(place) }).result!.isInside;
    expect(inside("drive-ring.insideDiameter")).toBe(true);
    expect(inside("flat-belt.insideCircumference")).toBe(true);
    expect(inside("idler-wheel.outsideDiameter")).toBe(false);
  });
  it.each([
    ["size", { size: "" }],
    ["size", { size: "0" }],
    ["size", { size: "1e9" }],
    ["size", { size: "44 furlongs" }],
    ["need", { need: "x" }],
  ])("names the field that is wrong: %s of %o", (field, change) => {
    const { result, errors } = at(change);
    expect(result).toBeNull();
    expect(Object.keys(errors)).toEqual([field]);
  });
  it.each(["0.01", "160", "160.001", "10000"])("answers %s mm in finite numbers", (size) => {
    const { classes } = at({ size }).result!;
    for (const { plusMinusMm, chance } of classes) {
      expect(Number.isFinite(plusMinusMm)).toBe(true);
      expect(chance).toBeGreaterThanOrEqual(0);
    }
  });
});

describe("magnificationFor", () => {
  it.each([
    [3.4, 760, 50],
    [3.4, 358, 20],
    [300, 358, 0.2],
  ])("%d mm find room in %d px %d times life size, and would not at the next step", (mm, px, times) => {
    const scale = magnificationFor(mm, px);
    expect(scale.times).toBeCloseTo(times, 9);
    expect(mm * scale.pxPerMm).toBeLessThanOrEqual(px);
    expect(mm * scale.pxPerMm * 2.5).toBeGreaterThan(px);
  });
  it("is told in words", () => {
    expect([20, 1, 0.2].map(magnificationWords)).toEqual(["20 times life size", "life size", "1/5 of life size"]);
  });
});

describe("the address of the tolerance gauge", () => {
  const roundTrip = (address: string) =>
    toleranceCodec.write(toleranceCodec.read(new URLSearchParams(address))).toString();
  it.each([
    "size=44.1+mm&place=idler-wheel.outsideDiameter&need=44.2+mm&hardness=50&reading=57",
    "size=7%2F8+in&across=closure",
  ])("comes back as it was: %s", (address) => expect(roundTrip(address)).toBe(address));
  it("falls back where it cannot be read", () => {
    const read = toleranceCodec.read(new URLSearchParams("size=much&across=up&place=hat.brim&hardness=soft"));
    expect(read).toEqual({ ...example, place: null });
  });
  it("knows moulded sizes only: a bore is metal", () => {
    expect(mouldedSizes("idler-wheel")).toEqual(["outsideDiameter", "treadWidth", "secondTreadDiameter"]);
    expect(mouldedSizes("clutch-felt")).toEqual([]);
    expect(readPlace("idler-wheel.bore")).toBeNull();
  });
});
