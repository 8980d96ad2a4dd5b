import { describe, expect, it } from "vitest";
import { beltOutline } from "#shared/domain/beltOutline";
import { type BeltRouteInput, beltRouteLimits, solveBeltRoute } from "#shared/domain/beltRoute";
import { layouts, pulley, route } from "./layouts";

const words = (input: BeltRouteInput) => solveBeltRoute(input).warnings.map((warning) => warning.words);
const pair = [pulley(0, 0, 20), pulley(100, 0, 40)];

describe("the belt to buy", () => {
  it("is pitch length / (1 + stretch) - pi x thickness; the shortest belongs to the largest stretch", () => {
    const { pitchLengthMm, insideCircumferenceMm } = solveBeltRoute(route(pair, 1.2, 3, 6));
    expect(insideCircumferenceMm.min).toBeCloseTo(pitchLengthMm / 1.06 - Math.PI * 1.2, 10);
    expect(insideCircumferenceMm.mid).toBeCloseTo(pitchLengthMm / 1.045 - Math.PI * 1.2, 10);
    expect(insideCircumferenceMm.max).toBeCloseTo(pitchLengthMm / 1.03 - Math.PI * 1.2, 10);
  });

  it("with no stretch is the inner face in place, also with a pulley on the back", () => {
    const pulleys = layouts["one on the back"]!;
    const { insideCircumferenceMm, spansMm, wrapsDeg } = solveBeltRoute(route(pulleys, 1.2));
    // The inner face: bare radius under the belt where it is inside, a thickness further out where it is on the back.
    const inner = wrapsDeg.map((wrap, i) => {
      const { diameter, wrap: side } = pulleys[i]!;
      return ((diameter / 2 + (side === "back" ? 1.2 : 0)) * wrap * Math.PI) / 180;
    });
    const total = [...spansMm, ...inner].reduce((sum, mm) => sum + mm, 0);
    expect(insideCircumferenceMm.mid).toBeCloseTo(total, 9);
  });
});

describe("sense", () => {
  it("two inside pulleys and an idler: the run that the order puts it on", () => {
    // Below the lower run, reached by the belt only where the order runs from left to right below.
    const [left, idler, right] = [pulley(0, 0, 60), pulley(100, -28, 20, "back"), pulley(200, 0, 60)];
    const below = solveBeltRoute(route([left, idler, right]));
    const turned = solveBeltRoute(route([right, idler, left]));
    expect(turned.pitchLengthMm).toBeCloseTo(below.pitchLengthMm, 9);
    expect(below.wrapsDeg[1]).toBeGreaterThan(1);
    expect(below.isCrossed).toBe(false);
  });

  it("tells who turns against the inside pulleys", () => {
    expect(solveBeltRoute(route(layouts["one on the back"]!)).turns).toEqual(["same", "opposite", "same", "same"]);
  });

  it("a pulley that the belt only just touches has a wrap of 0, whichever way the rounding falls", () => {
    for (const turn of [0, 0.1, 0.7, 1.3, 2.9, 4.4]) {
      const at = (x: number) => pulley(x * Math.cos(turn), x * Math.sin(turn), 30);
      const { wrapsDeg, warnings } = solveBeltRoute(route([at(0), at(70), at(200)]));
      expect(wrapsDeg[1]).toBe(0);
      expect(warnings).toEqual([{ pulley: 1, words: expect.stringContaining("only 0.0° of wrap") }]);
    }
  });
});

describe("refusals", () => {
  const far = beltRouteLimits.place[1] + 1;
  it.each<[string, BeltRouteInput, string, string]>([
    ["one pulley", route([pulley(0, 0, 10)]), "pulleys", "from 2 to 24"],
    ["25 pulleys", route(Array.from({ length: 25 }, (_, i) => pulley(20 * i, 0, 10))), "pulleys", "from 2 to 24"],
    ["a place far away", route([pulley(0, 0, 10), pulley(far, 0, 10)]), "pulleys/1/x", "10000"],
    ["a place that is no number", route([pulley(0, Number.NaN, 10), pulley(30, 0, 10)]), "pulleys/0/y", "10000"],
    ["a diameter of 0", route([pulley(0, 0, 10), pulley(30, 0, 0)]), "pulleys/1/diameter", "from 0.1 to 5000"],
    ["a thickness below 0", route(pair, -1), "thickness", "from 0 to 50"],
    ["stretch below 0", route(pair, 1, -1, 3), "stretchPercent/min", "from 0 to 100"],
    ["stretch over 100", route(pair, 1, 3, 101), "stretchPercent/max", "from 0 to 100"],
    ["stretch the wrong way round", route(pair, 1, 6, 3), "stretchPercent/max", "must not be less"],
    ["one centre for both", route([pulley(5, 5, 10), pulley(5, 5, 10)]), "pulleys/1", "Pulleys 1 and 2 overlap"],
    ["overlap", route([pulley(0, 0, 20), pulley(90, 0, 20), pulley(0, 19.9, 20)]), "pulleys/2", "1 and 3 overlap"],
    ["no room", route([pulley(0, 0, 20), pulley(21, 0, 20, "back")], 1.2), "pulleys/1", "no room for the belt"],
    ["thick and short", route([pulley(0, 0, 0.1), pulley(1, 0, 0.1)], 50, 0, 100), "thickness", "too thick"],
    ["all on the back", route(pair.map((one) => ({ ...one, wrap: "back" }))), "pulleys/0", "wrong way round"],
    [
      "a pulley inside the loop of the others",
      route([pulley(0, 0, 20), pulley(100, 0, 20), pulley(50, 30, 10), pulley(50, 90, 20)]),
      "pulleys/2",
      "does not touch pulley 3",
    ],
    [
      "an order that crosses over",
      route([pulley(0, 0, 20), pulley(100, 100, 20), pulley(100, 0, 20), pulley(0, 100, 20)]),
      "pulleys/1",
      "its place in the order",
    ],
  ])("%s", (_name, input, field, text) => {
    expect(() => solveBeltRoute(input)).toThrow(
      expect.objectContaining({ field, words: expect.stringContaining(text) }),
    );
  });

  it("an idler that hangs free of two pulleys, wherever it hangs", () => {
    for (const y of [-45, -80, -200, 45, 80]) {
      const hanging = route([pulley(0, 0, 60), pulley(100, y, 20, "back"), pulley(200, 0, 60)]);
      expect(() => solveBeltRoute(hanging)).toThrow(expect.objectContaining({ field: "pulleys/1" }));
    }
  });

  it("pulleys that touch are no overlap", () => {
    expect(solveBeltRoute(route([pulley(0, 0, 20), pulley(20, 0, 20)])).pitchLengthMm).toBeCloseTo(
      40 + 20 * Math.PI,
      9,
    );
  });
});

