import { literal, Op, QueryTypes } from "sequelize";
import { openParcelStates, type ParcelState } from "#shared/domain/parcelState";
import type { WorkshopParcelList, WorkshopParcelQuery } from "#shared/schemas/workshopParcel";
import { database } from "../db/inTransaction";
import { Parcel } from "../models/Parcel";
import type { Actor } from "../policies/Actor";
import { sentBy, toldOrderStates } from "../policies/parcelPolicy";
import { readOrderCursor, writeOrderCursor } from "./orderCursor";

const toldOrders = `(SELECT id FROM orders WHERE state IN (${toldOrderStates.map((state) => `'${state}'`).join(", ")}))`;

async function countByState({ workshopId }: Actor): Promise<WorkshopParcelList["counts"]> {
  const rows = await database().query<{ state: ParcelState; count: number }>(
    `SELECT state, count(*)::integer AS count FROM parcels
     WHERE workshop_id = $workshopId AND order_id IN ${toldOrders} GROUP BY state`,
    { bind: { workshopId }, type: QueryTypes.SELECT },
  );
  return Object.fromEntries(rows.map(({ state, count }) => [state, count]));
}

/**
 * A page of a workshop's parcels of paid orders: those that are still to leave by when they must, soonest first; those
 * that have left or never will, latest first.
 * Errors: `invalid-request` for a cursor that we did not give.
 */
export async function listWorkshopParcels(actor: Actor, { state, cursor, limit }: WorkshopParcelQuery) {
  const states: readonly ParcelState[] = state === "open" ? openParcelStates : [state];
  const soonestFirst = states.every((one) => (openParcelStates as readonly ParcelState[]).includes(one));
  const place = cursor ? readOrderCursor(cursor) : null;
  const beyond = place && {
    [Op.or]: [
      { leavesBy: { [soonestFirst ? Op.gt : Op.lt]: place.createdAt } },
      { leavesBy: place.createdAt, id: { [Op.gt]: place.id } },
    ],
  };
  const rows = await Parcel.findAll({
    where: {
      ...sentBy(actor),
      state: { [Op.in]: [...states] },
      orderId: { [Op.in]: literal(toldOrders) },
      ...(beyond ?? {}),
    },
    order: [
      ["leavesBy", soonestFirst ? "ASC" : "DESC"],
      ["id", "ASC"],
    ],
    limit: limit + 1,
  });
  const parcels = rows.slice(0, limit);
  const last = parcels.at(-1);
  // A paid order's parcels all have the time by which they leave; it is what the list goes by.
  const nextCursor =
    rows.length > limit && last?.leavesBy ? writeOrderCursor({ createdAt: last.leavesBy, id: last.id }) : null;
  return { parcels, counts: await countByState(actor), nextCursor };
}
