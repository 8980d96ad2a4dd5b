import type { PartKind } from "#shared/domain/partKinds";
import type { PartPage } from "#shared/schemas/catalogue";
import type { StatedDimensions } from "#shared/schemas/part";
import type { SizeUnit } from "../../lib/formatSize";
import { RuledHeading } from "../../ui/RuledHeading";
import { shownDimensions } from "../../ui/SizeTable";
import { VerdictShape } from "../../ui/VerdictMark";
import { chanceWords, verdictColour, verdictWords } from "../../ui/verdictWords";
import { FitRow } from "./FitRow";

/** What is compared with the need: the part itself, or the first line of a kit of the kind that is needed. */
function comparedWith({
  part,
  need,
}: PartPage): { kind: PartKind; stated: StatedDimensions; line: string | null } | null {
  if (part.kind !== "rebuild-kit") return { kind: part.kind, stated: part.dimensions, line: null };
  const line = part.kitLines.find(({ kind }) => kind !== null && kind === need.kind);
  return line?.kind ? { kind: line.kind, stated: line.dimensions, line: line.title } : null;
}

/** How surely it fits, why, and size by size. */
export function FitPanel({ page, unit }: { page: PartPage; unit: SizeUnit }) {
  const { fit, need } = page;
  const compared = comparedWith(page);
  return (
    <section>
      <RuledHeading className="mt-6">Will it fit?</RuledHeading>
      {fit ? (
        <>
          <p className={`mt-3 flex items-center gap-3 text-step3 font-bold ${verdictColour[fit.verdict]}`}>
            <svg width="22" height="22" viewBox="-11 -11 22 22" aria-hidden="true">
              <VerdictShape verdict={fit.verdict} radius={8.5} />
            </svg>
            {verdictWords[fit.verdict]}, {chanceWords(fit.chance)}
          </p>
          <p className="mt-1 max-w-prose">{fit.reason}</p>
          {compared?.line && (
            <p className="mt-1 text-soft">Of this kit, the {compared.line.toLowerCase()} is compared.</p>
          )}
          <p className="mt-1 text-soft">
            {fit.checked} of {fit.matters} sizes checked
          </p>
        </>
      ) : (
        <p className="mt-3 max-w-prose">
          {compared
            ? "Not known yet: write what you measured into the sentence above, or begin with one of these sizes."
            : need.dimensions.length > 0
              ? "Not known: nothing in this kit is of the kind that you need."
              : "Not known yet: write what you measured into the sentence above."}
        </p>
      )}
      {compared && (
        <ul className="mt-2">
          {shownDimensions(compared.kind, compared.stated).map((name) => (
            <FitRow
              key={name}
              name={name}
              stated={compared.stated[name]}
              fit={fit?.dimensions.find(({ dimension }) => dimension === name)}
              need={need.dimensions.find(({ dimension }) => dimension === name)}
              unit={unit}
            />
          ))}
        </ul>
      )}
    </section>
  );
}