describe("crossed belts", () => {
  it("two on each side of the crossing close with no turn in all", () => {
    const pulleys = [pulley(0, 0, 20), pulley(0, 60, 20), pulley(200, 0, 20, "back"), pulley(200, 60, 20, "back")];
    const { isCrossed, wrapsDeg, warnings } = solveBeltRoute(route(pulleys));
    expect(isCrossed).toBe(true);
    expect(wrapsDeg[0]! + wrapsDeg[1]! - wrapsDeg[2]! - wrapsDeg[3]!).toBeCloseTo(0, 9);
    expect(warnings.at(-1)).toEqual({ pulley: null, words: expect.stringContaining("rubs on itself") });
  });
});

describe("warnings", () => {
  it("little wrap to drive with: under 90 degrees inside, under 30 on the back", () => {
    const { warnings } = solveBeltRoute(route(layouts["one on the back"]!, 1.2));
    expect(warnings).toEqual([
      { pulley: 1, words: expect.stringContaining("Pulley 2 has only 12° of wrap") },
      { pulley: 3, words: expect.stringContaining("Pulley 4 has only 85° of wrap") },
    ]);
    const pressed = [pulley(0, 0, 40), pulley(100, 0, 24, "back"), pulley(200, 0, 40)];
    expect(solveBeltRoute(route(pressed)).wrapsDeg[1]).toBeGreaterThan(30);
    expect(words(route(pressed))).toEqual([]);
  });
  it("none for a right angle", () => {
    expect(words(route([pulley(0, 0, 18), pulley(130, 0, 18), pulley(130, 70, 18), pulley(0, 70, 18)]))).toEqual([]);
  });
  it("a pulley that is small against the thickness", () => {
    expect(words(route([pulley(0, 0, 40), pulley(100, 0, 7.9)], 2))).toEqual([
      expect.stringContaining("less than 4 times"),
    ]);
    expect(words(route([pulley(0, 0, 40), pulley(100, 0, 8)], 2))).toEqual([]);
  });
  it("a straight part that runs into a pulley", () => {
    // The third is reached from the right; the belt from 1 to 2 would have to go through it.
    const wide = [pulley(0, 0, 20), pulley(200, 0, 20), pulley(100, 12, 60)];
    expect(words(route(wide))).toContain("The belt from 1 to 2 runs into pulley 3.");
  });
  it("a belt that lies against itself", () => {
    const pinched = (diameter: number) => [pulley(0, 0, 40), pulley(100, -1, diameter, "back"), pulley(200, 0, 40)];
    expect(words(route(pinched(33), 2))).toEqual([]);
    expect(words(route(pinched(39), 2))).toEqual([expect.stringContaining("The belt touches itself: 3 to 1")]);
  });
  it("a belt that crosses itself without being a crossed belt", () => {
    const through = [pulley(0, 0, 20), pulley(100, 3, 40, "back"), pulley(200, 0, 20)];
    expect(words(route(through))).toContain("The belt crosses itself: 1 to 2 and 3 to 1.");
  });
});

describe("beltOutline", () => {
  it("draws arcs the way that each pulley turns", () => {
    const { contacts } = solveBeltRoute(route([pulley(0, 0, 20), pulley(100, 0, 20)]));
    const path = beltOutline(contacts).replace(/-?\d+\.?\d*(e-\d+)?/g, (text) => String(Math.round(Number(text)) + 0));
    expect(path).toBe("M0 10A10 10 0 0 1 0 -10L100 -10A10 10 0 0 1 100 10Z");
  });
});
