import type { Point } from "../Scene";
import { type Camera, project } from "./camera";
import { f, type PhotoCanvas } from "./PhotoCanvas";
import { tint } from "./tint";

/** A block lying on the bench: two sides that can be seen, and the top. */
export function paintBlock(
  canvas: PhotoCanvas,
  camera: Camera,
  long: number,
  wide: number,
  tall: number,
  colour: string,
): void {
  const corners = [
    [-1, -1],
    [1, -1],
    [1, 1],
    [-1, 1],
  ] as const;
  const at = (z: number) => corners.map(([x, y]) => project(camera, (x * long) / 2, (y * wide) / 2, z));
  const [low, high] = [at(0), at(tall)];
  const away = Math.min(tall * camera.pxPerMm * 0.3, 40);
  for (const share of [0.5, 1, 1.4]) {
    const d = `M${low.map((p) => `${f(p.x + away * share)} ${f(p.y + away * share * 0.55)}`).join("L")}Z`;
    canvas.add(
      `<path d="${d}" stroke="#000000" stroke-width="${f(4 + share * 6)}" stroke-linejoin="round" opacity="0.14"/>`,
    );
  }
  const polygon = (points: Point[], fill: string) =>
    canvas.add(`<path d="M${points.map((p) => `${f(p.x)} ${f(p.y)}`).join("L")}Z" fill="${fill}"/>`);
  for (let i = 0; i < 4; i++) {
    const j = (i + 1) % 4;
    if (low[i]!.x <= low[j]!.x) continue;
    const slope = Math.atan2(low[j]!.y - low[i]!.y, low[j]!.x - low[i]!.x);
    polygon([low[i]!, low[j]!, high[j]!, high[i]!], tint(colour, Math.sin(slope) > 0 ? 0.62 : 0.48));
  }
  const light = canvas.linear(high[0]!.x, high[0]!.y, high[2]!.x, high[2]!.y, [
    [0, tint(colour, 1.2)],
    [1, tint(colour, 0.84)],
  ]);
  polygon(high, light);
}
