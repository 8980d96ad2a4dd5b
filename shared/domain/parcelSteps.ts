import type { ParcelState } from "./parcelState";

/** What a workshop does with a parcel, in the order in which it does it; the core's step only where a core is sent in. */
export const parcelSteps = ["accept", "core-received", "start", "ready", "dispatch"] as const;
export type ParcelStep = (typeof parcelSteps)[number];

const before: Record<ParcelStep, ParcelState> = {
  accept: "to-accept",
  "core-received": "core-awaited",
  start: "core-received",
  ready: "in-work",
  dispatch: "ready",
};

const after: Record<Exclude<ParcelStep, "accept">, ParcelState> = {
  "core-received": "core-received",
  start: "in-work",
  ready: "ready",
  dispatch: "dispatched",
};

/** The step that the workshop takes next with a parcel in this state; null where it is not the workshop's turn. */
export const nextStep = (state: ParcelState): ParcelStep | null =>
  parcelSteps.find((step) => before[step] === state) ?? null;

/** What a parcel is after a step. `needsCore`: one of its lines is a re-mould, whose work begins when the core is there. */
export function stateAfter(step: ParcelStep, needsCore: boolean): ParcelState {
  if (step === "accept") return needsCore ? "core-awaited" : "in-work";
  return after[step];
}

/** A step as a refusal says it: "it cannot be accepted now". */
export const parcelStepDone: Record<ParcelStep, string> = {
  accept: "accepted",
  "core-received": "given a core",
  start: "begun",
  ready: "packed",
  dispatch: "dispatched",
};
