import { QueryTypes } from "sequelize";
import type { PutBasketLine } from "#shared/schemas/basket";
import { type BasketOwner, takeBasket } from "../basket/basketOf";
import { largestPaymentMinor } from "../basket/marketCurrency";
import { database, inTransaction } from "../db/inTransaction";
import { AppError } from "../errors/AppError";
import type { Basket } from "../models/Basket";
import { BasketLine } from "../models/BasketLine";
import { Part } from "../models/Part";
import { Workshop } from "../models/Workshop";

const mostLines = 50;

/** Puts a part in somebody's basket at this quantity, over what was there. Gives the basket. */
export function putBasketLine(owner: BasketOwner, partId: string, input: PutBasketLine): Promise<Basket> {
  return inTransaction(async (transaction) => {
    const basket = await takeBasket(owner, transaction);
    const part = await Part.findByPk(partId, { transaction });
    const workshop = part && (await Workshop.findByPk(part.workshopId, { transaction }));
    if (part?.state !== "published" || workshop?.state !== "admitted") {
      throw new AppError("not-found", "This part is no longer sold");
    }
    if (part.priceMinor * input.quantity > largestPaymentMinor) {
      const detail = "This is more than can be paid at once: take fewer";
      throw new AppError("invalid-request", detail, { errors: [{ pointer: "#/quantity", detail }] });
    }
    await database().query(
      `INSERT INTO basket_lines (basket_id, part_id, quantity, for_need) VALUES ($basketId, $partId, $quantity, $forNeed)
       ON CONFLICT (basket_id, part_id) DO UPDATE SET quantity = EXCLUDED.quantity,
         for_need = coalesce(EXCLUDED.for_need, basket_lines.for_need)`,
      {
        bind: { basketId: basket.id, partId, quantity: input.quantity, forNeed: input.forNeed || null },
        type: QueryTypes.INSERT,
        transaction,
      },
    );
    if ((await BasketLine.count({ where: { basketId: basket.id }, transaction })) > mostLines) {
      throw new AppError(
        "wrong-state",
        `A basket holds ${mostLines} different parts: pay these first, or take one out`,
      );
    }
    return basket;
  });
}
