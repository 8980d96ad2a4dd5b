import type { z } from "zod";
import { type DimensionName, dimensionsOf, kindFacts, type PartKind } from "#shared/domain/partKinds";
import type { NeedDimension } from "#shared/schemas/need";
import type { DimensionFit, StatedDimensions } from "#shared/schemas/part";
import { type SizeUnit, statedNumbers } from "../lib/formatSize";
import { DeviationBar } from "./DeviationBar";
import { DimensionLabel } from "./DimensionLabel";

type Props = {
  kind: PartKind;
  stated: StatedDimensions;
  fits: readonly z.infer<typeof DimensionFit>[];
  needs: readonly NeedDimension[];
  unit: SizeUnit;
};

/** The sizes that matter for a kind, and those stated besides. */
export function shownDimensions(kind: PartKind, stated: StatedDimensions): DimensionName[] {
  return dimensionsOf(kind).filter((name) => kindFacts[kind].matters.includes(name) || stated[name]);
}

/** What a part states, size by size, and where each lies in what is accepted. */
export function SizeTable({ kind, stated, fits, needs, unit }: Props) {
  return (
    <table className="size-table">
      <caption className="sr-only">Sizes in {unit === "mm" ? "millimetres" : "inches"}</caption>
      <tbody>
        {shownDimensions(kind, stated).map((name) => {
          const size = stated[name];
          const fit = fits.find(({ dimension }) => dimension === name);
          const need = needs.find(({ dimension }) => dimension === name);
          const [nominal, tolerance] = size ? statedNumbers(size.nominalMm, size.plusMinusMm, unit) : [null, null];
          return (
            <tr key={name}>
              <th scope="row">
                <DimensionLabel name={name} />
              </th>
              <td>
                {nominal === null ? (
                  <span className="text-soft">not stated</span>
                ) : (
                  <>
                    <span className="font-semibold">{nominal}</span> <span className="text-soft">±{tolerance}</span>
                    {size?.tolerance === "assumed" && <small className="text-soft"> assumed</small>}
                  </>
                )}
              </td>
              <td>
                {size && fit ? (
                  <DeviationBar
                    name={name}
                    nominalMm={size.nominalMm}
                    lowerMm={fit.lowerMm}
                    upperMm={fit.upperMm}
                    needMm={need ? need.asNewMm : null}
                    unit={unit}
                  />
                ) : (
                  <small className="unmeasured">{need ? "not checked" : "not measured"}</small>
                )}
              </td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}
