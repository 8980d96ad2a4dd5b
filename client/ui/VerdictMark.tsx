import type { Verdict } from "#shared/schemas/part";
import { chanceWords, verdictColour, verdictWords } from "./verdictWords";

/** The shape alone, drawn around the origin of an SVG: filled disc, half disc, ring, cross. */
export function VerdictShape({ verdict, radius = 5 }: { verdict: Verdict; radius?: number }) {
  const r = radius;
  if (verdict === "unfit") {
    const d = r * 0.8;
    return (
      <path d={`M${-d} ${-d}L${d} ${d}M${-d} ${d}L${d} ${-d}`} fill="none" stroke="currentColor" strokeWidth={1.8} />
    );
  }
  return (
    <>
      <circle
        r={r}
        fill={verdict === "sure" ? "currentColor" : "var(--color-ground)"}
        stroke="currentColor"
        strokeWidth={1.6}
      />
      {verdict === "likely" && <path d={`M0 ${-r}A${r} ${r} 0 0 1 0 ${r}Z`} fill="currentColor" />}
    </>
  );
}

/** Mark, word and chance: "Sure 96 %". */
export function VerdictMark({ verdict, chance }: { verdict: Verdict; chance: number }) {
  return (
    <span className={`font-bold whitespace-nowrap ${verdictColour[verdict]}`}>
      <svg
        width="14"
        height="14"
        viewBox="-7 -7 14 14"
        className="mr-1.5 inline-block align-[-0.1em]"
        aria-hidden="true"
      >
        <VerdictShape verdict={verdict} />
      </svg>
      {verdictWords[verdict]} {chanceWords(chance)}
    </span>
  );
}
