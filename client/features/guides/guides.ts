import { type ComponentType, lazy } from "react";
import type { PartKind } from "#shared/domain/partKinds";

export type Guide = {
  slug: string;
  title: string;
  /** What it tells, in one sentence. */
  summary: string;
  group: "measuring" | "working";
  /** The kinds that it tells how to measure. */
  kinds: readonly PartKind[];
  Body: ComponentType<{ guide: Guide }>;
};

// Each guide's body is fetched when it is first opened.
const Kind = lazy(async () => ({ default: (await import("./KindGuide")).KindGuide }));
const Kit = lazy(async () => ({ default: (await import("./KitGuide")).KitGuide }));
const Conditions = lazy(async () => ({ default: (await import("./ConditionsGuide")).ConditionsGuide }));
const FitChance = lazy(async () => ({ default: (await import("./FitChanceGuide")).FitChanceGuide }));
const Instruments = lazy(async () => ({ default: (await import("./InstrumentsGuide")).InstrumentsGuide }));
const Limits = lazy(async () => ({ default: (await import("./LimitsGuide")).LimitsGuide }));
const Cautions = lazy(async () => ({ default: (await import("./CautionsGuide")).CautionsGuide }));

const measuring = (slug: string, title: string, summary: string, kinds: readonly PartKind[]): Guide => ({
  slug,
  title,
  summary,
  group: "measuring",
  kinds,
  Body: Kind,
});
const working = (slug: string, title: string, summary: string, Body: Guide["Body"]): Guide => ({
  slug,
  title,
  summary,
  group: "working",
  kinds: [],
  Body,
});

/** Every guide, in the order in which they are read. */
export const guides: readonly Guide[] = [
  measuring("idler-wheel", "Measuring an idler wheel", "Three diameters round the rubber, the bore, the widths.", [
    "idler-wheel",
  ]),
  measuring(
    "pinch-roller",
    "Measuring a pinch roller",
    "Its diameter beside the groove of the tape, the bore, the lengths.",
    ["pinch-roller"],
  ),
  measuring("belts", "Measuring a belt", "Flat, square or round: the inside of the loop, then its section.", [
    "flat-belt",
    "square-belt",
    "round-belt",
  ]),
  measuring("drive-ring", "Measuring a drive ring", "The free ring, off its hub: inside diameter and section.", [
    "drive-ring",
  ]),
  measuring("motor-mount", "Measuring a motor mount", "A grommet without its load: flange, hole, groove, height.", [
    "motor-mount",
  ]),
  measuring("pads-and-felts", "Measuring brake pads and felts", "Soft things that the jaws must only touch.", [
    "brake-pad",
    "clutch-felt",
  ]),
  {
    ...working("rebuild-kit", "What to do with a kit", "A kit is as good as its lines: measure each part.", Kit),
    group: "measuring",
  },
  working(
    "conditions",
    "What age does to a size",
    "What each condition takes or adds, and how surely that is known.",
    Conditions,
  ),
  working(
    "fit-chance",
    "How the fit chance is worked out",
    "A bell curve over what the place accepts, with every step.",
    FitChance,
  ),
  working(
    "instruments",
    "What the instruments are worth",
    "How far each may be off, from a micrometer to a string.",
    Instruments,
  ),
  working("limits", "What cannot be known", "Where the numbers end, and what to do there.", Limits),
  working("cautions", "Cautions at the bench", "Mains, spinning parts, tar, vapour and dust.", Cautions),
];

export const groupTitles = { measuring: "Measuring the old part", working: "From the reading to the part" } as const;
