import type { BeltKind, BeltState } from "./beltState";

type StretchChoice = {
  id: string;
  words: string;
  kinds: readonly BeltKind[];
  min: number;
  max: number;
  isInside: boolean;
  source: string;
};

const rule = "common practice, no published source";
const polyurethane = "published installed-stretch recommendation for 83A and 92A polyurethane round belts";

/** How far a belt is stretched in place: the first of each kind is its default. */
export const stretchChoices: readonly StretchChoice[] = [
  { id: "flat", words: "Rubber, flat", kinds: ["flat-belt"], min: 3, max: 6, isInside: false, source: rule },
  { id: "square", words: "Rubber, square", kinds: ["square-belt"], min: 4, max: 7, isInside: false, source: rule },
  { id: "round", words: "Rubber, round", kinds: ["round-belt"], min: 5, max: 8, isInside: false, source: rule },
  {
    id: "o-ring",
    words: "O-ring as a belt",
    kinds: ["round-belt"],
    min: 8,
    max: 12,
    isInside: true,
    source: "published O-ring design guidance, counted on the inside diameter",
  },
  {
    id: "83A",
    words: "Polyurethane 83A",
    kinds: ["round-belt"],
    min: 10,
    max: 10,
    isInside: false,
    source: polyurethane,
  },
  {
    id: "92A",
    words: "Polyurethane 92A",
    kinds: ["round-belt"],
    min: 7.5,
    max: 7.5,
    isInside: false,
    source: polyurethane,
  },
];

export const choicesFor = (kind: BeltKind): StretchChoice[] =>
  stretchChoices.filter(({ kinds }) => kinds.includes(kind));

/** What a choice sets of the state. */
export const stretchOf = ({ min, max, isInside }: StretchChoice): Pick<BeltState, "stretch" | "isInsideStretch"> => ({
  stretch: { min: String(min), max: String(max) },
  isInsideStretch: isInside,
});

/** The choice that the state agrees with; undefined for numbers of one's own. */
export const choiceOf = ({ kind, stretch, isInsideStretch }: BeltState): StretchChoice | undefined =>
  choicesFor(kind).find(
    ({ min, max, isInside }) =>
      Number(stretch.min) === min && Number(stretch.max) === max && isInside === isInsideStretch,
  );
