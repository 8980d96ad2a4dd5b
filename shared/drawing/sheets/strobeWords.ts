import { roundDecimal } from "#shared/domain/roundDecimal";
import { isExact, type StrobeRing } from "#shared/domain/strobe";

type Ring = StrobeRing & { rpm: number };

/** A number with at most so many decimals, none for nothing. */
export const shortNumber = (value: number, decimals: number): string => {
  const text = roundDecimal(value, decimals);
  return text.includes(".") ? text.replace(/\.?0+$/, "") : text;
};

/** A speed as people write it: "33 1/3" for 100/3, else at most three decimals. */
export function speedName(rpm: number): string {
  const thirds = rpm * 3;
  const whole = Math.floor(rpm + 1e-9);
  const isThird = Math.abs(thirds - Math.round(thirds)) < 1e-9 && Math.abs(rpm - Math.round(rpm)) > 0.1;
  return isThird ? `${whole} ${Math.round(thirds) - 3 * whole}/3` : shortNumber(rpm, 3);
}

/** A deviation with its sign: "+0.25 %", "−0.10 %". */
export const signedPercent = (percent: number): string => {
  const text = roundDecimal(Math.abs(percent), Math.abs(percent) < 0.095 ? 3 : 2);
  return `${percent < 0 ? "−" : "+"}${text} %`;
};

/** What a ring shows when it stands still: "45.11 rpm, +0.25 %" or "45 rpm, exact". */
export const shownWords = (ring: Ring): string =>
  isExact(ring)
    ? `${speedName(ring.rpm)} rpm, exact`
    : `${roundDecimal(ring.shownRpm, 2)} rpm, ${signedPercent(ring.errorPercent)}`;

/** "133 bars", or "400 bars, 3 pass at each flash". */
export const barsWords = ({ bars, barsPerFlash }: StrobeRing): string =>
  `${bars} bars${barsPerFlash > 1 ? `, ${barsPerFlash} pass at each flash` : ""}`;

/** How the bars of a ring move at the very speed that is wanted: "still", "15 a minute back". */
export function creepWords(ring: Ring): string {
  if (isExact(ring)) return "still";
  const { creepPerMinute } = ring;
  return `${shortNumber(Math.abs(creepPerMinute), 1)} a minute ${creepPerMinute < 0 ? "back" : "forward"}`;
}
