import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import { Link, useParams } from "react-router-dom";
import type { FamilyPage as Answer } from "#shared/schemas/catalogue";
import { ApiProblem } from "../../lib/ApiProblem";
import { useTitle } from "../../lib/useTitle";
import { FailureNotice } from "../../ui/FailureNotice";
import { Notice } from "../../ui/Notice";
import { RuledHeading } from "../../ui/RuledHeading";
import { Skeleton } from "../../ui/Skeleton";
import { familyQuery } from "./api";
import { beltRouteAddress } from "./beltRouteAddress";
import { DriveMapDrawing } from "./DriveMapDrawing";
import { mechanismWords } from "./mechanismWords";
import { ServicePointItem, servicePointId } from "./ServicePointItem";

export function FamilyPage() {
  const { slug = "" } = useParams();
  const family = useQuery(familyQuery(slug));
  useTitle(family.data?.name ?? "Mechanism family");
  if (family.data) return <Family family={family.data} />;
  if (family.isPending) {
    return (
      <div role="status" className="page grid gap-4 pt-8">
        <span className="sr-only">Fetching the family</span>
        <Skeleton className="h-10 w-1/2" />
        <Skeleton className="h-6 w-1/3" />
        <Skeleton className="aspect-[4/3] w-full max-w-2xl" />
      </div>
    );
  }
  const isUnknown = family.error instanceof ApiProblem && family.error.status === 404;
  return (
    <div className="page py-12">
      <h1 className="sr-only">Mechanism family</h1>
      {isUnknown ? (
        <Notice title="No family is known under this address" />
      ) : (
        <FailureNotice
          error={family.error}
          what="The family could not be fetched"
          onRetry={() => void family.refetch()}
        />
      )}
    </div>
  );
}

/** From each belt of the plan to the gauge that works out its length. */
function BeltsOnBoard({ family: { driveMap, servicePoints, slug } }: { family: Answer }) {
  const belts = driveMap.belts.flatMap(({ label }) => {
    const to = beltRouteAddress(driveMap, label, servicePoints, slug);
    return to ? [{ label, to }] : [];
  });
  if (belts.length === 0) return null;
  return (
    <p className="mt-2 flex flex-wrap gap-x-4 print:hidden">
      <span className="text-soft">Lay out the pulleys of</span>
      {belts.map(({ label, to }) => (
        <Link key={label} to={to}>
          the {label}
        </Link>
      ))}
    </p>
  );
}

function Family({ family }: { family: Answer }) {
  const [litId, setLit] = useState<string | null>(null);
  const { name, maker, kind, models, about, driveTrain, driveMap, servicePoints, slug } = family;
  const goTo = (id: string) => {
    const item = document.getElementById(servicePointId(id));
    item?.scrollIntoView({ block: "nearest" });
    item?.querySelector<HTMLElement>("a")?.focus({ preventScroll: true });
    setLit(id);
  };
  return (
    <article className="page pb-8">
      <header className="grid gap-1 pt-8">
        <h1>{name}</h1>
        <p className="text-step1 text-soft">
          {maker}, {mechanismWords[kind].one}
          {models.length > 0 && `. Sold as ${models.join(", ")}.`}
        </p>
      </header>
      <div className="drive-columns">
        <section>
          <RuledHeading className="mt-6">Plan of the drive, to scale</RuledHeading>
          <div className="mt-3 border border-rule bg-sheet">
            <DriveMapDrawing map={driveMap} points={servicePoints} litId={litId} onLight={setLit} onPick={goTo} />
          </div>
          <BeltsOnBoard family={family} />
        </section>
        <section className="points">
          <RuledHeading className="mt-6">{`Service points: ${servicePoints.length}`}</RuledHeading>
          {servicePoints.length === 0 ? (
            <p className="mt-3">None has been agreed yet.</p>
          ) : (
            <ol>
              {servicePoints.map((point) => (
                <ServicePointItem
                  key={point.id}
                  point={point}
                  familySlug={slug}
                  isLit={litId === point.id}
                  onLight={setLit}
                />
              ))}
            </ol>
          )}
        </section>
        <section className="grid content-start gap-2">
          <RuledHeading className="mt-6">How it drives</RuledHeading>
          <p className="max-w-prose">{driveTrain}</p>
          <p className="max-w-prose">{about}</p>
        </section>
      </div>
    </article>
  );
}
