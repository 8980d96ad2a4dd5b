import { useState } from "react";
import type { Order } from "#shared/schemas/order";
import { leaveTo } from "../../lib/leaveTo";
import { Button } from "../../ui/Button";
import { FailureNotice } from "../../ui/FailureNotice";
import { usePayOrder } from "./api";
import { CancelDialog } from "./CancelDialog";

/** Pays an order that waits for it, or cancels it after asking once. */
export function OrderActions({ order }: { order: Order }) {
  const pay = usePayOrder(order.id);
  const [isAsking, setAsking] = useState(false);
  return (
    <div className="grid gap-4 print:hidden">
      <div className="flex flex-wrap gap-3">
        {order.can.pay && (
          <Button
            look="primary"
            className="min-w-36"
            // Stays disabled after success: the page is being left.
            disabled={pay.isPending || pay.isSuccess}
            onClick={() => pay.mutate(undefined, { onSuccess: ({ paymentUrl }) => leaveTo(paymentUrl) })}
          >
            Pay now
          </Button>
        )}
        {order.can.cancel && <Button onClick={() => setAsking(true)}>Cancel this order</Button>}
      </div>
      {order.can.pay && (
        <p className="text-soft">You pay on the payment service’s own page; no card details reach Idlewright.</p>
      )}
      {pay.isError && <FailureNotice error={pay.error} what="The payment page could not be opened" />}
      <CancelDialog order={order} open={isAsking} onClose={() => setAsking(false)} />
    </div>
  );
}
