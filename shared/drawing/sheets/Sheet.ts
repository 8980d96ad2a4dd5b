/**
 * A sheet to print at 1:1: what lies where on its pages, for the PDF and for its picture on a page alike.
 *
 * Units: true millimetres on paper, x to the right and y downwards from the top left corner of the page; angles in
 *        degrees. Sizes of text are mm per em. A filled path has exactly the size of its steps; a stroke lies half
 *        outside, so what is to be measured is filled.
 */
export type Sheet = {
  title: string;
  /** Without its ending. */
  fileName: string;
  pages: SheetPage[];
};
export type SheetPage = { title: string; widthMm: number; heightMm: number; items: SheetItem[] };

/** Moves to, lines to, Bezier curves to (two control points, then the end), closes. */
export type Step =
  | readonly ["M" | "L", number, number]
  | readonly ["C", number, number, number, number, number, number]
  | readonly ["Z"];

/** Sheets are printed in one colour: full, and a grey that a printer without colour still shows. */
export type Shade = "ink" | "grey";

export type PathItem = {
  type: "path";
  steps: readonly Step[];
  /** Width of its stroke, mm; none is filled. */
  strokeMm?: number;
  isDashed?: boolean;
  shade: Shade;
};
export type WordsItem = {
  type: "words";
  /** Where the baseline begins, has its middle or ends, as `anchor` says. */
  x: number;
  y: number;
  content: string;
  sizeMm: number;
  weight: 500 | 600;
  anchor: "start" | "middle" | "end";
  /** Turned about that point, clockwise. */
  turnDeg: number;
  shade: Shade;
};
export type SheetItem = PathItem | WordsItem;
