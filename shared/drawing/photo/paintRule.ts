import { glyphRun } from "../glyphRun";
import { writeSvgElement } from "../writeSvgElement";
import { f, type PhotoCanvas } from "./PhotoCanvas";

const depth = 92;
const ink = "#2b2f33";

/** The graduated edge of a steel rule across the foot of the picture, at the scale of the part: px to the mm. */
export function paintRule(
  canvas: PhotoCanvas,
  pxPerMm: number,
  width: number,
  height: number,
  chance: () => number,
): void {
  const tilt = (chance() - 0.5) * 2.6;
  const top = height - depth - 14 + chance() * 10;
  const steel = canvas.linear(0, 0, width, depth, [
    [0, "#cfd4d6"],
    [0.3, "#f1f3f3"],
    [0.52, "#b9c0c4"],
    [0.78, "#dfe3e4"],
    [1, "#9aa2a7"],
  ]);
  const shade = canvas.linear(0, -16, 0, 0, [
    [0, "#000000", 0],
    [1, "#000000", 0.34],
  ]);
  const minor = roundAbove(5 / pxPerMm);
  const major = minor * 10;
  const start = 40 + chance() * 60;
  const short: string[] = [];
  const long: string[] = [];
  const figures: string[] = [];
  for (let i = 0; start + i * minor * pxPerMm < width + 60; i++) {
    const x = start + i * minor * pxPerMm;
    const tall = i % 10 === 0 ? 30 : i % 5 === 0 ? 23 : 15;
    (i % 10 === 0 ? long : short).push(`M${f(x)} 1v${tall}`);
    if (i % 10 !== 0) continue;
    const value = Number(((i / 10) * major).toPrecision(6)).toString();
    const glyphs = glyphRun(value, 21, 500, ink) ?? [];
    figures.push(`<g transform="translate(${f(x + 5)} 50)">${glyphs.map(writeSvgElement).join("")}</g>`);
  }
  const unit = (glyphRun("mm", 17, 500, ink) ?? []).map(writeSvgElement).join("");
  canvas.add(
    `<g transform="translate(0 ${f(top)}) rotate(${tilt.toFixed(2)} ${width / 2} 0)">` +
      `<rect x="-60" y="-16" width="${width + 120}" height="16" fill="${shade}"/>` +
      `<rect x="-60" width="${width + 120}" height="${depth + 60}" fill="${steel}"/>` +
      `<rect x="-60" width="${width + 120}" height="2" fill="#ffffff" opacity="0.75"/>` +
      `<path d="${short.join("")}" stroke="${ink}" stroke-width="1.3"/><path d="${long.join("")}" stroke="${ink}" stroke-width="1.8"/>` +
      `${figures.join("")}<g transform="translate(12 76)">${unit}</g></g>`,
  );
}

/** The smallest 1 or 5 times a power of ten that is not below `limit`: graduations of rules. */
function roundAbove(limit: number): number {
  const power = 10 ** Math.floor(Math.log10(limit));
  const lead = limit / power;
  return Number(((lead <= 1 ? 1 : lead <= 5 ? 5 : 10) * power).toPrecision(1));
}
