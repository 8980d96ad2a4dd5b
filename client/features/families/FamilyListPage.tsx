import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import { Link } from "react-router-dom";
import type { FamilySummary, MechanismKind } from "#shared/schemas/catalogue";
import { familiesQuery } from "../../lib/catalogue";
import { useTitle } from "../../lib/useTitle";
import { FailureNotice } from "../../ui/FailureNotice";
import { Notice } from "../../ui/Notice";
import { RuledHeading } from "../../ui/RuledHeading";
import { Skeleton } from "../../ui/Skeleton";
import { mechanismWords } from "./mechanismWords";

const plain = (words: string) => words.toLowerCase().normalize("NFKD").replace(/\p{M}/gu, "");

/** The families whose name, maker or models hold these words. */
export function matching(families: readonly FamilySummary[], words: string): FamilySummary[] {
  const wanted = plain(words).split(/\s+/).filter(Boolean);
  return families.filter(({ name, maker, models }) => {
    const text = plain([name, maker, ...models].join(" "));
    return wanted.every((word) => text.includes(word));
  });
}

export function FamilyListPage() {
  const families = useQuery(familiesQuery);
  const [words, setWords] = useState("");
  useTitle("Mechanism families");
  const found = matching(families.data?.items ?? [], words);
  const kinds = (Object.keys(mechanismWords) as MechanismKind[]).filter((kind) =>
    found.some((one) => one.kind === kind),
  );
  return (
    <div className="page pb-8">
      <header className="grid gap-2 pt-8">
        <h1>Mechanism families</h1>
        <p className="max-w-prose text-step1 text-soft">
          Mechanisms that share drive parts under different badges. Each has a plan of its drive, with the places where
          rubber wears.
        </p>
      </header>
      <label className="mt-6 grid max-w-md gap-1.5 font-semibold">
        Name, maker or model
        <input
          className="input font-normal"
          type="search"
          value={words}
          onChange={(event) => setWords(event.target.value)}
        />
      </label>
      {families.isPending && <ListSkeleton />}
      {families.isError && !families.data && (
        <div className="py-8">
          <FailureNotice
            error={families.error}
            what="The families could not be fetched"
            onRetry={() => void families.refetch()}
          />
        </div>
      )}
      {families.data && found.length === 0 && (
        <div className="py-8">
          <Notice title={words ? `No family goes by “${words}”` : "No family is on the register yet"}>
            <p>Badges differ from mechanisms: look under the maker of the mechanism, or measure the part itself.</p>
          </Notice>
        </div>
      )}
      {kinds.map((kind) => (
        <section key={kind}>
          <RuledHeading className="mt-8">{mechanismWords[kind].many}</RuledHeading>
          <ul>
            {found
              .filter((one) => one.kind === kind)
              .map((family) => (
                <FamilyRow key={family.slug} family={family} />
              ))}
          </ul>
        </section>
      ))}
    </div>
  );
}

function FamilyRow({ family }: { family: FamilySummary }) {
  const { slug, name, maker, models, servicePointCount } = family;
  return (
    <li className="grid gap-x-8 gap-y-0.5 border-b border-rule py-3 sm:grid-cols-[14rem_1fr_auto] sm:items-baseline">
      <h3 className="text-step1">
        <Link to={`/families/${slug}`} className="inline-flex min-h-8 items-center no-underline hover:underline">
          {name}
        </Link>
      </h3>
      <p className="text-soft">
        {maker}
        {models.length > 0 && `: ${models.join(", ")}`}
      </p>
      <p>
        {servicePointCount} {servicePointCount === 1 ? "service point" : "service points"}
      </p>
    </li>
  );
}

function ListSkeleton() {
  return (
    <div role="status" className="mt-8 grid gap-4">
      <span className="sr-only">Fetching the families</span>
      {["one", "two", "three", "four", "five"].map((row) => (
        <Skeleton key={row} className="h-10 w-full" />
      ))}
    </div>
  );
}
