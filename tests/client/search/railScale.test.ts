import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { intoLanes, zoomed } from "../../../client/features/search/railScale";

describe("intoLanes", () => {
  it("never lets two things of one lane come nearer than the gap", () => {
    const thing = fc.tuple(fc.integer({ min: 0, max: 500 }), fc.integer({ min: 1, max: 60 })).map(([from, length]) => ({
      fromPx: from,
      toPx: from + length,
    }));
    fc.assert(
      fc.property(fc.array(thing, { maxLength: 40 }), (things) => {
        const lanes = intoLanes(things, 3, 4);
        for (const [i, a] of things.entries()) {
          for (const [j, b] of things.entries()) {
            if (i >= j || lanes[i] === null || lanes[i] !== lanes[j]) continue;
            expect(a.toPx + 4 <= b.fromPx || b.toPx + 4 <= a.fromPx).toBe(true);
          }
        }
      }),
      { seed: 7 },
    );
  });
  it("gives null where every lane is taken", () => {
    const same = { fromPx: 0, toPx: 10 };
    expect(intoLanes([same, same, same], 2)).toEqual([0, 1, null]);
  });
});

describe("zoomed", () => {
  it("stays inside and keeps its width at an end", () => {
    expect(zoomed({ fromMm: 40, toMm: 50 }, 49.9, 4)).toEqual({ fromMm: 46, toMm: 50 });
    expect(zoomed({ fromMm: 40, toMm: 50 }, 45, 40)).toEqual({ fromMm: 40, toMm: 50 });
  });
});
