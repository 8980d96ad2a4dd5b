import type { Transaction } from "sequelize";
import type { Order } from "../models/Order";
import { Parcel } from "../models/Parcel";
import type { OrderTarget } from "../policies/orderPolicy";

/** An order as its policy sees it. */
export async function orderTarget(order: Order, transaction?: Transaction): Promise<OrderTarget> {
  const parcels = await Parcel.findAll({ where: { orderId: order.id }, attributes: ["workshopId"], transaction });
  return { buyerId: order.buyerId, state: order.state, workshopIds: parcels.map(({ workshopId }) => workshopId) };
}
