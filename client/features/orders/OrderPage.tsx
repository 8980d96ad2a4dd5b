import { useEffect, useMemo } from "react";
import { useParams, useSearchParams } from "react-router-dom";
import type { Order } from "#shared/schemas/order";
import { ApiProblem } from "../../lib/ApiProblem";
import { formatDay } from "../../lib/formatDate";
import { forgetCheckout, keptOrderId } from "../../lib/keptCheckout";
import { useUnit } from "../../lib/preferences";
import { useTitle } from "../../lib/useTitle";
import { Button } from "../../ui/Button";
import { comparedScale } from "../../ui/drawing/comparedScale";
import { ScaleBar } from "../../ui/drawing/ScaleBar";
import { FailureNotice } from "../../ui/FailureNotice";
import { LinkButton } from "../../ui/LinkButton";
import { Notice } from "../../ui/Notice";
import { RuledHeading } from "../../ui/RuledHeading";
import { madeOf, Withdrawal } from "../../ui/Withdrawal";
import { OrderAddresses, OrderHistory, OrderSums } from "./OrderDetails";
import { drawnLine, OrderParcelSection } from "./OrderParcelSection";
import { OrderSkeleton } from "./OrderSkeleton";
import { OrderStatus } from "./OrderStatus";
import { usePaymentWord } from "./usePaymentWord";

function OrderBody({ order }: { order: Order }) {
  const unit = useUnit();
  const { parcels, state } = order;
  const lines = parcels.flatMap((parcel) => parcel.lines);
  const scale = useMemo(
    () => comparedScale(order.parcels.flatMap((parcel) => parcel.lines.flatMap((line) => drawnLine(line) ?? []))),
    [order],
  );
  const isPaid = state === "paid" || state === "closed";
  return (
    <>
      <ScaleBar pxPerMm={scale.pxPerMm} unit={unit} />
      {parcels.map((parcel, index) => (
        <OrderParcelSection
          key={parcel.id}
          parcel={parcel}
          label={`Parcel ${index + 1} of ${parcels.length}`}
          currency={order.currency}
          scale={scale}
          isPaid={isPaid}
        />
      ))}
      <OrderSums order={order} />
      <OrderAddresses order={order} />
      <OrderHistory history={order.history} />
      <section className="grid gap-3">
        <RuledHeading>Changing your mind</RuledHeading>
        <Withdrawal made={madeOf(lines)} />
        {isPaid && (
          <p className="max-w-prose text-soft">
            Write to the workshop’s address above and name order {order.number}; a word from you is enough, no form is
            needed.
          </p>
        )}
      </section>
    </>
  );
}

/** An order: where it stands, what happens next, and everything that was bought. */
export function OrderPage() {
  const { id = "" } = useParams();
  const [search] = useSearchParams();
  const { query, isWaiting, waitedInVain, lookAgain } = usePaymentWord(id, search.get("paid") === "1");
  const { data: order, error, refetch } = query;
  useTitle(order ? `Order ${order.number}` : "Order");

  const isSettled = order !== undefined && order.state !== "awaiting-payment";
  useEffect(() => {
    if (isSettled && keptOrderId() === id) forgetCheckout();
  }, [isSettled, id]);

  const isMissing = error instanceof ApiProblem && error.is("not-found");
  return (
    <div className="page grid grid-cols-1 gap-9 py-8">
      {order && (
        <>
          <header className="flex flex-wrap items-end justify-between gap-4">
            <div>
              <h1>Order {order.number}</h1>
              <p className="text-soft">{formatDay(order.createdAt)}</p>
            </div>
            <Button className="print:hidden" onClick={() => window.print()}>
              Print
            </Button>
          </header>
          <OrderStatus
            order={order}
            isWaiting={isWaiting}
            waitedInVain={waitedInVain}
            left={search.get("left") === "1"}
            onLookAgain={lookAgain}
          />
        </>
      )}
      {!order && <h1>Order</h1>}
      {isMissing && !order && (
        <Notice title="There is no such order of yours">
          <p>Perhaps it was made with another account.</p>
          <LinkButton to="/orders" className="justify-self-start">
            Your orders
          </LinkButton>
        </Notice>
      )}
      {error && !isMissing && (
        <FailureNotice
          error={error}
          what={order ? "Where the order stands now could not be fetched" : "The order could not be fetched"}
          kept="Nothing has changed with it."
          onRetry={() => void refetch()}
        />
      )}
      {!order && !error && <OrderSkeleton />}
      {order && <OrderBody order={order} />}
    </div>
  );
}
