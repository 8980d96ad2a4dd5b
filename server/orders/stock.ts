import { Op, QueryTypes, type Transaction } from "sequelize";
import { database } from "../db/inTransaction";
import { Part } from "../models/Part";

/** Pieces of one part. */
export type Pieces = { partId: string; quantity: number };

/** What an order takes from stock, in the order of part ids, in which everything that moves stock locks. */
export function stockOf(orderId: string, transaction: Transaction): Promise<Pieces[]> {
  return database().query<Pieces>(
    `SELECT l.part_id AS "partId", sum(l.quantity)::integer AS quantity
     FROM order_lines l JOIN parcels p ON p.id = l.parcel_id
     WHERE p.order_id = $orderId AND l.holds_stock GROUP BY l.part_id ORDER BY l.part_id`,
    { bind: { orderId }, type: QueryTypes.SELECT, transaction },
  );
}

/** Pieces of each part that one buyer's unpaid orders hold. */
export async function heldBy(buyerId: string, transaction?: Transaction): Promise<Map<string, number>> {
  const held = await database().query<Pieces>(
    `SELECT l.part_id AS "partId", sum(l.quantity)::integer AS quantity
     FROM orders o JOIN parcels p ON p.order_id = o.id JOIN order_lines l ON l.parcel_id = p.id
     WHERE o.buyer_id = $buyerId AND o.state = 'awaiting-payment' AND l.holds_stock GROUP BY l.part_id`,
    { bind: { buyerId }, type: QueryTypes.SELECT, transaction },
  );
  return new Map(held.map(({ partId, quantity }) => [partId, quantity]));
}

const byId = (pieces: readonly Pieces[]) => [...pieces].sort((a, b) => (a.partId < b.partId ? -1 : 1));

async function change(sql: string, pieces: readonly Pieces[], transaction: Transaction): Promise<void> {
  for (const { partId, quantity } of byId(pieces)) {
    await database().query(sql, { bind: { partId, quantity }, transaction });
  }
}

/** Holds pieces for an order: all of them, or none and false where there are not enough of one. */
export async function reserveStock(pieces: readonly Pieces[], transaction: Transaction): Promise<boolean> {
  const parts = await Part.findAll({
    where: { id: { [Op.in]: pieces.map(({ partId }) => partId) } },
    order: [["id", "ASC"]],
    lock: transaction.LOCK.NO_KEY_UPDATE,
    transaction,
  });
  const left = new Map(parts.map(({ id, stockOnHand, stockReserved }) => [id, (stockOnHand ?? 0) - stockReserved]));
  if (pieces.some(({ partId, quantity }) => (left.get(partId) ?? 0) < quantity)) return false;
  await change("UPDATE parts SET stock_reserved = stock_reserved + $quantity WHERE id = $partId", pieces, transaction);
  return true;
}

/** Lets go of pieces that were held. */
export const releaseStock = (pieces: readonly Pieces[], transaction: Transaction): Promise<void> =>
  change("UPDATE parts SET stock_reserved = stock_reserved - $quantity WHERE id = $partId", pieces, transaction);

/** Pieces that were held are sold. */
export const takeStock = (pieces: readonly Pieces[], transaction: Transaction): Promise<void> =>
  change(
    `UPDATE parts SET stock_on_hand = stock_on_hand - $quantity, stock_reserved = stock_reserved - $quantity
     WHERE id = $partId`,
    pieces,
    transaction,
  );
