import type { BeltSampleMethod } from "#shared/domain/beltSample";
import type { Mark, Sketch } from "../../../ui/measuring/Sketch";
import { dimension, lines, rectangle, ring } from "../../../ui/measuring/shapes";
import { outsideJaws, rule } from "../../../ui/measuring/tools";

const letter = (x: number, y: number, words: string): Mark => ({ look: "letter", x, y, words, isDiameter: false });

/** A loop of radius r that begins and ends beside an upright mark on top, with an arrow to it from both sides. */
function onceRound(r: number, markFrom: number, markTo: number): Mark[] {
  const [cx, cy, gap] = [100, 80, 8];
  const dy = Math.sqrt(r * r - gap * gap);
  const top = cy - dy;
  return [
    lines("loop", `M${cx + gap} ${top}A${r} ${r} 0 1 1 ${cx - gap} ${top}`),
    lines("dimension", `M${cx} ${markFrom}V${markTo}`),
    lines("arrow", `M${cx} ${top - 0.6}l9 -2.2v6.2ZM${cx} ${top - 0.6}l-9 -2.2v6.2Z`),
  ];
}

const stadium = (left: number, right: number, y: number, r: number) =>
  `M${left + r} ${y - r}H${right - r}a${r} ${r} 0 0 1 0 ${2 * r}H${left + r}a${r} ${r} 0 0 1 0 ${-2 * r}Z`;

/** Five ways of measuring a belt, in the box of `sketchBox`. */
export const methodSketches: Record<BeltSampleMethod, Sketch> = {
  "inside-circumference": [ring("rubberFace", 100, 80, 66, 58), ...onceRound(52, 18, 40), letter(100, 82, "C")],
  "lay-flat-inside": [
    { look: "rubberFace", d: stadium(24, 176, 66, 15) + stadium(30, 170, 66, 9) },
    ...rule(30, 92),
    ...dimension({ from: 30, to: 170, y: 28, words: "F", edge: 66 }),
  ],
  "lay-flat-outside": [
    { look: "rubberFace", d: stadium(34, 152, 92, 14) },
    lines("centre", "M48 92H138"),
    ...outsideJaws(34, 152, 96),
    ...dimension({ from: 34, to: 152, y: 136, words: "F", edge: 98 }),
  ],
  "inside-diameter": [
    lines("tool", "M84 40H116L158 146H42Z"),
    lines("thin", "M77.7 56H122.3M69.7 76H130.3M53.9 116H146.1"),
    rectangle("rubber", 52, 89, 60, 97),
    rectangle("rubber", 140, 89, 148, 97),
    lines("thin", "M60 89H140M60 97H140"),
    ...dimension({ from: 62, to: 138, y: 20, words: "d", isDiameter: true, edge: 92 }),
  ],
  "outside-circumference": [ring("rubberFace", 100, 80, 54, 46), ...onceRound(60, 8, 34), letter(100, 82, "L")],
};
