import { formatMoney } from "#shared/domain/money";
import { Order } from "../models/Order";
import type { Services } from "../Services";
import type { Letter } from "./Letter";

const reasons: Record<string, string> = {
  "stock-gone":
    "Your payment arrived after the time for it was over, and meanwhile the parts had gone to somebody else.",
  cancelled: "Your payment arrived after the order was cancelled.",
};

/** To the buyer: a payment goes back, how much, and why. */
export async function orderRefunded(orderId: string, reason: string, { config }: Services): Promise<Letter> {
  const order = await Order.findByPk(orderId, { rejectOnEmpty: true });
  const { number, currency } = order;
  return {
    subject: `Order ${number}: your money goes back to you`,
    opening: [
      `We gave back ${formatMoney(order.refundedMinor, currency)} (${currency}), all that you paid, to the card it came from. Banks take up to ten days to show it.`,
      ...(reasons[reason] ? [reasons[reason]] : []),
      "Nothing will be sent for this order.",
    ],
    action: { label: `See order ${number}`, url: `${config.publicUrl}/orders/${order.id}` },
    blocks: [],
    why: `You get this because you paid order ${number} at Idlewright.`,
  };
}
