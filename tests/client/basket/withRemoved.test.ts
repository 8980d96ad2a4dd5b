import { describe, expect, it } from "vitest";
import { withRemoved } from "../../../client/features/basket/withRemoved";
import { belt, kadeWorks, lineOf, northMoor, parcelOf, wheel } from "./fixtures";

const titles = (sections: ReturnType<typeof withRemoved>) =>
  sections.map(({ workshop, parcel, entries }) => [
    workshop.name,
    parcel !== null,
    entries.map(({ line, isRemoved }) => (isRemoved ? `(${line.part.title})` : line.part.title)),
  ]);

describe("lines that were taken out", () => {
  const removed = { line: lineOf(wheel), workshop: northMoor, index: 0 };

  it("stand where they stood", () => {
    const parcels = [parcelOf(northMoor, [lineOf(belt)])];
    expect(titles(withRemoved(parcels, [removed]))).toEqual([
      ["North Moor Rubber", true, [`(${wheel.title})`, belt.title]],
    ]);
  });

  it("keep a section for a workshop that has nothing else", () => {
    const parcels = [parcelOf(kadeWorks, [lineOf(belt)])];
    expect(titles(withRemoved(parcels, [removed]))).toEqual([
      ["Kade Works", true, [belt.title]],
      ["North Moor Rubber", false, [`(${wheel.title})`]],
    ]);
  });

  it("are gone once the part lies in the basket again", () => {
    const parcels = [parcelOf(northMoor, [lineOf(wheel, 3)])];
    expect(titles(withRemoved(parcels, [removed]))).toEqual([["North Moor Rubber", true, [wheel.title]]]);
  });
});
