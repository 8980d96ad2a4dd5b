import type { Order } from "#shared/schemas/order";
import { announce } from "../../lib/announcements";
import { Button } from "../../ui/Button";
import { Dialog } from "../../ui/Dialog";
import { FailureNotice } from "../../ui/FailureNotice";
import { useCancelOrder } from "./api";

type Props = { order: Order; open: boolean; onClose: () => void };

/** Asks once before an order is cancelled, naming what is let go. */
export function CancelDialog({ order, open, onClose }: Props) {
  const cancel = useCancelOrder(order.id);
  const close = () => {
    cancel.reset();
    onClose();
  };
  const onCancel = () =>
    cancel.mutate(undefined, {
      onSuccess: () => {
        announce(`Order ${order.number} is cancelled`);
        close();
      },
    });
  return (
    <Dialog open={open} onClose={close} title={`Cancel order ${order.number}?`}>
      <p>These are held for you and go back on sale:</p>
      <ul className="list-disc pl-5">
        {order.parcels.flatMap(({ workshop, lines }) =>
          lines.map((line) => (
            <li key={line.id}>
              {line.quantity} × {line.title}, {workshop.name}
            </li>
          )),
        )}
      </ul>
      <p>Nothing was charged. What you gathered stays in the basket.</p>
      {cancel.isError && <FailureNotice error={cancel.error} what="The order was not cancelled" />}
      <div className="flex flex-wrap gap-3">
        <Button look="primary" disabled={cancel.isPending} onClick={onCancel}>
          Cancel the order
        </Button>
        <Button onClick={close}>Keep it</Button>
      </div>
    </Dialog>
  );
}
