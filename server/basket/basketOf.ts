import type { Request } from "express";
import type { Transaction } from "sequelize";
import { Basket } from "../models/Basket";
import type { Actor } from "../policies/Actor";

/** Whose basket: an account's own, or a visitor's by their session. */
export type BasketOwner = { userId: string } | { basketId: string | null };

export const basketOwner = (req: Request, actor: Actor | null): BasketOwner =>
  actor ? { userId: actor.id } : { basketId: req.session.basketId ?? null };

/** The basket of somebody, or null where nothing was put in one yet. A visitor never reaches an account's basket. */
export async function findBasket(
  owner: BasketOwner,
  { transaction, lock = false }: { transaction?: Transaction; lock?: boolean } = {},
): Promise<Basket | null> {
  const where = "userId" in owner ? { userId: owner.userId } : { id: owner.basketId, userId: null };
  if (where.id === null) return null;
  return Basket.findOne({
    where: where as { id?: string },
    transaction,
    ...(lock && transaction ? { lock: transaction.LOCK.UPDATE } : {}),
  });
}

/** The locked basket of somebody, made if there is none. */
export async function takeBasket(owner: BasketOwner, transaction: Transaction): Promise<Basket> {
  if ("userId" in owner) {
    await Basket.bulkCreate([{ userId: owner.userId }], { ignoreDuplicates: true, transaction });
  }
  return (await findBasket(owner, { transaction, lock: true })) ?? Basket.create({ userId: null }, { transaction });
}
