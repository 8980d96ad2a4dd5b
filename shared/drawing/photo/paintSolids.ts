import type { Point } from "../Scene";
import { type Camera, foreshortening, project } from "./camera";
import { f, type PhotoCanvas } from "./PhotoCanvas";
import { tint } from "./tint";

type Cylinder = { radius: number; from: number; to: number; colour: string; gloss?: number };

/** A soft shadow on the bench under something round, thrown to the lower right. */
export function paintShadow(canvas: PhotoCanvas, camera: Camera, radius: number, height: number): void {
  const { x, y } = project(camera, 0, 0, 0);
  const r = radius * camera.pxPerMm;
  const away = Math.min(height * camera.pxPerMm * 0.3, r * 0.5) + 6;
  for (const [grow, strength] of [
    [1.3, 0.34],
    [1.1, 0.5],
  ] as const) {
    const fill = canvas.radial([
      [0.5, "#000000", strength],
      [1, "#000000", 0],
    ]);
    canvas.add(
      `<ellipse cx="${f(x + away)}" cy="${f(y + away * 0.55)}" rx="${f(r * grow + 8)}" ry="${f(r * grow * foreshortening + 8)}" fill="${fill}"/>`,
    );
  }
}

/** A standing cylinder: its side, shaded across, and its top. Heights in mm over the bench. */
export function paintCylinder(
  canvas: PhotoCanvas,
  camera: Camera,
  { radius, from, to, colour, gloss = 1 }: Cylinder,
): void {
  const [low, high] = [project(camera, 0, 0, from), project(camera, 0, 0, to)];
  const rx = radius * camera.pxPerMm;
  const ry = rx * foreshortening;
  const side = canvas.linear(low.x - rx, 0, low.x + rx, 0, [
    [0, tint(colour, 0.5)],
    [0.24, tint(colour, 1 + 0.24 * gloss)],
    [0.42, colour],
    [0.86, tint(colour, 0.46)],
    [1, tint(colour, 0.66)],
  ]);
  const arc = `${f(rx)} ${f(ry)} 0 0`;
  canvas.add(
    `<path d="M${f(high.x - rx)} ${f(high.y)}V${f(low.y)}A${arc} 0 ${f(low.x + rx)} ${f(low.y)}V${f(high.y)}Z" fill="${side}"/>` +
      ellipse(
        high,
        rx,
        topLight(canvas, high, rx, colour, gloss),
        `stroke="${tint(colour, 1.3)}" stroke-width="0.8" stroke-opacity="0.7"`,
      ),
  );
}

/** A hole from a top face downwards: its far wall, and what lies at its bottom. */
export function paintHole(
  canvas: PhotoCanvas,
  camera: Camera,
  { radius, from, to, colour }: Cylinder,
  floor: string,
): void {
  const [low, high] = [project(camera, 0, 0, from), project(camera, 0, 0, to)];
  const rx = radius * camera.pxPerMm;
  const ry = rx * foreshortening;
  const clip = canvas.define((id) => `<clipPath id="${id}">${ellipse(high, rx, "#000")}</clipPath>`);
  const wall = canvas.linear(high.x - rx, 0, high.x + rx, 0, [
    [0, tint(colour, 0.32)],
    [0.6, tint(colour, 0.72)],
    [0.85, tint(colour, 1.1)],
    [1, tint(colour, 0.7)],
  ]);
  // The deeper a hole is for its width, the less light reaches its bottom.
  const dark = Math.min(0.55, 0.12 + (to - from) / (radius * 2));
  const shade = canvas.linear(0, low.y - ry, 0, low.y + ry, [
    [0, "#000000", dark],
    [0.7, "#000000", dark * 0.25],
  ]);
  canvas.add(
    `<g clip-path="url(#${clip})"><rect x="${f(high.x - rx)}" y="${f(high.y - ry)}" width="${f(rx * 2)}" height="${f(ry * 2)}" fill="${wall}"/>` +
      `${ellipse(low, rx, floor)}${ellipse(low, rx, shade)}</g>` +
      ellipse(high, rx, "none", `stroke="${tint(colour, 0.4)}" stroke-width="1.2"`),
  );
}

/** Turned metal shows soft rays of light across its face. */
export function paintSheen(canvas: PhotoCanvas, camera: Camera, radius: number, height: number): void {
  const at = project(camera, 0, 0, height);
  const r = radius * camera.pxPerMm;
  const clip = canvas.define((id) => `<clipPath id="${id}">${ellipse(at, r, "#000")}</clipPath>`);
  const ray = (angle: number, half: number, light: string, opacity: number) => {
    const point = (a: number) =>
      `${f(at.x + Math.cos(a) * r * 1.4)} ${f(at.y + Math.sin(a) * r * 1.4 * foreshortening)}`;
    return [0, Math.PI]
      .flatMap((flip) =>
        [1, 0.55].map((share) => {
          const [a, b] = [angle + flip - half * share, angle + flip + half * share];
          return `<path d="M${f(at.x)} ${f(at.y)}L${point(a)}L${point(b)}Z" fill="${light}" opacity="${opacity}"/>`;
        }),
      )
      .join("");
  };
  canvas.add(`<g clip-path="url(#${clip})">${ray(-2.2, 0.34, "#ffffff", 0.17)}${ray(-0.7, 0.3, "#000000", 0.08)}</g>`);
}

function ellipse(at: Point, rx: number, fill: string, more = ""): string {
  return `<ellipse cx="${f(at.x)}" cy="${f(at.y)}" rx="${f(rx)}" ry="${f(rx * foreshortening)}" fill="${fill}" ${more}/>`;
}

function topLight(canvas: PhotoCanvas, at: Point, rx: number, colour: string, gloss: number): string {
  return canvas.linear(at.x - rx, at.y - rx, at.x + rx * 0.8, at.y + rx, [
    [0, tint(colour, 1 + 0.26 * gloss)],
    [0.5, tint(colour, 1.04)],
    [1, tint(colour, 0.76)],
  ]);
}
