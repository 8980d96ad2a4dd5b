import { permissibleError } from "#shared/domain/permissibleError";
import { roundDecimal } from "#shared/domain/roundDecimal";

/** How far a reading from a printed gauge may be off at some sizes, as the gauges of this program reckon it. */
export function printError(sizesMm: readonly number[]): string {
  const at = sizesMm.map(
    (mm) => `±${roundDecimal(permissibleError("printed-gauge", mm).plusMinusMm, 1)} mm at ${mm} mm`,
  );
  return `Reckon with ${at.join(" and ")} (${permissibleError("printed-gauge", 10).source}).`;
}
