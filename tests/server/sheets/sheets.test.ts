import { beforeAll, describe, expect, it } from "vitest";
import { writePdf } from "#server/sheets/writePdf";
import { beltRulerSheet } from "#shared/drawing/sheets/beltRulerSheet";
import { papers } from "#shared/drawing/sheets/papers";
import { ringGaugeSheet } from "#shared/drawing/sheets/ringGaugeSheet";
import type { Sheet } from "#shared/drawing/sheets/Sheet";
import { strobeSheet } from "#shared/drawing/sheets/strobeSheet";
import { type DrawnPath, readPdf } from "./readPdf";

const now = new Date("2026-03-01T12:00:00Z");
const speeds = [50 / 3, 100 / 3, 45, 78];
/** What a coordinate loses on its way: 1e-6 point written, single precision read. */
const lost = 1e-4;
const read = async (sheet: Sheet) => readPdf(await writePdf(sheet, now));

const kinds = (["a4", "letter"] as const).flatMap((paper) => [
  { name: `disc, ${paper}`, paper, sheet: strobeSheet({ mainsHz: 50, speeds, spindleMm: 7.2, paper }) },
  { name: `ring gauge, ${paper}`, paper, sheet: ringGaugeSheet({ largestMm: 180, stepMm: 1, paper }) },
  { name: `belt ruler, ${paper}`, paper, sheet: beltRulerSheet({ longestMm: 800, paper }) },
]);

/** Filled rectangles of exactly this size. */
const rectangles = (paths: readonly DrawnPath[], width: number, height: number) =>
  paths.filter(({ isFilled, pieces: [piece, ...rest] }) => {
    if (!isFilled || !piece || rest.length > 0 || piece.points.length !== 4) return false;
    return Math.abs(piece.right - piece.left - width) < lost && Math.abs(piece.bottom - piece.top - height) < lost;
  });

describe.each(kinds)("$name", ({ paper, sheet }) => {
  let written: Buffer;
  let pages: Awaited<ReturnType<typeof readPdf>>;
  beforeAll(async () => {
    written = await writePdf(sheet, now);
    pages = await readPdf(written);
  });

  it("has the size of the paper, and on every page bars of 100 mm and 4 in, both ways", () => {
    expect(pages.length).toBe(sheet.pages.length);
    for (const { widthMm, heightMm, paths, text } of pages) {
      expect(widthMm).toBeCloseTo(papers[paper].widthMm, 3);
      expect(heightMm).toBeCloseTo(papers[paper].heightMm, 3);
      for (const length of [100, 101.6]) {
        expect(rectangles(paths, length, 1.3).length, `${length} mm across`).toBe(1);
        expect(rectangles(paths, 1.3, length).length, `${length} mm up the page`).toBe(1);
      }
      expect(text).toContain("100 mm from end to end");
      expect(text.replaceAll("\n", " ")).toContain("with a calliper before you trust this sheet");
      expect(text.replaceAll("\u00a0", " ").replaceAll("\n", " ")).toMatch(/100 %.*no fit to page/);
    }
  });

  it("draws nothing nearer to the edge than a printer reaches", () => {
    for (const { widthMm, heightMm, paths } of pages) {
      const all = paths.flatMap(({ pieces }) => pieces);
      expect(all.length).toBeGreaterThan(20);
      expect(Math.min(...all.map(({ left }) => left))).toBeGreaterThanOrEqual(10 - lost);
      expect(Math.min(...all.map(({ top }) => top))).toBeGreaterThanOrEqual(10 - lost);
      expect(Math.max(...all.map(({ right }) => right))).toBeLessThanOrEqual(widthMm - 10 + lost);
      expect(Math.max(...all.map(({ bottom }) => bottom))).toBeLessThanOrEqual(heightMm - 10 + lost);
    }
  });

  it("is the same bytes twice, and embeds its type", async () => {
    expect(written.equals(await writePdf(sheet, now))).toBe(true);
    const raw = written.toString("latin1");
    expect(raw).toMatch(/^%PDF-1\.7/);
    expect(raw).toContain("/PrintScaling /None");
    expect(raw).toContain("/FontFile2");
    expect(raw).toMatch(/\+WorkSans-SemiBold/);
    expect(raw).not.toMatch(/Helvetica/);
  });
});

describe("the disc", () => {
  it("has a hole of the spindle's size and a ring of bars for each speed, as many as the sums say", async () => {
    const [page] = await read(strobeSheet({ mainsHz: 50, speeds, spindleMm: 7.2, paper: "a4" }));
    const paths = page?.paths ?? [];
    const rings = paths.filter(({ isFilled, pieces }) => isFilled && pieces.length > 1);
    expect(rings.map(({ pieces }) => pieces.length).sort((a, b) => a - b)).toEqual([77, 133, 180, 360, 400]);

    const holes = paths.filter(({ pieces: [piece] }) => piece && Math.abs(piece.right - piece.left - 7.2) < lost);
    expect(holes.length).toBe(1);
    const hole = holes[0]?.pieces[0];
    const [cx, cy] = [((hole?.left ?? 0) + (hole?.right ?? 0)) / 2, ((hole?.top ?? 0) + (hole?.bottom ?? 0)) / 2];
    for (const { pieces } of rings) {
      const pitch = 360 / pieces.length;
      const radii = pieces.flatMap(({ points }) => points.map(([x, y]) => Math.hypot(x - cx, y - cy)));
      const [inner, outer] = [Math.min(...radii), Math.max(...radii)];
      // Every corner lies on one of two circles about the hole, and bar and gap are equally wide.
      for (const radius of radii) expect(Math.min(radius - inner, outer - radius)).toBeLessThan(lost);
      const degrees = pieces.map(({ points }) => points.map(([x, y]) => (Math.atan2(y - cy, x - cx) * 180) / Math.PI));
      // The bar that lies across the seam of the angle, at the left, is left out.
      const spreads = degrees.map((angles) => Math.max(...angles) - Math.min(...angles)).filter((deg) => deg < 180);
      expect(spreads.length).toBeGreaterThanOrEqual(pieces.length - 1);
      for (const spread of spreads) expect(spread).toBeCloseTo(pitch / 2, 3);
    }
  });

  it("says what each ring really shows", async () => {
    const [fifty] = await read(strobeSheet({ mainsHz: 50, speeds, spindleMm: 7.2, paper: "a4" }));
    expect(fifty?.text).toContain("77.92 rpm, −0.10 %");
    expect(fifty?.text).toContain("45.11 rpm, +0.25 %");
    expect(fifty?.text).toContain("33 1/3 rpm, exact");
    expect(fifty?.text).toContain("400 bars (by 3s)");
    const [sixty] = await read(strobeSheet({ mainsHz: 60, speeds, spindleMm: 7.2, paper: "letter" }));
    expect(sixty?.text).toContain("78.26 rpm, +0.33 %");
    expect(sixty?.text).toContain("45 rpm, exact");
    expect(sixty?.text).toContain("7.2 are 0.1");
  });
});

