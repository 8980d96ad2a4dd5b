import { formatMoney } from "#shared/domain/money";
import { Order } from "../models/Order";
import { Parcel } from "../models/Parcel";
import { readParcels } from "../orders/readParcels";
import type { Services } from "../Services";
import type { Letter } from "./Letter";
import { addressLines, dayInWords, lineBlocks } from "./orderParts";

/** To a workshop: what to make and pack, where it goes, by when, and its share. */
export async function newOrder(parcelId: string, { config, logger }: Services): Promise<Letter> {
  const parcel = await Parcel.findByPk(parcelId, { rejectOnEmpty: true });
  const order = await Order.findByPk(parcel.orderId, { rejectOnEmpty: true });
  const own = (await readParcels([order.id])).find((one) => one.parcel.id === parcelId);
  const lines = own?.lines ?? [];
  const { currency, number } = order;
  const money = (minor: number) => formatMoney(minor, currency);
  const pieces = lines.reduce((sum, { quantity }) => sum + quantity, 0);
  return {
    subject: `New order ${number}`,
    opening: [
      `${pieces === 1 ? "One piece is" : `${pieces} pieces are`} paid and yours to send${
        parcel.leavesBy ? ` by ${dayInWords(parcel.leavesBy)}` : ""
      }.`,
    ],
    action: { label: `See order ${number}`, url: `${config.publicUrl}/workshop/orders/${parcelId}` },
    blocks: [
      { heading: "To make and pack" },
      ...(await lineBlocks(lines, { currency, logger, madeToSize: "Made to the buyer's size" })),
      { heading: "Send to" },
      { lines: addressLines(order.shippingAddress) },
      { heading: "Your share" },
      {
        facts: [
          ["Parts", money(parcel.partsMinor)],
          ["Postage", money(parcel.shippingMinor)],
          ["Commission", money(-parcel.commissionMinor)],
          ["Your share", money(parcel.totalMinor - parcel.commissionMinor)],
          ...(parcel.taxMinor > 0 ? [["Tax contained, yours to pay on", money(parcel.taxMinor)] as const] : []),
        ],
      },
    ],
    why: "You get this because your workshop sells at Idlewright.",
  };
}
