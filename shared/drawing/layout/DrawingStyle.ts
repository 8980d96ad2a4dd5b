/** Sizes on the screen, px: the same whatever the part measures, so that words and arrowheads stay legible. */
export type DrawingStyle = {
  fine: boolean;
  /** Size of a dimension's digits and of smaller words. */
  digits: number;
  words: number;
  arrow: number;
  /** From the view to the first dimension, and between dimensions. */
  clear: number;
  between: number;
  /** Tolerances and the user's own sizes are written out. */
  full: boolean;
};

const row: DrawingStyle = { fine: true, digits: 12, words: 12, arrow: 6, clear: 10, between: 8, full: false };
const desk: DrawingStyle = { fine: false, digits: 15, words: 12, arrow: 9, clear: 15, between: 12, full: true };
const phone: DrawingStyle = { ...desk, digits: 13, arrow: 8, clear: 12, between: 10 };

const smallPhone: DrawingStyle = { ...phone, digits: 12, words: 11, arrow: 7, clear: 9, between: 6 };

/** Below these widths (px) a large drawing takes smaller sizes. */
const narrow = 520;
const narrowest = 330;

export function styleFor(view: "row" | "large", width: number): DrawingStyle {
  if (view === "row") return row;
  if (width < narrowest) return smallPhone;
  return width < narrow ? phone : desk;
}
