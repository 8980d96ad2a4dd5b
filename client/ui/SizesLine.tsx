import { Fragment } from "react";
import { dimensionsOf, type ListingKind } from "#shared/domain/partKinds";
import type { StatedDimensions } from "#shared/schemas/part";
import { type SizeUnit, statedNumbers } from "../lib/formatSize";
import { DimensionLabel } from "./DimensionLabel";

type Props = { kind: ListingKind; dims: StatedDimensions; unit: SizeUnit };

/** What a part states, in one line: its sizes in canonical order with their tolerances, the unit once. */
export function SizesLine({ kind, dims, unit }: Props) {
  if (kind === "rebuild-kit") return null;
  const stated = dimensionsOf(kind).flatMap((name) => {
    const size = dims[name];
    return size ? [{ name, numbers: statedNumbers(size.nominalMm, size.plusMinusMm, unit) }] : [];
  });
  if (stated.length === 0) return null;
  return (
    <p className="text-soft">
      {stated.map(({ name, numbers: [nominal, tolerance] }, index) => (
        <Fragment key={name}>
          {index > 0 && ", "}
          <DimensionLabel name={name} />{" "}
          <span className="whitespace-nowrap">
            <span className="font-semibold text-ink">{nominal}</span> ±{tolerance}
          </span>
        </Fragment>
      ))}
      <small>&#8201;{unit}</small>
    </p>
  );
}
