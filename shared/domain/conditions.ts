import { kindFacts, type PartKind, partKinds } from "./partKinds";

export const conditions = [
  "sound",
  "glazed",
  "hardened",
  "flat-spotted",
  "swollen",
  "slack",
  "melted",
  "missing",
] as const;
export type Condition = (typeof conditions)[number];

const belts: readonly PartKind[] = ["flat-belt", "square-belt", "round-belt"];
const rolling: readonly PartKind[] = ["idler-wheel", "pinch-roller", "drive-ring"];

type ConditionFacts = {
  name: string;
  /** How to tell, in a few words. */
  sign: string;
  kinds: readonly PartKind[];
  /** False where nothing is left to measure. */
  hasReadings: boolean;
};

export const conditionFacts: Record<Condition, ConditionFacts> = {
  sound: { name: "sound", sign: "still springy, not shiny, runs true", kinds: partKinds, hasReadings: true },
  glazed: {
    name: "glazed",
    sign: "the running face is shiny and slips",
    kinds: partKinds.filter((kind) => kind !== "motor-mount"),
    hasReadings: true,
  },
  hardened: { name: "hardened", sign: "a fingernail leaves no mark", kinds: partKinds, hasReadings: true },
  "flat-spotted": {
    name: "flat-spotted",
    sign: "a dent where it was parked against its shaft; it thumps",
    kinds: rolling,
    hasReadings: true,
  },
  swollen: { name: "swollen", sign: "oil-soaked, spongy, larger than it was", kinds: partKinds, hasReadings: true },
  slack: {
    name: "slack",
    sign: "stretched; it hangs loose on its pulleys or hub",
    kinds: [...belts, "drive-ring"],
    hasReadings: true,
  },
  melted: {
    name: "melted",
    sign: "gone to tar; no size is left",
    kinds: partKinds.filter((kind) => kind !== "clutch-felt"),
    hasReadings: false,
  },
  missing: { name: "missing", sign: "there is no old part", kinds: partKinds, hasReadings: false },
};

/** The conditions that a part of this kind can be in, in the order in which they are offered. */
export function conditionsFor(kind: PartKind): readonly Condition[] {
  return conditions.filter((condition) => conditionFacts[condition].kinds.includes(kind));
}

/** Why a condition is refused for a kind, in words; undefined where it makes sense. */
export function conditionProblem(kind: PartKind, condition: Condition): string | undefined {
  if (conditionFacts[condition].kinds.includes(kind)) return undefined;
  const names = conditionsFor(kind).map((possible) => conditionFacts[possible].name);
  return `${capitalised(kindFacts[kind].plural)} do not become ${conditionFacts[condition].name}. Choose one of: ${names.join(", ")}.`;
}

const capitalised = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);
