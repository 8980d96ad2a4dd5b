/**
 * An arc with an arrowhead at its end, as a path around (0, 0) in px with y down: the way that something turns.
 * `middle` is the direction of its middle in degrees (y up, as on the board), `turn` 1 counter-clockwise.
 */
export function turnArrow(radius: number, middle: number, spread: number, turn: 1 | -1): string {
  const at = (degrees: number, r = radius) => {
    const angle = (degrees * Math.PI) / 180;
    return `${(r * Math.cos(angle)).toFixed(1)} ${(-r * Math.sin(angle)).toFixed(1)}`;
  };
  const [start, end] = [middle - (turn * spread) / 2, middle + (turn * spread) / 2];
  const back = end - turn * Math.min((7 / radius) * (180 / Math.PI), spread / 2);
  return `M${at(start)}A${radius} ${radius} 0 0 ${turn > 0 ? 0 : 1} ${at(end)}M${at(back, radius + 4)}L${at(end)}L${at(back, radius - 4)}`;
}
