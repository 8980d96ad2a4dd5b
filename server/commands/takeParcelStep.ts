import type { Transaction } from "sequelize";
import { parcelStateSaid } from "#shared/domain/parcelState";
import { nextStep, type ParcelStep, parcelStepDone, stateAfter } from "#shared/domain/parcelSteps";
import type { DispatchParcel } from "#shared/schemas/workshopParcel";
import { audit } from "../audit";
import { inTransaction } from "../db/inTransaction";
import { AppError } from "../errors/AppError";
import { Order } from "../models/Order";
import { OrderLine } from "../models/OrderLine";
import { Parcel } from "../models/Parcel";
import { User } from "../models/User";
import { parcelTarget } from "../orders/parcelTarget";
import type { Actor } from "../policies/Actor";
import { authorize } from "../policies/authorize";
import { parcelPolicy } from "../policies/parcelPolicy";
import { queueMail } from "./queueMail";

const dayMs = 24 * 3_600_000;

async function needsCore(parcelId: string, transaction: Transaction): Promise<boolean> {
  const lines = await OrderLine.findAll({ where: { parcelId }, transaction });
  return lines.some(({ listing }) => listing.offerType === "re-mould");
}

/** What a step writes beside the state: when a re-mould is due, counted from its core; when, how and by whom it left. */
function written(parcel: Parcel, step: ParcelStep, details: DispatchParcel, now: Date) {
  if (step === "core-received") return { leavesBy: new Date(now.getTime() + parcel.leavesInDays * dayMs) };
  if (step !== "dispatch") return {};
  return { carrier: details.carrier || null, trackingNumber: details.trackingNumber || null, dispatchedAt: now };
}

/** Whether a parcel that left did so with these words: the same call once more. */
const saysTheSame = (parcel: Parcel, { carrier, trackingNumber }: DispatchParcel) =>
  (parcel.carrier ?? "") === carrier && (parcel.trackingNumber ?? "") === trackingNumber;

async function tellBuyer(parcel: Parcel, transaction: Transaction): Promise<void> {
  const order = await Order.findByPk(parcel.orderId, { transaction, rejectOnEmpty: true });
  const buyer = await User.findByPk(order.buyerId, { transaction, rejectOnEmpty: true });
  await queueMail(
    {
      cause: `parcel-dispatched:${parcel.id}:buyer`,
      template: "parcel-dispatched",
      recipient: buyer.email,
      payload: { parcelId: parcel.id },
    },
    transaction,
  );
}

/**
 * Takes a workshop's parcel one step on; when it leaves, its buyer is told. A step that was just taken, sent again, changes
 * nothing and is not refused. `details` are written on dispatch alone.
 * Errors: `not-found` for a parcel that is not the actor's to send; `wrong-state` where another step is due.
 */
export function takeParcelStep(
  actor: Actor,
  parcelId: string,
  step: ParcelStep,
  now: Date,
  details: DispatchParcel = { carrier: "", trackingNumber: "" },
): Promise<Parcel> {
  return inTransaction(async (transaction) => {
    const parcel = await Parcel.findByPk(parcelId, { transaction, lock: transaction.LOCK.UPDATE });
    authorize(parcelPolicy, actor, "advance", parcel && (await parcelTarget(parcel, transaction)));
    if (!parcel) throw new AppError("not-found");

    const from = parcel.state;
    const to = stateAfter(step, await needsCore(parcelId, transaction));
    if (from === to && (step !== "dispatch" || saysTheSame(parcel, details))) return parcel;
    if (nextStep(from) !== step) {
      throw new AppError(
        "wrong-state",
        `This parcel is ${parcelStateSaid[from]}: it cannot be ${parcelStepDone[step]} now`,
      );
    }

    await parcel.update({ state: to, ...written(parcel, step, details, now) }, { transaction });
    const sent = step === "dispatch" ? details : {};
    await audit(
      {
        actorId: actor.id,
        action: `parcel-${to}`,
        subjectType: "parcel",
        subjectId: parcelId,
        at: now,
        detail: { from, ...sent },
      },
      transaction,
    );
    if (step === "dispatch") await tellBuyer(parcel, transaction);
    return parcel;
  });
}
