import { useQuery } from "@tanstack/react-query";
import { useEffect } from "react";
import { formatMoney } from "#shared/domain/money";
import { formatDeadline } from "../../lib/formatDate";
import { forgetCheckout, keptOrderId } from "../../lib/keptCheckout";
import { orderQuery } from "../../lib/orders";
import { useSessionUser } from "../../lib/session";
import { LinkButton } from "../../ui/LinkButton";
import { Notice } from "../../ui/Notice";

/** An order made in this tab that still waits for payment, told to whoever comes back from the payment page. */
export function PendingOrder() {
  const user = useSessionUser();
  const orderId = keptOrderId();
  const { data: order } = useQuery({ ...orderQuery(orderId ?? ""), enabled: Boolean(user && orderId), retry: false });
  const isSettled = order !== undefined && order.state !== "awaiting-payment";
  useEffect(() => {
    if (isSettled) forgetCheckout();
  }, [isSettled]);
  if (!user || order?.state !== "awaiting-payment") return null;
  return (
    <Notice title={`Order ${order.number} waits for payment`}>
      <p>
        You ordered this for {formatMoney(order.totalMinor, order.currency)} and left the payment page; nothing was
        charged.
        {order.holdUntil && ` Its parts are held for you until ${formatDeadline(order.holdUntil)}.`} What lies in the
        basket stays there until it is paid.
      </p>
      <LinkButton to={`/orders/${order.id}`} className="justify-self-start">
        Pay or cancel it
      </LinkButton>
    </Notice>
  );
}
