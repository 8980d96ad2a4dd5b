import type { Contribution } from "#shared/domain/uncertainty";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { RuledHeading } from "../../../ui/RuledHeading";

const names: Record<Contribution["name"], string> = {
  instrument: "Instrument",
  resolution: "Step of reading",
  repeatability: "Scatter of the readings",
  softness: "Softness",
  thickness: "Thickness",
  "flat-spot": "Flat spot",
  condition: "Condition",
};

/** Where the uncertainty of the size as new comes from: each term's share of the variance, the largest first. */
export function BudgetTable({ budget, unit }: { budget: readonly Contribution[]; unit: SizeUnit }) {
  const variance = budget.reduce((sum, term) => sum + term.standardUncertaintyMm ** 2, 0);
  const rows = budget
    .map((term) => ({ ...term, share: variance > 0 ? term.standardUncertaintyMm ** 2 / variance : 0 }))
    .sort((a, b) => b.share - a.share);
  return (
    <section className="grid gap-3">
      <RuledHeading>What makes it uncertain</RuledHeading>
      <p className="max-w-prose text-soft">
        Shares of the variance, which add up to the whole; the standard uncertainties u add up as squares. Hatched is
        what the condition adds to the measuring.
      </p>
      <table className="w-full border-collapse text-left tabular-nums">
        <caption className="sr-only">Budget of the uncertainty of the inside circumference as new</caption>
        <thead className="text-small text-soft">
          <tr>
            <th scope="col" className="pr-4 pb-1 font-semibold">
              From
            </th>
            <th scope="col" className="pr-4 pb-1 text-right font-semibold whitespace-nowrap">
              u, {unit}
            </th>
            <th scope="col" className="w-2/5 pb-1 font-semibold">
              Share
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map((term) => (
            <tr key={term.name} className="border-t border-rule align-top">
              <th scope="row" className="py-2 pr-4 font-semibold">
                {names[term.name]}
                <span className="hidden text-small font-normal text-soft sm:block">
                  {term.words} ({term.source}).
                </span>
              </th>
              <td className="py-2 pr-4 text-right">{roundedSize(term.standardUncertaintyMm, unit)}</td>
              <td className="py-2">
                <ShareBar share={term.share} isHatched={term.name === "condition"} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

/** A bar as long as its share of the full line, outlined; the figure stands beside it. */
function ShareBar({ share, isHatched }: { share: number; isHatched: boolean }) {
  const percent = share * 100;
  // The outline keeps the smallest share visible and the largest inside.
  const width = `${Math.max(percent, 0.5) * 0.995}%`;
  return (
    <span className="grid grid-cols-[minmax(0,1fr)_3.5rem] items-center gap-2">
      <svg width="100%" height="16" aria-hidden="true" className="block">
        <defs>
          <pattern id="budget-hatch" width="6" height="6" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
            <rect width="6" height="6" fill="var(--color-sheet)" />
            <path d="M0 0V6" stroke="var(--color-measured)" strokeWidth="2" />
          </pattern>
        </defs>
        <rect y="15" width="100%" height="1" fill="var(--color-edge)" />
        <rect
          x="0.5"
          y="2.5"
          width={width}
          height="12"
          fill={isHatched ? "url(#budget-hatch)" : "var(--color-measured-fill)"}
          stroke="var(--color-measured)"
        />
      </svg>
      <span className="text-right">{percent < 1 ? "< 1" : Math.round(percent)} %</span>
    </span>
  );
}
