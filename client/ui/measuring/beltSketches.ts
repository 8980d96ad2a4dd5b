import type { DimensionName } from "#shared/domain/partKinds";
import type { Drawn, Sketch } from "./Sketch";
import { circle, dimension, lines, rectangle, ring } from "./shapes";
import { insideJaws, outsideJaws, rule } from "./tools";

const loopPath = (r: number, y: number) =>
  `M${30 + r} ${y - r}H${170 - r}a${r} ${r} 0 0 1 0 ${2 * r}H${30 + r}a${r} ${r} 0 0 1 0 ${-2 * r}Z`;

/** A belt laid flat beside a rule, seen on edge: the inside runs from x = 30 to 170 and is 2 r high. */
function laidFlat(r: number, thickness: number): Sketch {
  const y = 74;
  const outer = `M${30 + r} ${y - r - thickness}H${170 - r}a${r + thickness} ${r + thickness} 0 0 1 0 ${2 * (r + thickness)}H${30 + r}a${r + thickness} ${r + thickness} 0 0 1 0 ${-2 * (r + thickness)}Z`;
  return [
    { look: "rubberFace", d: outer + loopPath(r, y) },
    ...rule(30, y + r + thickness + 4),
    ...dimension({ from: 30, to: 170, y: 30, words: "½ C", edge: y }),
  ];
}

/** A piece of belt running up the sheet between the jaws, torn off at both ends. */
function piece(half: number, cut?: Drawn): Sketch {
  const q = half / 2;
  const across = (sign: number) =>
    `q${(sign * q) / 2} ${-Math.min(5, q)} ${sign * q} 0t${sign * q} 0t${sign * q} 0t${sign * q} 0`;
  const torn: Drawn = {
    look: "rubberFace",
    d: `M${100 - half} 44${across(1)}V${cut ? 104 : 122}${cut ? `H${100 - half}` : across(-1)}Z`,
  };
  return cut ? [torn, cut] : [torn];
}

const section = (cut: Drawn): Sketch => [
  ...piece(20, cut),
  ...outsideJaws(80, 120, 88),
  ...dimension({ from: 80, to: 120, y: 146, words: "s", isDiameter: cut.d.includes("a"), edge: 127 }),
];

export const flatBelt: Partial<Record<DimensionName, Sketch>> = {
  insideCircumference: laidFlat(6, 3),
  width: [
    ...piece(36),
    ...outsideJaws(64, 136, 88),
    ...dimension({ from: 64, to: 136, y: 146, words: "b", edge: 126 }),
  ],
  thickness: [
    ...piece(6),
    ...outsideJaws(94, 106, 88),
    ...dimension({ from: 94, to: 106, y: 146, words: "t", edge: 126 }),
  ],
};

export const squareBelt: Partial<Record<DimensionName, Sketch>> = {
  insideCircumference: laidFlat(9, 8),
  section: section(rectangle("rubber", 80, 84, 120, 124)),
};

/** A string laid once round the inside of a belt, its two ends meeting at a mark. */
const stringInside: Sketch = [
  ring("rubberFace", 100, 78, 66, 56),
  lines("loop", "M109 27.8a51 51 0 1 1 -18 0"),
  lines("dimension", "M100 19V41"),
  lines("arrow", "M100 27l-9 -3v6ZM100 27l9 -3v6Z"),
  { look: "letter", x: 100, y: 78, words: "C", isDiameter: false },
];

export const roundBelt: Partial<Record<DimensionName, Sketch>> = {
  insideCircumference: stringInside,
  section: section(circle("rubber", 100, 104, 20)),
};

export const driveRing: Partial<Record<DimensionName, Sketch>> = {
  insideDiameter: [
    circle("rubber", 40, 102, 14),
    circle("rubber", 160, 102, 14),
    lines("thin", "M40 88H160M40 116H160"),
    ...insideJaws(54, 146, 106),
    ...dimension({ from: 54, to: 146, y: 144, words: "d", isDiameter: true, edge: 119 }),
  ],
  section: section(circle("rubber", 100, 104, 20)),
  width: [
    rectangle("rubber", 64, 54, 136, 88),
    lines("thin", "M64 88V134M136 88V134"),
    lines("centre", "M24 134H176"),
    ...outsideJaws(64, 136, 78),
    ...dimension({ from: 64, to: 136, y: 40, words: "b" }),
  ],
  height: [
    rectangle("rubber", 40, 62, 76, 120),
    rectangle("rubber", 150, 62, 186, 120),
    lines("thin", "M76 62H150M76 120H150"),
    ...outsideJaws(40, 76, 92),
    ...dimension({ from: 40, to: 76, y: 144, words: "h", edge: 123 }),
  ],
};
