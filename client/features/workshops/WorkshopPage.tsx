import { useQuery } from "@tanstack/react-query";
import { useParams } from "react-router-dom";
import { countryName } from "#shared/domain/countries";
import { formatMoney } from "#shared/domain/money";
import type { WorkshopPage as Answer } from "#shared/schemas/catalogue";
import { ApiProblem } from "../../lib/ApiProblem";
import { dispatchWords } from "../../lib/formatDate";
import { useTitle } from "../../lib/useTitle";
import { FailureNotice } from "../../ui/FailureNotice";
import { Notice } from "../../ui/Notice";
import { RuledHeading } from "../../ui/RuledHeading";
import { Skeleton } from "../../ui/Skeleton";
import { TraderDetails } from "../../ui/TraderDetails";
import { workshopQuery } from "./api";
import { OwnParts } from "./OwnParts";

export function WorkshopPage() {
  const { slug = "" } = useParams();
  const workshop = useQuery(workshopQuery(slug));
  useTitle(workshop.data?.workshop.name ?? "Workshop");
  if (workshop.data) return <Workshop page={workshop.data} />;
  if (workshop.isPending) {
    return (
      <div role="status" className="page grid gap-4 pt-8">
        <span className="sr-only">Fetching the workshop</span>
        <Skeleton className="h-10 w-1/2" />
        <Skeleton className="h-6 w-1/3" />
        <Skeleton className="h-64 w-full" />
      </div>
    );
  }
  const isUnknown = workshop.error instanceof ApiProblem && workshop.error.status === 404;
  return (
    <div className="page py-12">
      <h1 className="sr-only">Workshop</h1>
      {isUnknown ? (
        <Notice title="No workshop is known under this address" />
      ) : (
        <FailureNotice
          error={workshop.error}
          what="The workshop could not be fetched"
          onRetry={() => void workshop.refetch()}
        />
      )}
    </div>
  );
}

function Workshop({ page }: { page: Answer }) {
  const { workshop, about, dispatchDays, returnsTerms, trader, shippingRates, taxRegistrations, parts } = page;
  return (
    <article className="page pb-8">
      <header className="grid gap-1 pt-8">
        <h1>{workshop.name}</h1>
        <p className="text-step1 text-soft">
          {workshop.town}, {workshop.countryName}. What is in stock {dispatchWords(dispatchDays)}.
        </p>
      </header>
      <div className="grid gap-x-14 md:grid-cols-[1.4fr_1fr]">
        <section>
          <RuledHeading className="mt-6">About</RuledHeading>
          <p className="mt-2 max-w-prose whitespace-pre-line">{about}</p>
          <RuledHeading className="mt-6">When it does not suit</RuledHeading>
          <p className="mt-2 max-w-prose whitespace-pre-line">{returnsTerms}</p>
        </section>
        <section>
          <RuledHeading className="mt-6">Sells in the name of</RuledHeading>
          <TraderDetails trader={trader} />
        </section>
      </div>
      <RuledHeading className="mt-8">Postage</RuledHeading>
      <div className="overflow-x-auto">
        <table className="w-full text-left">
          <caption className="sr-only">Postage by where it goes</caption>
          <thead className="text-small text-soft">
            <tr>
              <th className="py-2 pr-6 font-semibold">To</th>
              <th className="py-2 pr-6 text-right font-semibold">Parcel</th>
              <th className="py-2 pr-6 text-right font-semibold">Each piece</th>
              <th className="py-2 text-right font-semibold">Free from</th>
            </tr>
          </thead>
          <tbody>
            {shippingRates.map(({ zone, countries, baseMinor, perItemMinor, freeOverMinor, currency }) => (
              <tr key={zone} className="border-t border-rule align-top">
                <th scope="row" className="py-2 pr-6 font-normal">
                  <span className="font-semibold">{zone}</span>
                  <span className="block text-small text-soft">{countries.map(countryName).join(", ")}</span>
                </th>
                <td className="py-2 pr-6 text-right">{formatMoney(baseMinor, currency)}</td>
                <td className="py-2 pr-6 text-right">{formatMoney(perItemMinor, currency)}</td>
                <td className="py-2 text-right">
                  {freeOverMinor === null ? "never" : formatMoney(freeOverMinor, currency)}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="mt-2 max-w-prose text-soft">
        {taxRegistrations.length === 0
          ? "It collects no tax: what customs asks for is yours to pay."
          : `Prices contain tax in ${taxRegistrations.map(({ countryName: name, ratePercent }) => `${name} (${ratePercent} %)`).join(", ")}.`}
      </p>
      <OwnParts parts={parts} />
    </article>
  );
}
