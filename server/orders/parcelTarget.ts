import type { Transaction } from "sequelize";
import { Order } from "../models/Order";
import type { Parcel } from "../models/Parcel";
import type { ParcelTarget } from "../policies/parcelPolicy";

/** A parcel as its policy sees it. */
export async function parcelTarget({ orderId, workshopId }: Parcel, transaction?: Transaction): Promise<ParcelTarget> {
  const { state } = await Order.findByPk(orderId, { attributes: ["state"], transaction, rejectOnEmpty: true });
  return { workshopId, orderState: state };
}
