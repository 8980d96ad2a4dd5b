import type { BeltSampleMethod } from "#shared/domain/beltSample";

type MethodWords = {
  name: string;
  /** How it is done, in a few words under the picture. */
  how: string;
  /** What a reading is. */
  reading: string;
  hint: string;
};

export const methodWords: Record<BeltSampleMethod, MethodWords> = {
  "inside-circumference": {
    name: "Along the inside",
    how: "a tape or string laid once round",
    reading: "Inside circumference",
    hint: "Lay it in without stretching the belt; read where its end meets itself.",
  },
  "lay-flat-inside": {
    name: "Laid flat, inside",
    how: "from fold to fold, on a rule",
    reading: "Length inside the folds",
    hint: "Press it just flat. Read from the inside of one fold to the inside of the other.",
  },
  "lay-flat-outside": {
    name: "Laid flat, over all",
    how: "over tight folds, thickness taken off",
    reading: "Length over the folds",
    hint: "Fold it shut, so that its insides touch, and measure over both folds.",
  },
  "inside-diameter": {
    name: "Across, lying round",
    how: "between inside jaws, or on a cone",
    reading: "Inside diameter",
    hint: "Let it slide down a cone until it just rests, and read there; do not push.",
  },
  "outside-circumference": {
    name: "Around the outside",
    how: "a string round it, thickness taken off",
    reading: "Outside circumference",
    hint: "Put the belt on something round that it does not stretch over, and go round it once.",
  },
};
