import type { Point } from "../Scene";
import { type Camera, project, rise } from "./camera";
import { f, type PhotoCanvas } from "./PhotoCanvas";
import { tint } from "./tint";

/** A closed curve on the bench (mm), as it falls from the hand: its length is exactly `length`. */
export function fallenLoop(length: number, chance: () => number): Point[] {
  const [flat, lobe, phase] = [0.16 + chance() * 0.12, 0.03 + chance() * 0.06, chance() * Math.PI * 2];
  const shape = [...Array(120).keys()].map((i) => {
    const angle = (i / 120) * Math.PI * 2;
    const r = 1 + flat * Math.cos(2 * angle) + lobe * Math.cos(3 * angle + phase);
    return { x: r * Math.cos(angle), y: r * Math.sin(angle) };
  });
  const around = shape.reduce((sum, p, i) => {
    const q = shape[(i + 1) % shape.length]!;
    return sum + Math.hypot(q.x - p.x, q.y - p.y);
  }, 0);
  return shape.map((p) => ({ x: (p.x * length) / around, y: (p.y * length) / around }));
}

export function circleLoop(radius: number): Point[] {
  return [...Array(120).keys()].map((i) => {
    const angle = (i / 120) * Math.PI * 2;
    return { x: radius * Math.cos(angle), y: radius * Math.sin(angle) };
  });
}

type Cord = {
  loop: Point[];
  colour: string /** mm */;
  thick: number /** mm over the bench; a flat belt stands on its edge */;
  tall: number;
  round: boolean;
};

/** A belt or ring along a curve: its shadow, its body and the light along its top. */
export function paintCord(canvas: PhotoCanvas, camera: Camera, { loop, colour, thick, tall, round }: Cord): void {
  const points = loop.map((p) => project(camera, p.x, p.y, 0));
  const path = `M${points.map((p) => `${f(p.x)} ${f(p.y)}`).join("L")}Z`;
  const id = canvas.define((name) => `<path id="${name}" d="${path}" fill="none" stroke-linejoin="round"/>`);
  const width = Math.max(thick * camera.pxPerMm, 2.6);
  const high = tall * camera.pxPerMm * rise;
  const stroke = (dx: number, dy: number, paint: string, wide: number, opacity = 1) =>
    canvas.add(
      `<use href="#${id}" x="${f(dx)}" y="${f(dy)}" stroke="${paint}" stroke-width="${f(wide)}" opacity="${opacity}"/>`,
    );

  const away = 4 + Math.min(high, 60) * 0.35 + width * 0.2;
  stroke(away, away * 0.6, "#000000", width + 12, 0.1);
  stroke(away * 0.8, away * 0.5, "#000000", width + 4, 0.2);
  const [left, right] = [Math.min(...points.map((p) => p.x)), Math.max(...points.map((p) => p.x))];
  const across = (light: number, dark: number) =>
    canvas.linear(left, 0, right, 0, [
      [0, tint(colour, dark)],
      [0.28, tint(colour, light)],
      [0.62, tint(colour, (light + dark) / 2)],
      [1, tint(colour, dark)],
    ]);
  if (round) {
    stroke(0, -width * 0.3, across(0.7, 0.5), width);
    stroke(-width * 0.06, -width * 0.38, across(1.1, 0.8), width * 0.72);
    stroke(-width * 0.14, -width * 0.48, across(1.32, 1.1), width * 0.34);
    stroke(-width * 0.2, -width * 0.54, "#ffffff", Math.max(1, width * 0.1), 0.3);
    return;
  }
  const steps = Math.min(26, Math.max(2, Math.ceil(high / 2.2)));
  const side = across(1.12, 0.55);
  for (let i = 0; i < steps; i++) stroke(0, -(high * i) / steps, side, width);
  stroke(0, -high, across(1.34, 1.08), width);
}
