import { beltTable } from "./plans/beltTable";
import { cassetteDeck } from "./plans/cassetteDeck";
import { changer } from "./plans/changer";
import { cine } from "./plans/cine";
import { dictation } from "./plans/dictation";
import { reelDeck } from "./plans/reelDeck";
import { wireRecorder } from "./plans/wireRecorder";

export const mechanismPlans = {
  changer,
  "belt-table": beltTable,
  "reel-deck": reelDeck,
  "cassette-deck": cassetteDeck,
  "wire-recorder": wireRecorder,
  dictation,
  cine,
} as const;
export type PlanName = keyof typeof mechanismPlans;
