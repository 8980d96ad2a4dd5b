import { QueryTypes } from "sequelize";
import { findBasket, takeBasket } from "../basket/basketOf";
import { database, inTransaction } from "../db/inTransaction";

/**
 * Puts what a visitor gathered into the basket of the account they sign in to, and ends the visitor's basket.
 * Quantities of the same part are added, up to 99; a basket that belongs to an account or is gone changes nothing.
 * The full basket of the account may then hold more than 50 parts: nothing gathered is lost.
 */
export function mergeBasket(sessionBasketId: string, userId: string): Promise<void> {
  return inTransaction(async (transaction) => {
    const from = await findBasket({ basketId: sessionBasketId }, { transaction, lock: true });
    if (!from) return;
    const into = await takeBasket({ userId }, transaction);
    await database().query(
      `INSERT INTO basket_lines (basket_id, part_id, quantity, for_need, added_at)
       SELECT $into, part_id, quantity, for_need, added_at FROM basket_lines WHERE basket_id = $from ORDER BY part_id
       ON CONFLICT (basket_id, part_id) DO UPDATE SET quantity = least(99, basket_lines.quantity + EXCLUDED.quantity),
         for_need = coalesce(EXCLUDED.for_need, basket_lines.for_need)`,
      { bind: { into: into.id, from: from.id }, type: QueryTypes.INSERT, transaction },
    );
    await from.destroy({ transaction });
  });
}
