import { roundDecimal } from "#shared/domain/roundDecimal";
import type { AgeRow } from "./ageRows";

/** "+0.15 mm, give or take 0.20 mm"; for a change that grows with the size also its share. */
export function changeWords({ correctionMm, spreadMm }: AgeRow, sizeMm: number): string {
  if (spreadMm === 0) return "no change";
  const decimals = spreadMm < 1 ? 2 : 1;
  const mm = roundDecimal(Math.abs(correctionMm), decimals);
  const sign = correctionMm < 0 ? "−" : "+";
  const share =
    sizeMm >= 100 && correctionMm !== 0
      ? ` (${sign}${roundDecimal((Math.abs(correctionMm) / sizeMm) * 100, 1)} %)`
      : "";
  return `${correctionMm === 0 ? "0" : sign + mm} mm${share}, give or take ${roundDecimal(spreadMm, decimals)} mm`;
}
