import { Link } from "react-router-dom";
import { type DimensionName, dimensionsOf, kindFacts } from "#shared/domain/partKinds";
import type { ServicePoint } from "#shared/schemas/catalogue";
import { capitalised } from "../../lib/capitalised";
import { sizeNumber } from "../../lib/formatSize";
import { useUnit } from "../../lib/preferences";
import { DimensionLabel } from "../../ui/DimensionLabel";
import { Size } from "../../ui/Size";

export const servicePointId = (id: string): string => `service-point-${id}`;

const hundredths = (mm: number) => Math.round(mm * 100) / 100;

type Props = {
  point: ServicePoint;
  familySlug: string;
  isLit: boolean;
  onLight: (id: string | null) => void;
};

/** A place where a wear part sits: what it takes, what sizes the register agreed on, and the parts for it. */
export function ServicePointItem({ point, familySlug, isLit, onLight }: Props) {
  const unit = useUnit();
  const { id, number, name, partKind, note, sizes, partCount } = point;
  const known = dimensionsOf(partKind).flatMap((dimension) => {
    const size = sizes[dimension];
    return size ? [{ dimension, ...size } as { dimension: DimensionName } & typeof size] : [];
  });
  return (
    <li
      id={servicePointId(id)}
      className="service-point"
      data-lit={isLit || undefined}
      onPointerEnter={() => onLight(id)}
      onPointerLeave={() => onLight(null)}
      onFocus={() => onLight(id)}
      onBlur={() => onLight(null)}
    >
      <div className="flex flex-wrap items-baseline gap-x-3">
        <span className="grid size-7 place-items-center self-center rounded-full bg-measured text-small font-bold text-on-measured">
          {number}
        </span>
        <h3 className="text-step1">{capitalised(name)}</h3>
        <span className="text-soft">{kindFacts[partKind].name}</span>
        <Link
          to={`/find?family=${familySlug}&kind=${partKind}`}
          className="ml-auto inline-flex min-h-8 items-center"
          aria-label={`Parts for the ${name.toLowerCase()}: ${partCount}`}
        >
          {partCount === 1 ? "1 part" : `${partCount} parts`}
        </Link>
      </div>
      {note && <p className="mt-1 max-w-prose">{note}</p>}
      {known.length === 0 ? (
        <p className="mt-1 text-soft">Its sizes have not been agreed yet: measure yours.</p>
      ) : (
        <ul className="mt-1 grid gap-0.5">
          {known.map(({ dimension, nominalMm, lowerMm, upperMm }) => (
            <li key={dimension} className="grid grid-cols-[9.5rem_1fr] gap-x-3 sm:grid-cols-[9.5rem_10.5rem_1fr]">
              <span className="text-soft">
                <DimensionLabel name={dimension} />
              </span>
              <Size mm={nominalMm} unit={unit} both />
              <span className="col-start-2 text-soft sm:col-start-3">
                takes {sizeNumber(hundredths(lowerMm), unit)} to {sizeNumber(hundredths(upperMm), unit)}
              </span>
            </li>
          ))}
        </ul>
      )}
    </li>
  );
}
