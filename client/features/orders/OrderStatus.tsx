import { Link } from "react-router-dom";
import type { Order } from "#shared/schemas/order";
import { Button } from "../../ui/Button";
import { OrderActions } from "./OrderActions";
import { OrderMark } from "./OrderMark";
import { nextWords, orderStateNames } from "./orderWords";

type Props = {
  order: Order;
  /** The payment service's word is awaited. */
  isWaiting: boolean;
  waitedInVain: boolean;
  /** Its buyer left the payment page without paying. */
  left: boolean;
  onLookAgain: () => void;
};

/** Where an order stands and what happens next. */
export function OrderStatus({ order, isWaiting, waitedInVain, left, onLookAgain }: Props) {
  const { state } = order;
  const ended = state === "expired" || state === "cancelled";
  return (
    <section aria-label="Where it stands" className="grid gap-4 border-y border-rule bg-sheet px-5 py-5 print:px-0">
      <div role="status" className="grid gap-1">
        <p className="flex items-center gap-3 text-step2 font-bold">
          <OrderMark state={state} size={24} />
          {isWaiting ? "Waiting for the payment service’s word" : orderStateNames[state]}
        </p>
        <p className="max-w-prose">
          {isWaiting && "You came back from its page. This takes a few seconds; you need not stay."}
          {waitedInVain &&
            "No word from the payment service yet. If you paid, this order turns to paid as soon as the word comes, and a mail tells you."}
          {left && state === "awaiting-payment" && "You left without paying: nothing was charged. "}
          {!isWaiting && !waitedInVain && nextWords(order, new Date())}
        </p>
      </div>
      {waitedInVain && (
        <Button className="justify-self-start print:hidden" onClick={onLookAgain}>
          Look again
        </Button>
      )}
      {!isWaiting && (order.can.pay || order.can.cancel) && <OrderActions order={order} />}
      {ended && (
        <p className="print:hidden">
          <Link to="/basket" className="inline-block min-h-6">
            Look at the basket
          </Link>
          : what was not paid may still lie there.
        </p>
      )}
    </section>
  );
}
