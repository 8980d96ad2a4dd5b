import { DomainError } from "#shared/domain/DomainError";
import { strobeDrift } from "#shared/domain/strobe";
import type { DiscRing } from "#shared/drawing/sheets/discLayout";
import { speedName } from "#shared/drawing/sheets/strobeWords";
import { readPlainNumber } from "../readPlainNumber";
import type { SheetsState } from "./sheetsState";

/** Names a ring among those of a disc: "45", or "45 by 3" for the one whose bars pass by threes. */
export const ringKey = ({ rpm, barsPerFlash }: DiscRing): string =>
  `${speedName(rpm)}${barsPerFlash > 1 ? ` by ${barsPerFlash}` : ""}`;

type Counted = Pick<SheetsState, "ring" | "count" | "seconds" | "way">;
export type Drift = {
  ring: DiscRing | undefined;
  shown: { rpm: number; errorPercent: number } | null;
  errors: { count?: string; seconds?: string };
};

/** The true speed from bars that were counted on one ring, going by in so many seconds. */
export function readDrift(rings: readonly DiscRing[], mainsHz: number, counted: Counted): Drift {
  const ring = rings.find((one) => ringKey(one) === counted.ring) ?? rings[0];
  const [count, seconds] = [readPlainNumber(counted.count), readPlainNumber(counted.seconds)];
  const none = { ring, shown: null };
  if (!ring) return { ...none, errors: {} };
  if (count === null) return { ...none, errors: counted.count.trim() === "" ? { count: "How many bars passed?" } : {} };
  if (count < 0) return { ...none, errors: { count: "Count from 0; which way they go is said beside it." } };
  if (seconds === null || !(seconds > 0)) return { ...none, errors: { seconds: "For how many seconds, more than 0?" } };
  try {
    const barsPerMinute = ((counted.way === "fast" ? 1 : -1) * count * 60) / seconds;
    return { ring, shown: strobeDrift({ ...ring, mainsHz, barsPerMinute }), errors: {} };
  } catch (error) {
    if (!(error instanceof DomainError)) throw error;
    return { ...none, errors: { count: error.words } };
  }
}
