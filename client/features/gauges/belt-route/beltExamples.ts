import type { BeltWrap } from "#shared/domain/beltRoute";
import type { BeltKind, BeltState, NamedPulley } from "./beltState";
import { choicesFor, stretchOf } from "./stretchChoices";

type Row = [name: string, x: number, y: number, diameter: number, wrap?: BeltWrap];
export type BeltExample = { id: string; words: string; kind: BeltKind; thickness: string; rows: readonly Row[] };

/** Invented layouts to begin with; the first is shown where the address says nothing. */
export const beltExamples: readonly BeltExample[] = [
  {
    id: "idler",
    words: "an idler on the back",
    kind: "flat-belt",
    thickness: "1.2 mm",
    rows: [
      ["Motor", 0, 0, 11],
      ["Idler", 74, -24, 16, "back"],
      ["Flywheel", 168, -2, 84],
      ["Take-up", 78, 88, 28],
    ],
  },
  {
    id: "turntable",
    words: "a turntable",
    kind: "flat-belt",
    thickness: "0.8 mm",
    rows: [
      ["Motor", 0, 0, 10.4],
      ["Sub-platter", 152, 0, 134],
    ],
  },
  {
    id: "three-motor",
    words: "a deck with two capstans",
    kind: "flat-belt",
    thickness: "1 mm",
    rows: [
      ["Motor", 0, 0, 18],
      ["Left flywheel", -92, 96, 76],
      ["Guide", 0, 98, 20, "back"],
      ["Right flywheel", 92, 96, 76],
    ].map(([name, x, y, diameter, wrap]) => [name, x, y, diameter, wrap] as Row),
  },
  {
    id: "crossed",
    words: "a crossed belt",
    kind: "round-belt",
    thickness: "2.4 mm",
    rows: [
      ["Shaft", 0, 0, 24],
      ["Reel", 148, 20, 62, "back"],
    ],
  },
];

export const pulleysOf = (rows: readonly Row[]): NamedPulley[] =>
  rows.map(([name, x, y, diameter, wrap = "inside"], id) => ({ id, name, x, y, diameter, wrap }));

/** An example in place of the belt that was there; what the search knew stays. */
export const withExample = (state: BeltState, { kind, thickness, rows }: BeltExample): BeltState => ({
  ...state,
  pulleys: pulleysOf(rows),
  kind,
  thickness,
  width: "",
  ...stretchOf(choicesFor(kind)[0]!),
});
