/** A colour ("#rrggbb") made lighter (factor above 1) or darker (below 1). */
export function tint(colour: string, factor: number): string {
  const channels = [1, 3, 5].map((at) => Number.parseInt(colour.slice(at, at + 2), 16));
  const shaded = channels.map((c) => (factor > 1 ? c + (255 - c) * Math.min(1, factor - 1) : c * factor));
  return `#${shaded.map((c) => Math.round(c).toString(16).padStart(2, "0")).join("")}`;
}
