import { describe, expect, it } from "vitest";
import { errorSentence, semitoneWords, signed } from "../../../../client/features/gauges/speed/errorWords";
import { centMarks, limitsOf, rangeFor } from "../../../../client/features/gauges/speed/scaleMarks";

describe("the scale of errors", () => {
  it("is wide enough for the limits and for the error", () => {
    expect(rangeFor(0, limitsOf("record"))).toBe(2);
    expect(rangeFor(0, limitsOf("tape"))).toBe(5);
    expect(rangeFor(-20, limitsOf("record"))).toBe(30);
    expect(rangeFor(1e40, limitsOf("record"))).toBe(10_000);
  });

  it.each([2, 5, 30, 100, 10_000])(
    "has marks of cents that do not touch, with zero among them: ±%d percent",
    (range) => {
      const marks = centMarks(range, 276);
      expect(marks.map(({ cents }) => cents)).toContain(0);
      expect(marks.length).toBeGreaterThan(1);
      const px = marks.map(({ percent }) => (percent / range) * 138);
      for (const [i, x] of px.slice(1).entries()) expect(x - px[i]!).toBeGreaterThanOrEqual(43.9);
      expect(Math.max(...px)).toBeLessThanOrEqual(138);
    },
  );

  it("marks 100 cents at 5.946 %", () => {
    expect(centMarks(10, 276).find(({ cents }) => cents === 100)!.percent).toBeCloseTo(5.946309436, 9);
  });
});

describe("an error in words", () => {
  it.each([
    [0.004, 0.07, "Just right."],
    [0.31, 5.4, "0.31 % fast: about a twentieth of a semitone sharp."],
    [3.2, 54.5, "3.2 % fast: about half a semitone sharp."],
    [-5.9, -105, "5.9 % slow: about a semitone flat."],
    [20, 315.64, "20.0 % fast: about 3 semitones sharp."],
    [-50, -1200, "50.0 % slow: about an octave flat."],
    [1e40, 1e5, "More than ten times too fast."],
  ])("%d percent, %d cents", (percent, cents, words) =>
    expect(errorSentence(percent, cents).replace("\u00a0", " ")).toBe(words),
  );

  it("counts half semitones", () => {
    expect(semitoneWords(149)).toBe("about 1½ semitones");
    expect(semitoneWords(-2400)).toBe("about 2 octaves");
  });

  it("has a sign on all but nothing", () => {
    expect([1.345, -0.26, 0, -0.001].map((value) => signed(value))).toEqual(["+1.35", "−0.26", "0.00", "0.00"]);
  });
});
