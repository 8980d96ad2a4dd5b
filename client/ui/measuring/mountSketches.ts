import type { DimensionName } from "#shared/domain/partKinds";
import type { Sketch } from "./Sketch";
import { bothSides, circle, dimension, lines, rectangle, ring } from "./shapes";
import { insideJaws, outsideJaws } from "./tools";

/** A grooved mount in section, its axis upright. */
const wall = (side: 1 | -1) =>
  lines("rubber", `M${100 + side * 14} 56h${side * 38}v20h${side * -18}v24h${side * 18}v20h${side * -38}Z`);
const upright: Sketch = [wall(-1), wall(1), lines("thin", "M86 56H114M86 120H114"), lines("centre", "M100 46V130")];
/** Its upper half with the axis level. */
const level: Sketch = [
  lines("rubber", "M40 60H70V92H130V60H160V122H40Z"),
  lines("thin", "M40 122V138M160 122V138"),
  lines("centre", "M24 138H176"),
];

export const motorMount: Partial<Record<DimensionName, Sketch>> = {
  outsideDiameter: [
    ...upright,
    ...outsideJaws(48, 152, 74),
    ...dimension({ from: 48, to: 152, y: 146, words: "D", isDiameter: true, edge: 123 }),
  ],
  insideDiameter: [
    ...upright.slice(0, -1),
    ...insideJaws(86, 114, 108),
    ...dimension({ from: 86, to: 114, y: 146, words: "d", isDiameter: true, edge: 123 }),
  ],
  grooveDiameter: [
    circle("thin", 100, 82, 52),
    ring("rubber", 100, 82, 33, 13),
    ...outsideJaws(67, 133, 94),
    ...dimension({ from: 67, to: 133, y: 146, words: "g", isDiameter: true, edge: 97 }),
  ],
  grooveWidth: [...level, ...insideJaws(70, 130, 84), ...dimension({ from: 70, to: 130, y: 46, words: "w", edge: 58 })],
  height: [...level, ...outsideJaws(40, 160, 100), ...dimension({ from: 40, to: 160, y: 44, words: "h" })],
};

export const brakePad: Partial<Record<DimensionName, Sketch>> = {
  length: [
    rectangle("rubberFace", 38, 56, 160, 112),
    ...outsideJaws(38, 160, 88),
    ...dimension({ from: 38, to: 160, y: 142, words: "l", edge: 115 }),
  ],
  width: [
    rectangle("rubberFace", 66, 42, 134, 122),
    ...outsideJaws(66, 134, 88),
    ...dimension({ from: 66, to: 134, y: 142, words: "b", edge: 125 }),
  ],
  thickness: [
    rectangle("rubber", 84, 42, 116, 122),
    ...outsideJaws(84, 116, 88),
    ...dimension({ from: 84, to: 116, y: 142, words: "t", edge: 125 }),
  ],
};

export const clutchFelt: Partial<Record<DimensionName, Sketch>> = {
  outsideDiameter: [
    ring("felt", 100, 80, 46, 18),
    ...outsideJaws(54, 146, 94),
    ...dimension({ from: 54, to: 146, y: 144, words: "D", isDiameter: true, edge: 97 }),
  ],
  insideDiameter: [
    ...bothSides("felt", 100, [30, 80], [86, 106]),
    lines("thin", "M70 86H130M70 106H130"),
    ...insideJaws(70, 130, 102),
    ...dimension({ from: 70, to: 130, y: 138, words: "d", isDiameter: true, edge: 109 }),
  ],
  thickness: [
    rectangle("felt", 86, 42, 114, 122),
    ...outsideJaws(86, 114, 88),
    ...dimension({ from: 86, to: 114, y: 142, words: "t", edge: 125 }),
  ],
};
