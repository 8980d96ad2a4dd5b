import type { OrderState } from "#shared/domain/orderState";

const colours: Record<OrderState, string> = {
  draft: "text-soft",
  "awaiting-payment": "text-measured",
  paid: "text-inband",
  closed: "text-ink",
  expired: "text-outband",
  cancelled: "text-soft",
};

/** The shape of an order's state: dashed while it waits, hatched when paid, full when done, crossed out when it came to nothing. */
export function OrderMark({ state, size = 18 }: { state: OrderState; size?: number }) {
  const isOff = state === "expired" || state === "cancelled";
  const waits = state === "draft" || state === "awaiting-payment";
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 18 18"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.6"
      aria-hidden="true"
      className={`shrink-0 ${colours[state]}`}
    >
      <rect
        x="2"
        y="2"
        width="14"
        height="14"
        fill={state === "closed" ? "currentColor" : "none"}
        strokeDasharray={waits ? "3.5 2.1" : undefined}
      />
      {state === "paid" && <path d="M2 9L9 2M2 16L16 2M9 16L16 9" />}
      {isOff && <path d="M2 2L16 16M2 16L16 2" />}
    </svg>
  );
}
