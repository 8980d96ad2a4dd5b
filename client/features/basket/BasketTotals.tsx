import { countryName } from "#shared/domain/countries";
import type { Basket } from "#shared/schemas/basket";
import { useSessionUser } from "../../lib/session";
import { allTaxWords } from "../../lib/taxWords";
import { Button } from "../../ui/Button";
import { LinkButton } from "../../ui/LinkButton";
import { Money } from "../../ui/Money";
import { RuledHeading } from "../../ui/RuledHeading";
import { TitleBlock } from "../../ui/TitleBlock";
import { lineId } from "./BasketRow";
import { parcelId } from "./BasketSection";
import { quantityId } from "./QuantityField";

type Obstacle = { href: string; words: string };

function obstaclesOf({ parcels }: Basket, unsettled: ReadonlySet<string>): Obstacle[] {
  return parcels.flatMap(({ workshop, lines, problem }) => [
    ...(problem ? [{ href: `#${parcelId(workshop.id)}`, words: problem }] : []),
    ...lines.flatMap(({ part, problem: wrong }) => {
      if (unsettled.has(part.id)) {
        return [{ href: `#${quantityId(part.id)}`, words: `${part.title}: the quantity needs another look` }];
      }
      return wrong ? [{ href: `#${lineId(part.id)}`, words: `${part.title}: ${wrong}` }] : [];
    }),
  ]);
}

/** The whole of it, and the way on or what stands in it. */
export function BasketTotals({ basket, unsettled }: { basket: Basket; unsettled: ReadonlySet<string> }) {
  const user = useSessionUser();
  const { currency, parcels } = basket;
  const obstacles = obstaclesOf(basket, unsettled);
  const isReady = basket.canCheckOut && obstacles.length === 0;
  return (
    <section className="grid gap-5">
      <RuledHeading>All parcels, to {countryName(basket.shipTo)}</RuledHeading>
      <TitleBlock
        cells={[
          { label: "Parts", value: <Money minor={basket.partsMinor} currency={currency} /> },
          { label: "Postage", value: <Money minor={basket.shippingMinor} currency={currency} /> },
          { label: "Tax", value: allTaxWords(parcels, basket.taxMinor, currency) },
          { label: "In all", value: <Money minor={basket.totalMinor} currency={currency} />, whole: true },
        ]}
      />
      {!isReady && (
        <div id="check-out-reason" className="grid max-w-prose gap-1">
          <p className="font-semibold">This keeps you from checking out:</p>
          <ul className="grid gap-1">
            {obstacles.map(({ href, words }) => (
              <li key={href + words}>
                <a href={href} className="inline-block min-h-6 text-outband">
                  {words}
                </a>
              </li>
            ))}
          </ul>
        </div>
      )}
      <div className="flex flex-wrap items-center gap-x-5 gap-y-3">
        {isReady ? (
          <LinkButton to="/checkout" look="primary" className="min-h-11 min-w-48">
            Check out
          </LinkButton>
        ) : (
          <Button disabled aria-describedby="check-out-reason" className="min-h-11 min-w-48">
            Check out
          </Button>
        )}
        <p className="max-w-prose text-soft">
          {user === null
            ? "You sign in before you pay; what lies here is kept."
            : "You see everything once more before you pay."}
        </p>
      </div>
    </section>
  );
}
