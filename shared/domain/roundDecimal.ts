/**
 * A number with a fixed count of decimals, halves rounded away from zero as a person rounds what is written:
 * 44.055 gives "44.06", though the nearest double lies just below. Never "-0.00".
 */
export function roundDecimal(value: number, decimals: number): string {
  const text = String(Math.abs(value));
  const rounded = text.includes("e")
    ? Math.abs(value).toFixed(decimals)
    : Number(`${Math.round(Number(`${text}e${decimals}`))}e-${decimals}`).toFixed(decimals);
  return value < 0 && Number(rounded) !== 0 ? `-${rounded}` : rounded;
}
