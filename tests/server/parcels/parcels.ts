import { Parcel } from "#server/models/Parcel";
import type { Part } from "#server/models/Part";
import { User } from "#server/models/User";
import { Workshop } from "#server/models/Workshop";
import type { ParcelState } from "#shared/domain/parcelState";
import { payAndApply, waitingOrder } from "#tests/server/orders/checkout";
import { buildPart, testPassword } from "#tests/support/factories";
import type { TestSite } from "#tests/support/testSite";
import { type Visitor, visitor } from "#tests/support/visitor";

/** The owner of the workshop that sells a part, signed in. */
export async function ownerOf(site: TestSite, { workshopId }: Part): Promise<Visitor> {
  const workshop = await Workshop.findByPk(workshopId, { rejectOnEmpty: true });
  const owner = await User.findByPk(workshop.ownerId, { rejectOnEmpty: true });
  const me = await visitor(site);
  await me.signIn(owner.email, testPassword);
  return me;
}

/** A paid order of one parcel, in a state, with its buyer and the owner of its workshop, signed in. */
export async function paidParcel(
  site: TestSite,
  { state, ...given }: { state?: ParcelState } & Omit<NonNullable<Parameters<typeof buildPart>[0]>, "state"> = {},
) {
  const part = await buildPart(given);
  const buyer = await waitingOrder(site, [part]);
  await payAndApply(site, buyer.sessionId);
  const parcel = await Parcel.findOne({ where: { orderId: buyer.orderId }, rejectOnEmpty: true });
  if (state) await parcel.update({ state, ...(state === "dispatched" ? { dispatchedAt: new Date() } : {}) });
  return { buyer, part, parcel, owner: await ownerOf(site, part) };
}
