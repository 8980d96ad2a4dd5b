import { type Verdict, verdicts, verdictThresholds } from "#shared/domain/verdict";
import { VerdictShape } from "../../ui/VerdictMark";
import { verdictColour, verdictWords } from "../../ui/verdictWords";

const percent = (chance: number) => `${Math.round(chance * 100)} %`;
const range = (verdict: Verdict) =>
  verdict === "unfit"
    ? `less than ${percent(verdictThresholds.chancy)}`
    : `${percent(verdictThresholds[verdict])} or more`;

/** The verdicts, their marks, and the chance that earns each. */
export function VerdictLines() {
  return (
    <ul className="grid gap-1">
      {verdicts.map((verdict) => (
        <li key={verdict} className="flex items-center gap-3">
          <svg width="16" height="16" viewBox="-8 -8 16 16" className={verdictColour[verdict]} aria-hidden="true">
            <VerdictShape verdict={verdict} />
          </svg>
          <span className={`min-w-20 font-bold ${verdictColour[verdict]}`}>{verdictWords[verdict]}</span>
          {range(verdict)}
        </li>
      ))}
    </ul>
  );
}
