import { useState } from "react";
import { formatMoney } from "#shared/domain/money";
import type { PartPage } from "#shared/schemas/catalogue";
import { capitalised } from "../../lib/capitalised";
import { needWords } from "../../lib/needWords";
import { Money } from "../../ui/Money";
import { readyWords, stockWords, toCountry } from "../../ui/offerWords";
import { PutInBasket } from "../../ui/PutInBasket";
import { RuledHeading } from "../../ui/RuledHeading";

function Price({ page }: { page: PartPage }) {
  const { part, landedMinor, shippingMinor, currency, need } = page;
  const to = toCountry(need.shipTo);
  if (landedMinor === null || shippingMinor === null) {
    return (
      <>
        <p className="text-step4 font-bold">
          <Money minor={part.priceMinor} currency={part.currency} />
        </p>
        <p className="text-outband">This workshop does not post {to}.</p>
      </>
    );
  }
  return (
    <>
      <p className="text-step4 font-bold">
        <Money minor={landedMinor} currency={currency} />
      </p>
      <p className="text-soft">
        {to}: {formatMoney(part.priceMinor, part.currency)} + {formatMoney(shippingMinor, currency)} postage, any tax
        that the workshop collects there included. {capitalised(readyWords(part))}, {stockWords(part)}.
      </p>
    </>
  );
}

/** What it costs delivered, how many, into the basket, and who sells it on what terms. */
export function BuyPanel({ page }: { page: PartPage }) {
  const { part, trader, need, madeToSize } = page;
  const [quantity, setQuantity] = useState(1);
  const most = Math.min(part.available ?? 99, 99);
  return (
    <section className="grid gap-2 print:hidden">
      <RuledHeading className="mt-6">Buy</RuledHeading>
      <Price page={page} />
      {part.offerType === "re-mould" && <p>Your old hub is needed: after you order, you are told where to send it.</p>}
      <div className="mt-1 flex flex-wrap items-start gap-3">
        {most > 1 && (
          <label className="flex min-h-11 items-center gap-2">
            Pieces
            <select
              className="input w-20"
              value={quantity}
              onChange={(event) => setQuantity(Number(event.target.value))}
            >
              {Array.from({ length: Math.min(most, 10) }, (_, i) => i + 1).map((count) => (
                <option key={count}>{count}</option>
              ))}
            </select>
          </label>
        )}
        <div className="min-w-48 flex-1">
          <PutInBasket
            part={part}
            forNeed={needWords(need)}
            quantity={quantity}
            look="primary"
            className="min-h-11 w-full"
          />
        </div>
      </div>
      <p className="text-soft">
        Sold by a trader: {trader.legalName}.{" "}
        {madeToSize
          ? "It is made to your size, so it cannot be sent back merely because you change your mind; a fault is put right all the same."
          : "You have 14 days from delivery to change your mind."}
      </p>
    </section>
  );
}
