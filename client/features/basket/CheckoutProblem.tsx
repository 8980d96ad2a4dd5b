import { type ReactNode, Suspense, useEffect, useRef } from "react";
import { Link } from "react-router-dom";
import type { Basket } from "#shared/schemas/basket";
import { ApiProblem } from "../../lib/ApiProblem";
import { OfflineError } from "../../lib/OfflineError";
import { lineId } from "./BasketRow";

type Props = {
  error: Error;
  /** What has changed since it was shown, where that is what was refused. */
  changes: readonly string[];
  basket: Basket;
  /** Has the confirming mail sent once more. */
  sendVerification: ReactNode;
};

function OutOfStock({ error, basket }: { error: ApiProblem; basket: Basket }) {
  const titles = new Map(basket.parcels.flatMap(({ lines }) => lines.map(({ part }) => [part.id, part.title])));
  const named = error.errors.flatMap(({ pointer, detail }) => {
    const partId = /^#?\/lines\/([^/]+)/.exec(pointer)?.[1];
    return partId ? [{ partId, words: `${titles.get(partId) ?? "A part"}: ${detail}` }] : [];
  });
  if (named.length === 0) {
    return (
      <p>
        {error.message}. <Link to="/basket">Look at the basket</Link>
      </p>
    );
  }
  return (
    <ul className="grid gap-1">
      {named.map(({ partId, words }) => (
        <li key={partId}>
          <Link to={`/basket#${lineId(partId)}`} className="inline-block min-h-6 font-semibold text-outband">
            {words}
          </Link>
        </li>
      ))}
    </ul>
  );
}

function wordsFor({ error, changes, basket, sendVerification }: Props): { title: string; body: ReactNode } {
  if (error instanceof OfflineError) {
    return {
      title: "No connection",
      body: (
        <p>
          Whether your order arrived is not known. Order again when you are connected: it is made once, however often it
          is sent.
        </p>
      ),
    };
  }
  if (!(error instanceof ApiProblem)) return { title: "The order could not be sent", body: <p>{error.message}</p> };
  if (error.is("total-changed")) {
    return {
      title: "The total has changed: nothing was ordered",
      body: (
        <>
          {changes.length > 0 ? (
            <ul className="list-disc pl-5">
              {changes.map((change) => (
                <li key={change}>{change}</li>
              ))}
            </ul>
          ) : (
            <p>{error.message}</p>
          )}
          <p>Everything above is up to date again. Order if it is right for you.</p>
        </>
      ),
    };
  }
  if (error.is("out-of-stock")) {
    return {
      title: "Not enough is left: nothing was ordered",
      body: <OutOfStock error={error} basket={basket} />,
    };
  }
  if (error.is("not-shipped-there")) {
    return {
      title: "One parcel cannot go there: nothing was ordered",
      body: (
        <p>
          {error.message}. Choose another address above, or <Link to="/basket">remove what comes from there</Link>.
        </p>
      ),
    };
  }
  if (error.is("verify-first")) {
    return {
      title: "Confirm your e-mail address first",
      body: (
        <>
          <p>{error.message}. Then order here; what you typed stays.</p>
          <Suspense>{sendVerification}</Suspense>
        </>
      ),
    };
  }
  if (error.is("payment-unreachable")) {
    return {
      title: "The payment service does not answer: nothing was charged",
      body: <p>Your order is kept. Press the button again in a moment: it goes on with the same order.</p>,
    };
  }
  if (error.is("not-signed-in")) {
    return {
      title: "Your session has ended: nothing was ordered",
      body: (
        <p>
          <Link to="/sign-in?next=/checkout">Sign in again</Link> and you come back here. What you typed stays.
        </p>
      ),
    };
  }
  if (error.is("empty-basket")) {
    return {
      title: "The basket is empty: nothing was ordered",
      body: (
        <p>
          Perhaps it was paid already: look at <Link to="/orders">your orders</Link>.
        </p>
      ),
    };
  }
  const wait = error.retryAfterSeconds === null ? "" : ` Wait ${error.retryAfterSeconds} seconds.`;
  return {
    title: "Nothing was ordered",
    body: (
      <p>
        {error.message}
        {wait}
      </p>
    ),
  };
}

/** Why the order was not taken and what to do. Takes the focus each time. */
export function CheckoutProblem(props: Props) {
  const box = useRef<HTMLDivElement>(null);
  const { error } = props;
  useEffect(() => {
    if (error) box.current?.focus();
  }, [error]);
  const { title, body } = wordsFor(props);
  return (
    <div ref={box} tabIndex={-1} role="alert" className="grid max-w-prose gap-2 border-2 border-outband bg-sheet p-4">
      <p className="text-step1 font-semibold">{title}</p>
      {body}
    </div>
  );
}
