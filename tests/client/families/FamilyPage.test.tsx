import { screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import type { FamilyPage as Answer } from "#shared/schemas/catalogue";
import { beltPath } from "../../../client/features/families/beltPath";
import { matching } from "../../../client/features/families/FamilyListPage";
import { FamilyPage } from "../../../client/features/families/FamilyPage";
import { numberPlaces } from "../../../client/features/families/numberPlaces";
import { renderAt } from "../support/renderAt";
import { stubApi } from "../support/stubApi";

const family: Answer = {
  slug: "test-one",
  name: "Test One",
  maker: "Testmaker",
  kind: "record-changer",
  servicePointCount: 1,
  models: ["Parlour 1"],
  about: "",
  driveTrain: "Motor to idler to rim.",
  driveMap: { widthMm: 300, heightMm: 200, wheels: [], belts: [] },
  servicePoints: [
    {
      id: "a",
      number: 1,
      name: "platter idler",
      partKind: "idler-wheel",
      note: "",
      xMm: 90,
      yMm: 80,
      sizes: { bore: { nominalMm: 4, lowerMm: 3.97, upperMm: 4.05 } },
      partCount: 3,
    },
  ],
};

describe("the page of a family", () => {
  it("leads from a number in the plan to its service point, and on to the parts for it", async () => {
    stubApi({ "/families/test-one": () => ({ body: family }) });
    renderAt("/families/test-one", { "/families/:slug": <FamilyPage />, "/find": null });
    await userEvent.click(await screen.findByRole("button", { name: /^1.*platter idler$/ }));
    const parts = screen.getByRole("link", { name: "Parts for the platter idler: 3" });
    expect(parts).toHaveFocus();
    expect(within(parts.closest("li")!).getByText("takes 3.97 to 4.05")).toBeInTheDocument();
    await userEvent.click(parts);
    expect(screen.getByLabelText("address")).toHaveTextContent("/find?family=test-one&kind=idler-wheel");
  });
});

describe("matching", () => {
  it("finds by name, maker or model, whatever the case and the accents", () => {
    const plain = { ...family, name: "Östholm", models: ["Table 12"] };
    expect(matching([plain], "osthol TABLE")).toHaveLength(1);
    expect(matching([plain], "osthol chair")).toHaveLength(0);
  });
});

describe("numberPlaces", () => {
  it("keeps numbers of service points at one place from covering each other", () => {
    const points = ["a", "b", "c"].map((id) => ({ id, xMm: 10, yMm: 10 }));
    const spots = [...numberPlaces(points, 2).values()];
    for (const [i, one] of spots.entries()) {
      for (const other of spots.slice(i + 1)) {
        expect(Math.hypot(one.dx - other.dx, one.dy - other.dy)).toBeGreaterThanOrEqual(32);
      }
    }
  });
});

describe("beltPath", () => {
  const wheel = (id: string, xMm: number, diameterMm: number) =>
    ({ id, role: "pulley", label: id, xMm, yMm: 0, diameterMm }) as const;

  it("runs straight between two equal wheels, half around each", () => {
    const numbers = [...beltPath([wheel("a", 0, 20), wheel("b", 100, 20)]).matchAll(/-?\d+(?:\.\d+)?(?:e-?\d+)?/g)].map(
      Number,
    );
    expect(Math.max(...numbers.map(Math.abs))).toBeCloseTo(100, 9);
    expect(numbers.filter((n) => Math.abs(Math.abs(n) - 10) < 1e-9).length).toBeGreaterThanOrEqual(6);
  });
  it("is not drawn where one wheel lies within the other", () => {
    expect(beltPath([wheel("a", 0, 100), wheel("b", 10, 20)])).toBe("");
  });
});
