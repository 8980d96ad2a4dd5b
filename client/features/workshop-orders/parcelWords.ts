import type { ParcelState } from "#shared/domain/parcelState";
import type { ParcelStep } from "#shared/domain/parcelSteps";
import type { WorkshopParcelSummary } from "#shared/schemas/workshopParcel";
import { formatDay } from "../../lib/formatDate";

/** A parcel's state as a heading, and what its workshop does next. */
export const workshopParcelWords: Record<ParcelState, { name: string; next: string }> = {
  "to-accept": { name: "To accept", next: "Look at what was bought, then accept it." },
  "core-awaited": { name: "Core awaited", next: "The buyer sends the old part. Say so here when it has come." },
  "core-received": { name: "Core received", next: "Look at the hub; where it is sound, begin the work." },
  "core-refused": { name: "Core refused", next: "The hub that came cannot be used; another one may come." },
  "in-work": { name: "In work", next: "Make and pack it, then say so here." },
  ready: { name: "Ready", next: "Hand it over, then say so here: the buyer is told by mail." },
  dispatched: { name: "Dispatched", next: "It is on its way; nothing is left to do." },
  delivered: { name: "Delivered", next: "It has arrived; nothing is left to do." },
  closed: { name: "Closed", next: "It has come to its end." },
  declined: { name: "Declined", next: "It is not sent." },
  cancelled: { name: "Cancelled", next: "Do not send it." },
};

/** The steps that are one press of a button. */
export const stepNames: Record<Exclude<ParcelStep, "dispatch">, string> = {
  accept: "Accept it",
  "core-received": "The core has come",
  start: "Begin the work",
  ready: "It is packed",
};

type Due = Pick<WorkshopParcelSummary, "state" | "leavesBy" | "leavesInDays">;

/** By when a parcel must leave, and whether that is over; null where it does not wait to leave. */
export function dueOf({ state, leavesBy, leavesInDays }: Due, now: Date): { words: string; isLate: boolean } | null {
  switch (state) {
    case "core-awaited":
    case "core-refused": {
      const days = `${leavesInDays} ${leavesInDays === 1 ? "day" : "days"}`;
      return { words: `Leaves within ${days} of the core’s arrival`, isLate: false };
    }
    case "to-accept":
    case "core-received":
    case "in-work":
    case "ready": {
      if (!leavesBy) return null;
      const isLate = new Date(leavesBy) < now;
      return { words: `${isLate ? "Late: was to leave" : "Leaves"} by ${formatDay(leavesBy)}`, isLate };
    }
    default:
      return null;
  }
}
