import type { OrderState } from "#shared/domain/orderState";
import type { ParcelState } from "#shared/domain/parcelState";
import { nextStep, type ParcelStep } from "#shared/domain/parcelSteps";
import type { Actor } from "./Actor";

/** A parcel as its policy sees it: whose it is to send, and whether its order is paid. */
export type ParcelTarget = { workshopId: string; orderState: OrderState };

/** Orders whose workshops have been told of them. */
export const toldOrderStates = ["paid", "closed"] as const satisfies readonly OrderState[];

const isSeller = (actor: Actor, { workshopId, orderState }: ParcelTarget) =>
  actor.role === "workshop" &&
  actor.workshopId === workshopId &&
  (toldOrderStates as readonly OrderState[]).includes(orderState);

/** What a workshop may do with its own parcels; buyers and administrators read the order instead. */
export const parcelPolicy = { read: isSeller, advance: isSeller };

/** The parcels of a workshop's own list, as a query over parcels whose orders are told; none without a workshop. */
export const sentBy = ({ workshopId }: Actor) => ({ workshopId: workshopId === null ? [] : [workshopId] });

/** The steps that the actor may take with a parcel as it stands. */
export function allowedSteps(actor: Actor, parcel: ParcelTarget & { state: ParcelState }): ParcelStep[] {
  const step = parcelPolicy.advance(actor, parcel) ? nextStep(parcel.state) : null;
  return step ? [step] : [];
}
