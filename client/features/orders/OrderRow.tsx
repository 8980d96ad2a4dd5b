import { Link } from "react-router-dom";
import type { OrderSummary } from "#shared/schemas/order";
import { formatDay } from "../../lib/formatDate";
import { Money } from "../../ui/Money";
import { OrderMark } from "./OrderMark";
import { orderStateNames } from "./orderWords";

const mostTitles = 3;

function titlesOf(titles: readonly string[]): string {
  const more = titles.length - mostTitles;
  const shown = titles.slice(0, more === 1 ? mostTitles + 1 : mostTitles).join("; ");
  return more > 1 ? `${shown}; and ${more} more` : shown;
}

/** One order: number and day, where it stands, what and from whom, how much. */
export function OrderRow({ order }: { order: OrderSummary }) {
  const { id, number, state, createdAt, totalMinor, currency, workshops, titles } = order;
  return (
    <li className="relative grid grid-cols-[1fr_auto] gap-x-5 gap-y-2 border-b border-rule py-4 hover:bg-sheet md:grid-cols-[9rem_12rem_1fr_7rem]">
      <div>
        <h2 className="text-base font-semibold">
          <Link to={`/orders/${id}`} className="inline-block min-h-6 after:absolute after:inset-0">
            {number}
          </Link>
        </h2>
        <p className="text-small text-soft">{formatDay(createdAt)}</p>
      </div>
      <p className="order-first col-span-1 flex items-center gap-2 self-start font-semibold max-md:order-none max-md:col-span-2 md:order-none">
        <OrderMark state={state} />
        {orderStateNames[state]}
      </p>
      <div className="max-md:col-span-2">
        <p>{titlesOf(titles)}</p>
        <p className="text-soft">{workshops.join(", ")}</p>
      </div>
      <p className="text-right text-step1 font-bold max-md:col-start-2 max-md:row-start-1">
        <Money minor={totalMinor} currency={currency} />
      </p>
    </li>
  );
}
