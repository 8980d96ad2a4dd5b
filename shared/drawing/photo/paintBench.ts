import { f, type PhotoCanvas } from "./PhotoCanvas";
import { tint } from "./tint";

export type BenchLook = { ground: string; grain: string; grid?: string };

/** Brown wrapping paper, a cutting mat, drawing paper and a slate bench. */
export const benchLooks: readonly BenchLook[] = [
  { ground: "#c9b18c", grain: "#8d7348" },
  { ground: "#8fa39a", grain: "#5d7269", grid: "#b9c9c0" },
  { ground: "#e6e4dc", grain: "#b4b0a2" },
  { ground: "#5d6268", grain: "#3c4045" },
];

/** The bench paper: lit from the upper left, with fibres. */
export function paintBench(
  canvas: PhotoCanvas,
  look: BenchLook,
  width: number,
  height: number,
  chance: () => number,
): void {
  const { ground, grain, grid } = look;
  const light = canvas.linear(0, 0, width * 0.8, height, [
    [0, tint(ground, 1.22)],
    [0.45, ground],
    [1, tint(ground, 0.74)],
  ]);
  canvas.add(`<rect width="${width}" height="${height}" fill="${light}"/>`);
  if (grid) {
    const lines: string[] = [];
    for (let i = -6; i < 26; i++)
      lines.push(`M${f(i * 62)} 0L${f(i * 62 - 46)} ${height}`, `M0 ${f(i * 47 + 8)}L${width} ${f(i * 47 - 12)}`);
    canvas.add(`<path d="${lines.join("")}" stroke="${grid}" stroke-width="1.4" opacity="0.55"/>`);
  }
  const fibres: string[] = [];
  for (let i = 0; i < 170; i++) {
    const [x, y, angle, long] = [chance() * width, chance() * height, chance() * Math.PI, 3 + chance() * 13];
    fibres.push(`M${f(x)} ${f(y)}l${f(Math.cos(angle) * long)} ${f(Math.sin(angle) * long)}`);
  }
  canvas.add(`<path d="${fibres.join("")}" stroke="${grain}" stroke-width="0.9" opacity="0.28" fill="none"/>`);
}

/** The corners of a picture taken with an ordinary lens are a little darker. */
export function paintVignette(canvas: PhotoCanvas, width: number, height: number): void {
  const dark = canvas.radial([
    [0.55, "#000000", 0],
    [1, "#000000", 0.3],
  ]);
  canvas.add(
    `<ellipse cx="${width / 2}" cy="${height / 2}" rx="${width * 0.78}" ry="${height * 0.8}" fill="${dark}"/>`,
  );
}
