import { type Drawn, type Look, letterWidth, type Mark } from "./Sketch";

export const rectangle = (look: Look, left: number, top: number, right: number, bottom: number): Drawn => ({
  look,
  d: `M${left} ${top}H${right}V${bottom}H${left}Z`,
});
export const lines = (look: Look, d: string): Drawn => ({ look, d });
const circlePath = (x: number, y: number, r: number) =>
  `M${x - r} ${y}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0Z`;
export const circle = (look: Look, x: number, y: number, r: number): Drawn => ({ look, d: circlePath(x, y, r) });
/** A ring of material: the inner circle is a hole, by the even-odd rule. */
export const ring = (look: Look, x: number, y: number, outer: number, inner: number): Drawn => ({
  look,
  d: circlePath(x, y, outer) + circlePath(x, y, inner),
});
/** The same block left and right of an upright axis, from `inner` to `outer` beside it. */
export const bothSides = (
  look: Look,
  axis: number,
  [inner, outer]: [number, number],
  [top, bottom]: [number, number],
): Drawn[] => [
  rectangle(look, axis - outer, top, axis - inner, bottom),
  rectangle(look, axis + inner, top, axis + outer, bottom),
];

const arrow = (x: number, y: number, points: 1 | -1) => `M${x} ${y}l${-9 * points} -3v6Z`;

type Dimension = {
  from: number;
  to: number;
  y: number;
  words: string;
  isDiameter?: boolean;
  /** Where the extension lines begin; left out where the line runs between the faces themselves. */
  edge?: number;
};

/** A level dimension line with its letter: in a gap of the line where there is room, else beside it. */
export function dimension({ from, to, y, words, isDiameter = false, edge }: Dimension): Mark[] {
  const room = letterWidth(words, isDiameter);
  const inside = to - from >= room + 30;
  const past = edge !== undefined && edge > y ? -4 : 4;
  const middle = (from + to) / 2;
  const run = inside
    ? `M${from} ${y}H${middle - room / 2 - 4}M${middle + room / 2 + 4} ${y}H${to}`
    : `M${from - 18} ${y}H${to + 18}`;
  const heads = inside ? arrow(from, y, -1) + arrow(to, y, 1) : arrow(from, y, 1) + arrow(to, y, -1);
  return [
    ...(edge === undefined ? [] : [lines("extension", `M${from} ${edge}V${y + past}M${to} ${edge}V${y + past}`)]),
    lines("dimension", run),
    lines("arrow", heads),
    { look: "letter", x: inside ? middle : to + 22 + room / 2, y, words, isDiameter },
  ];
}
