import type { PartKind } from "#shared/domain/partKinds";

/** What stands of a guide in the index. */
export type GuideEntry = {
  slug: string;
  title: string;
  /** What it tells, in one sentence. */
  summary: string;
  /** The kinds that it tells how to measure. */
  kinds: readonly PartKind[];
};

/** The guides to measuring, every kind in one of them. */
export const measuringGuides: readonly GuideEntry[] = [
  {
    slug: "idler-wheel",
    title: "Measuring an idler wheel",
    summary: "Three diameters round the rubber, the bore, the widths.",
    kinds: ["idler-wheel"],
  },
  {
    slug: "pinch-roller",
    title: "Measuring a pinch roller",
    summary: "Its diameter beside the groove of the tape, the bore, the lengths.",
    kinds: ["pinch-roller"],
  },
  {
    slug: "belts",
    title: "Measuring a belt",
    summary: "Flat, square or round: the inside of the loop, then its section.",
    kinds: ["flat-belt", "square-belt", "round-belt"],
  },
  {
    slug: "drive-ring",
    title: "Measuring a drive ring",
    summary: "The free ring, off its hub: inside diameter and section.",
    kinds: ["drive-ring"],
  },
  {
    slug: "motor-mount",
    title: "Measuring a motor mount",
    summary: "A grommet without its load: flange, hole, groove, height.",
    kinds: ["motor-mount"],
  },
  {
    slug: "pads-and-felts",
    title: "Measuring brake pads and felts",
    summary: "Soft things that the jaws must only touch.",
    kinds: ["brake-pad", "clutch-felt"],
  },
];
