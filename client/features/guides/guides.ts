import { type ComponentType, lazy } from "react";
import { type GuideEntry, measuringGuides } from "./measuringGuides";

export type Guide = GuideEntry & {
  group: "measuring" | "working";
  Body: ComponentType<{ guide: GuideEntry }>;
};

// Each guide's body is fetched when it is first opened.
const Kind = lazy(async () => ({ default: (await import("./KindGuide")).KindGuide }));
const Kit = lazy(async () => ({ default: (await import("./KitGuide")).KitGuide }));
const Conditions = lazy(async () => ({ default: (await import("./ConditionsGuide")).ConditionsGuide }));
const FitChance = lazy(async () => ({ default: (await import("./FitChanceGuide")).FitChanceGuide }));
const Instruments = lazy(async () => ({ default: (await import("./InstrumentsGuide")).InstrumentsGuide }));
const Limits = lazy(async () => ({ default: (await import("./LimitsGuide")).LimitsGuide }));
const Cautions = lazy(async () => ({ default: (await import("./CautionsGuide")).CautionsGuide }));

const guide = (group: Guide["group"], slug: string, title: string, summary: string, Body: Guide["Body"]): Guide => ({
  slug,
  title,
  summary,
  kinds: [],
  group,
  Body,
});

/** Every guide, in the order in which they are read. */
export const guides: readonly Guide[] = [
  ...measuringGuides.map((entry): Guide => ({ ...entry, group: "measuring", Body: Kind })),
  guide("measuring", "rebuild-kit", "What to do with a kit", "A kit is as good as its lines: measure each part.", Kit),
  guide(
    "working",
    "conditions",
    "What age does to a size",
    "What each condition takes or adds, and how surely that is known.",
    Conditions,
  ),
  guide(
    "working",
    "fit-chance",
    "How the fit chance is worked out",
    "A bell curve over what the place accepts, with every step.",
    FitChance,
  ),
  guide(
    "working",
    "instruments",
    "What the instruments are worth",
    "How far each may be off, from a micrometer to a string.",
    Instruments,
  ),
  guide("working", "limits", "What cannot be known", "Where the numbers end, and what to do there.", Limits),
  guide("working", "cautions", "Cautions at the bench", "Mains, spinning parts, tar, vapour and dust.", Cautions),
];

export const groupTitles = { measuring: "Measuring the old part", working: "From the reading to the part" } as const;
