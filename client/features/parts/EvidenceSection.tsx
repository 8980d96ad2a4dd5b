import { Link } from "react-router-dom";
import type { FitClaim, PartPage } from "#shared/schemas/catalogue";
import { capitalised } from "../../lib/capitalised";
import { RuledHeading } from "../../ui/RuledHeading";

const claimWords: Record<FitClaim["evidence"], string> = {
  "measured-on-machine": "measured on a machine by the workshop",
  "fitted-here": "fitted in its own shop",
  "from-drawing": "taken from a drawing",
  "customer-report": "reported by a customer",
};

/** What it is, what the workshop claims it fits, and what others found. */
export function EvidenceSection({ page }: { page: PartPage }) {
  const { description, fitClaims, evidence, part } = page;
  const counts = [
    { words: "ran as delivered", count: evidence.fitted - evidence.fittedAfterWork },
    { words: "ran after some work", count: evidence.fittedAfterWork },
    { words: "did not fit", count: evidence.didNotFit },
  ].filter(({ count }) => count > 0);
  return (
    <>
      {part.kitLines.length > 0 && (
        <section>
          <RuledHeading className="mt-6">In the kit</RuledHeading>
          <ul className="mt-2 grid gap-1">
            {part.kitLines.map(({ id, title, quantity, servicePointName }) => (
              <li key={id}>
                <span className="font-semibold">
                  {quantity} × {capitalised(title)}
                </span>
                {servicePointName && <span className="text-soft">, for the {servicePointName.toLowerCase()}</span>}
              </li>
            ))}
          </ul>
        </section>
      )}
      {description && (
        <section>
          <RuledHeading className="mt-6">From the workshop</RuledHeading>
          <p className="mt-2 max-w-prose whitespace-pre-line">{description}</p>
        </section>
      )}
      <section>
        <RuledHeading className="mt-6">Fitted by others</RuledHeading>
        <p className="mt-2 max-w-prose">{capitalised(evidence.sentence).replace(/\.?$/, ".")}</p>
        {counts.length > 0 && (
          <ul className="mt-1 flex flex-wrap gap-x-6 text-soft">
            {counts.map(({ words, count }) => (
              <li key={words}>
                {count} {words}
              </li>
            ))}
          </ul>
        )}
        {fitClaims.length > 0 && (
          <ul className="mt-2 grid gap-1">
            {fitClaims.map(({ familySlug, familyName, servicePointName, evidence: basis }) => (
              <li key={`${familySlug}${servicePointName}`}>
                {capitalised(servicePointName)} of the <Link to={`/families/${familySlug}`}>{familyName}</Link>
                <span className="text-soft">, {claimWords[basis]}</span>
              </li>
            ))}
          </ul>
        )}
      </section>
    </>
  );
}
