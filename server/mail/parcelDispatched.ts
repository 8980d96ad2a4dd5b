import { Order } from "../models/Order";
import { Parcel } from "../models/Parcel";
import { readParcels } from "../orders/readParcels";
import type { Services } from "../Services";
import type { Letter } from "./Letter";
import { addressLines, dayInWords, lineBlocks } from "./orderParts";

/** To the buyer: a parcel has left, with what is in it, how it travels and where it goes. */
export async function parcelDispatched(parcelId: string, { config, logger }: Services): Promise<Letter> {
  const { orderId } = await Parcel.findByPk(parcelId, { rejectOnEmpty: true });
  const order = await Order.findByPk(orderId, { rejectOnEmpty: true });
  const { number, currency } = order;
  const own = (await readParcels([orderId])).find(({ parcel }) => parcel.id === parcelId);
  if (!own) throw new Error(`parcel ${parcelId} is not in its order`);
  const { parcel, lines, workshop } = own;
  const facts: [string, string][] = [
    ["Left on", dayInWords(parcel.dispatchedAt ?? parcel.updatedAt)],
    ...(parcel.carrier ? [["Carried by", parcel.carrier] as [string, string]] : []),
    ...(parcel.trackingNumber ? [["Tracking number", parcel.trackingNumber] as [string, string]] : []),
  ];
  return {
    subject: `Order ${number}: ${workshop.name} has sent its parcel`,
    opening: [`${workshop.name}, ${workshop.town}, handed your parcel over.`],
    action: { label: `See order ${number}`, url: `${config.publicUrl}/orders/${orderId}` },
    blocks: [
      { heading: "On its way" },
      { facts },
      { heading: "In the parcel" },
      ...(await lineBlocks(lines, { currency, logger, madeToSize: "Made to your size" })),
      { heading: "Sent to" },
      { lines: addressLines(order.shippingAddress) },
      { paragraph: "Measure what comes before you fit it, and keep the packing until you have." },
    ],
    why: `You get this because you paid order ${number} at Idlewright.`,
  };
}
