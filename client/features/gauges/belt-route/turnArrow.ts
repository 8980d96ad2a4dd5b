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
  const [long, wide] = [Math.min(7, radius * 0.75), Math.min(4, radius * 0.45)];
  // The head follows a chord of the arc, so that it looks straight at a small radius too.
  const back = end - turn * Math.min((long / radius) * (180 / Math.PI), spread / 2);
  const arc = `M${at(start)}A${radius} ${radius} 0 ${spread > 180 ? 1 : 0} ${turn > 0 ? 0 : 1} ${at(end)}`;
  return `${arc}M${at(back, radius + wide)}L${at(end)}L${at(back, radius - wide)}`;
}
