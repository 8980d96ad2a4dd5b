import type { DimensionName } from "#shared/domain/partKinds";
import type { Sketch } from "./Sketch";
import { bothSides, circle, dimension, lines, rectangle, ring } from "./shapes";
import { insideJaws, outsideJaws } from "./tools";

/** The upper half of a wheel in section, its axis level: tread, disc and hub, half widths from x = 100. */
const halfWheel = (tread: number, hub: number): Sketch => [
  rectangle("rubber", 100 - tread, 52, 100 + tread, 68),
  rectangle("metal", 94, 68, 106, 110),
  rectangle("metal", 100 - hub, 110, 100 + hub, 128),
  lines("thin", `M${100 - hub} 128V138M${100 + hub} 128V138`),
  lines("centre", "M24 138H176"),
];

/** A stepped wheel in section, its axis upright: the large tread below, the small one above. */
const steppedWheel: Sketch = [
  ...bothSides("rubber", 100, [66, 80], [100, 126]),
  ...bothSides("metal", 100, [30, 66], [108, 118]),
  ...bothSides("rubber", 100, [28, 40], [74, 100]),
  ...bothSides("metal", 100, [8, 28], [70, 130]),
  lines("centre", "M100 62V138"),
];

export const idlerWheel: Partial<Record<DimensionName, Sketch>> = {
  outsideDiameter: [
    ring("rubberFace", 100, 80, 48, 38),
    ring("metalFace", 100, 80, 38, 5),
    circle("thin", 100, 80, 12),
    ...outsideJaws(52, 148, 98),
    ...dimension({ from: 52, to: 148, y: 144, words: "D", isDiameter: true, edge: 101 }),
  ],
  bore: [
    ...bothSides("rubber", 100, [64, 80], [80, 108]),
    ...bothSides("metal", 100, [30, 64], [89, 99]),
    ...bothSides("metal", 100, [16, 30], [64, 124]),
    ...insideJaws(84, 116, 112),
    ...dimension({ from: 84, to: 116, y: 144, words: "d", isDiameter: true, edge: 127 }),
  ],
  treadWidth: [
    ...halfWheel(34, 48),
    ...outsideJaws(66, 134, 64),
    ...dimension({ from: 66, to: 134, y: 38, words: "b" }),
  ],
  overallHeight: [
    ...halfWheel(28, 52),
    ...outsideJaws(48, 152, 126),
    ...dimension({ from: 48, to: 152, y: 38, words: "h" }),
  ],
  secondTreadDiameter: [
    ...steppedWheel,
    ...outsideJaws(60, 140, 92),
    ...dimension({ from: 60, to: 140, y: 48, words: "D2", isDiameter: true }),
  ],
};

/** The upper half of a roller in section, its axis level. */
const halfRoller = (tread: number, sleeve: number): Sketch => [
  rectangle("rubber", 100 - tread, 56, 100 + tread, 98),
  rectangle("metal", 100 - sleeve, 98, 100 + sleeve, 116),
  lines("thin", `M${100 - sleeve} 116V136M${100 + sleeve} 116V136`),
  lines("centre", "M24 136H176"),
];

export const pinchRoller: Partial<Record<DimensionName, Sketch>> = {
  outsideDiameter: [
    rectangle("rubberFace", 56, 50, 144, 126),
    rectangle("metalFace", 80, 44, 120, 50),
    rectangle("metalFace", 80, 126, 120, 132),
    lines("centre", "M100 36V138"),
    ...outsideJaws(56, 144, 92),
    ...dimension({ from: 56, to: 144, y: 146, words: "D", isDiameter: true, edge: 129 }),
  ],
  bore: [
    ...bothSides("rubber", 100, [28, 56], [62, 120]),
    ...bothSides("metal", 100, [17, 28], [54, 126]),
    ...insideJaws(83, 117, 112),
    ...dimension({ from: 83, to: 117, y: 146, words: "d", isDiameter: true, edge: 129 }),
  ],
  treadWidth: [
    ...halfRoller(48, 56),
    ...outsideJaws(52, 148, 84),
    ...dimension({ from: 52, to: 148, y: 40, words: "b" }),
  ],
  overallHeight: [
    ...halfRoller(46, 60),
    ...outsideJaws(40, 160, 114),
    ...dimension({ from: 40, to: 160, y: 40, words: "h" }),
  ],
};
