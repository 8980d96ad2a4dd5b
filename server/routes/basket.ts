import { Basket, BasketLineParams, BasketQuery, PutBasketLine } from "#shared/schemas/basket";
import { type BasketOwner, basketOwner, findBasket } from "../basket/basketOf";
import { readBasket } from "../basket/readBasket";
import { putBasketLine } from "../commands/putBasketLine";
import { type Endpoint, endpoint } from "../http/endpoint";
import { BasketLine } from "../models/BasketLine";
import { presentBasket } from "../presenters/presentBasket";

const tag = "Basket";

async function show(owner: BasketOwner, shipTo: string): Promise<Basket> {
  const basket = await findBasket(owner);
  return presentBasket(basket && (await readBasket(basket.id, shipTo, { buyerId: basket.userId })), shipTo);
}

export function basketRoutes(): Endpoint[] {
  return [
    endpoint(
      {
        method: "get",
        path: "/basket",
        summary: "What was gathered, priced for one country, with what stands in the way of buying it.",
        tag,
        access: "anyone",
        query: BasketQuery,
        answer: Basket,
      },
      ({ req, actor, query }) => show(basketOwner(req, actor), query.shipTo),
    ),
    endpoint(
      {
        method: "put",
        path: "/basket/lines/:partId",
        summary: "Puts a part in the basket at this quantity, over what was there; answers the basket.",
        tag,
        access: "anyone",
        params: BasketLineParams,
        query: BasketQuery,
        body: PutBasketLine,
        answer: Basket,
      },
      async ({ req, actor, params, query, body }) => {
        const basket = await putBasketLine(basketOwner(req, actor), params.partId, body);
        if (!actor) req.session.basketId = basket.id;
        const { shipTo } = query;
        return presentBasket(await readBasket(basket.id, shipTo, { buyerId: basket.userId }), shipTo);
      },
    ),
    endpoint(
      {
        method: "delete",
        path: "/basket/lines/:partId",
        summary: "Takes a part out; answers the basket. Taking out what is not there changes nothing.",
        tag,
        access: "anyone",
        params: BasketLineParams,
        query: BasketQuery,
        answer: Basket,
      },
      async ({ req, actor, params, query }) => {
        const owner = basketOwner(req, actor);
        const basket = await findBasket(owner);
        if (basket) await BasketLine.destroy({ where: { basketId: basket.id, partId: params.partId } });
        return show(owner, query.shipTo);
      },
    ),
  ];
}
