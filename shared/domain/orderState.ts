export const orderStates = ["draft", "awaiting-payment", "paid", "closed", "expired", "cancelled"] as const;
export type OrderState = (typeof orderStates)[number];

/**
 * What an order may become next.
 *
 * A payment that reaches us after the order expired still counts where the stock is there: the buyer has paid.
 */
const next: Record<OrderState, readonly OrderState[]> = {
  draft: ["awaiting-payment", "cancelled"],
  "awaiting-payment": ["paid", "expired", "cancelled"],
  paid: ["closed"],
  closed: [],
  expired: ["paid"],
  cancelled: [],
};

export const orderMayBecome = (from: OrderState, to: OrderState): boolean => next[from].includes(to);

/** An order as a sentence says it: "This order is waiting for payment". */
export const orderStateWords: Record<OrderState, string> = {
  draft: "not placed yet",
  "awaiting-payment": "waiting for payment",
  paid: "paid",
  closed: "closed",
  expired: "expired",
  cancelled: "cancelled",
};
