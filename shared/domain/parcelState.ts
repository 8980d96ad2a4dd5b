export const parcelStates = [
  "to-accept",
  "core-awaited",
  "core-received",
  "core-refused",
  "in-work",
  "ready",
  "dispatched",
  "delivered",
  "closed",
  "declined",
  "cancelled",
] as const;
export type ParcelState = (typeof parcelStates)[number];

/**
 * What a parcel may become next.
 *
 * Only parcels with a re-mould pass through the core's states; a refused core may be followed by another one. A workshop
 * declines before it begins; a parcel is cancelled at any time before it has left.
 */
const next: Record<ParcelState, readonly ParcelState[]> = {
  "to-accept": ["core-awaited", "in-work", "declined", "cancelled"],
  "core-awaited": ["core-received", "cancelled"],
  "core-received": ["core-refused", "in-work", "cancelled"],
  "core-refused": ["core-awaited", "cancelled"],
  "in-work": ["ready", "cancelled"],
  ready: ["dispatched", "cancelled"],
  dispatched: ["delivered"],
  delivered: ["closed"],
  closed: [],
  declined: [],
  cancelled: [],
};

export const parcelMayBecome = (from: ParcelState, to: ParcelState): boolean => next[from].includes(to);

/** A parcel as a sentence says it: "This parcel is in work". */
export const parcelStateSaid: Record<ParcelState, string> = {
  "to-accept": "not accepted yet",
  "core-awaited": "waiting for its core",
  "core-received": "waiting for its core to be looked at",
  "core-refused": "waiting for another core",
  "in-work": "in work",
  ready: "ready",
  dispatched: "dispatched",
  delivered: "delivered",
  closed: "closed",
  declined: "declined",
  cancelled: "cancelled",
};

/** Parcels that have not left yet and still will. */
export const openParcelStates = [
  "to-accept",
  "core-awaited",
  "core-received",
  "core-refused",
  "in-work",
  "ready",
] as const satisfies readonly ParcelState[];
