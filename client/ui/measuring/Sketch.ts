/**
 * A picture of a part with the instrument in place, as data: what lies where and what it means, never which colour it has.
 * Units: the box of `sketchBox`, y downwards. Not to scale: proportions are chosen so that the picture is legible at 160 px.
 */
export type Sketch = readonly Mark[];
export type Mark = Drawn | Letter;

/** Cut surfaces are hatched (`rubber`, `metal`), seen ones plain (`…Face`); `loop` is a string laid along what it measures. */
export type Look =
  | "rubber"
  | "rubberFace"
  | "metal"
  | "metalFace"
  | "felt"
  | "tool"
  | "thin"
  | "centre"
  | "extension"
  | "dimension"
  | "arrow"
  | "loop";
export type Drawn = { look: Look; d: string };
/** The sign of a dimension on its line: centred on x, middle of the capitals on y. */
export type Letter = { look: "letter"; x: number; y: number; words: string; isDiameter: boolean };

export const sketchBox = { width: 200, height: 156 };
export const letterSize = 17;

const letterEm = 0.66;
/** Room of a sign with its words, in the units of the box. */
export const letterWidth = (words: string, isDiameter: boolean): number =>
  (words.length * letterEm + (isDiameter ? 0.95 : 0)) * letterSize;
