import type { Outline } from "./Scene";

/** Hundredths of a pixel: finer than any screen shows, short in the markup. */
export function round(px: number): number {
  return Math.round(px * 100) / 100 + 0;
}

/** The SVG path of a closed outline. */
export function outlinePath(outline: Outline): string {
  if (outline.shape === "polygon") return `M${outline.points.map((p) => `${round(p.x)} ${round(p.y)}`).join("L")}Z`;
  const { centre, radius } = outline;
  const half = outline.shape === "stadium" ? outline.straight / 2 : 0;
  const [r, left, right] = [round(radius), round(centre.x - half), round(centre.x + half)];
  const [top, bottom] = [round(centre.y - radius), round(centre.y + radius)];
  return `M${left} ${top}H${right}A${r} ${r} 0 0 1 ${right} ${bottom}H${left}A${r} ${r} 0 0 1 ${left} ${top}Z`;
}
