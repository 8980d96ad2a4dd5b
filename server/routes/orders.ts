import { Op } from "sequelize";
import type { z } from "zod";
import { IdParams } from "#shared/schemas/common";
import { Order, OrderList, OrderListQuery, PlacedOrder, PlaceOrder } from "#shared/schemas/order";
import { cancelOrder } from "../commands/cancelOrder";
import { openPaymentPage } from "../commands/openPaymentPage";
import { placeOrder } from "../commands/placeOrder";
import { AppError } from "../errors/AppError";
import { type Endpoint, endpoint } from "../http/endpoint";
import { Order as OrderRow } from "../models/Order";
import { readOrderCursor, writeOrderCursor } from "../orders/orderCursor";
import { orderTarget } from "../orders/orderTarget";
import type { Actor } from "../policies/Actor";
import { authorize } from "../policies/authorize";
import { boughtBy, orderPolicy } from "../policies/orderPolicy";
import { presentOrder, presentOrders } from "../presenters/presentOrder";
import type { Services } from "../Services";

const tag = "Orders";
const checkoutLimit = { name: "place-order", points: 20, perSeconds: 60 };

async function findOrder(actor: Actor, id: string, verb: "read" | "pay"): Promise<OrderRow> {
  const order = await OrderRow.findByPk(id);
  authorize(orderPolicy, actor, verb, order && (await orderTarget(order)));
  if (!order) throw new AppError("not-found");
  return order;
}

async function listOrders(actor: Actor, { cursor, limit }: z.infer<typeof OrderListQuery>) {
  const after = cursor ? readOrderCursor(cursor) : null;
  const older = after && {
    [Op.or]: [{ createdAt: { [Op.lt]: after.createdAt } }, { createdAt: after.createdAt, id: { [Op.gt]: after.id } }],
  };
  const rows = await OrderRow.findAll({
    where: { ...boughtBy(actor), ...(older ?? {}) },
    order: [
      ["createdAt", "DESC"],
      ["id", "ASC"],
    ],
    limit: limit + 1,
  });
  const items = rows.slice(0, limit);
  const last = items.at(-1);
  return { items: await presentOrders(items), nextCursor: rows.length > limit && last ? writeOrderCursor(last) : null };
}

export function orderRoutes(services: Services): Endpoint[] {
  return [
    endpoint(
      {
        method: "post",
        path: "/orders",
        summary: "Makes an order from the basket, holds its stock, and gives the page to pay it on.",
        tag,
        access: "signed-in",
        body: PlaceOrder,
        answer: PlacedOrder,
        status: 201,
        limit: checkoutLimit,
      },
      ({ actor, body, now }) => placeOrder(services, actor, body, now),
    ),
    endpoint(
      {
        method: "get",
        path: "/orders",
        summary: "What one has bought, newest first.",
        tag,
        access: "signed-in",
        query: OrderListQuery,
        answer: OrderList,
      },
      ({ actor, query }) => listOrders(actor, query),
    ),
    endpoint(
      {
        method: "get",
        path: "/orders/:id",
        summary: "An order as it stands; a workshop sees its own parcel of a paid one.",
        tag,
        access: "signed-in",
        params: IdParams,
        answer: Order,
      },
      async ({ actor, params }) => presentOrder(await findOrder(actor, params.id, "read"), actor),
    ),
    endpoint(
      {
        method: "post",
        path: "/orders/:id/pay",
        summary: "The payment page of an order that waits for payment, once more.",
        tag,
        access: "signed-in",
        params: IdParams,
        answer: PlacedOrder,
        limit: checkoutLimit,
      },
      async ({ actor, params, now }) => {
        const order = await findOrder(actor, params.id, "pay");
        const { url } = await openPaymentPage(services, order.id, now);
        return { orderId: order.id, number: order.number, paymentUrl: url };
      },
    ),
    endpoint(
      {
        method: "post",
        path: "/orders/:id/cancel",
        summary: "Cancels an order that waits for payment; its page is closed and its stock let go.",
        tag,
        access: "signed-in",
        params: IdParams,
        answer: Order,
        limit: checkoutLimit,
      },
      async ({ actor, params, now }) => presentOrder(await cancelOrder(services, actor, params.id, now), actor),
    ),
  ];
}