describe("the ring gauge", () => {
  it("has circles of the diameters written on them, about one centre", async () => {
    const [page] = await read(ringGaugeSheet({ largestMm: 180, stepMm: 1, paper: "a4" }));
    const arcs = (page?.paths ?? []).filter(
      ({ isFilled, pieces: [piece] }) => !isFilled && (piece?.points.length ?? 0) > 2,
    );
    // The arms of the cross are the only straight lines of 180 mm.
    const arm = page?.paths
      .flatMap(({ pieces }) => pieces)
      .find(({ left, right }) => Math.abs(right - left - 180) < lost);
    const [cx, cy] = [((arm?.left ?? 0) + (arm?.right ?? 0)) / 2, arm?.top ?? 0];
    for (const diameter of [10, 50, 95, 100, 180]) {
      const on = arcs.filter(({ pieces: [piece] }) =>
        piece?.points.every(([x, y]) => Math.abs(Math.hypot(x - cx, y - cy) - diameter / 2) < lost),
      );
      expect(on.length, `${diameter} mm`).toBeGreaterThan(0);
      if (diameter % 10 === 0) expect(page?.text).toContain(String(diameter));
    }
  });

  it("has tapered rules as wide as is written where it is written", async () => {
    const [, page] = await read(ringGaugeSheet({ largestMm: 180, stepMm: 1, paper: "letter" }));
    const upright = (page?.paths ?? [])
      .filter(({ isFilled }) => !isFilled)
      .flatMap(({ pieces }) => pieces)
      .filter(({ left, right, points }) => right - left < lost && points.length === 2);
    const heights = upright.map(({ top, bottom }) => Math.round((bottom - top) * 1e4) / 1e4);
    for (const width of [3, 4, 10, 11, 12, 20, 27]) expect(heights, `${width} mm`).toContain(width);
  });
});

describe("the belt ruler", () => {
  it("stands at half of what is written on it", async () => {
    const [page] = await read(beltRulerSheet({ longestMm: 800, paper: "a4" }));
    const marks = (page?.paths ?? [])
      .filter(({ isFilled, strokeMm }) => !isFilled && Math.abs(strokeMm - 0.18) < lost)
      .flatMap(({ pieces }) => pieces)
      .filter(({ points }) => points.length === 2);
    const left = Math.min(...marks.map((mark) => mark.left));
    const scale = marks.filter((mark) => Math.abs(mark.left - left) < lost).map(({ top }) => top);
    // Numbered each 20 mm of circumference, which is 10 mm of belt laid flat, from the stop at the bottom.
    expect(scale.length).toBe(20);
    const stop = Math.max(...scale);
    expect([...scale].sort((a, b) => b - a).map((y) => Math.round((stop - y) * 1e3) / 1e3)).toEqual(
      Array.from({ length: 20 }, (_, i) => i * 10),
    );
    expect(page?.text).toContain("360");
  });

  it("has as many strips as the longest belt needs", () => {
    const strips = (longestMm: number) =>
      beltRulerSheet({ longestMm, paper: "a4" }).pages[0]?.items.filter(
        (item) => item.type === "words" && item.content.endsWith("inside circumference"),
      ).length;
    expect([strips(50), strips(380), strips(380.1), strips(1900)]).toEqual([1, 1, 2, 5]);
  });

  it("has circles whose circumference is what is written on them", async () => {
    const [, page] = await read(beltRulerSheet({ longestMm: 800, paper: "a4" }));
    const arcs = (page?.paths ?? []).flatMap(({ pieces }) => pieces).filter(({ points }) => points.length > 8);
    const widths = arcs.map(({ points }) => {
      // Twice the radius from three points of a circle: a b c / (2 area).
      const [a, b, c] = [points[0], points[4], points[8]];
      if (!a || !b || !c) return 0;
      const side = (p: readonly number[], q: readonly number[]) =>
        Math.hypot((p[0] ?? 0) - (q[0] ?? 0), (p[1] ?? 0) - (q[1] ?? 0));
      const area = Math.abs((b[0] - a[0]) * (c[1] - a[1]) - (c[0] - a[0]) * (b[1] - a[1])) / 2;
      return (side(a, b) * side(b, c) * side(c, a)) / (2 * area);
    });
    for (const size of [60, 200, 560]) {
      expect(Math.min(...widths.map((width) => Math.abs(Math.PI * width - size)))).toBeLessThan(0.01);
      expect(page?.text).toContain(String(size));
    }
  });
});
