/** "3.5", "3,5", "-2" as a number; null for anything else. No exponents, no grouping, no units. */
export function readPlainNumber(text: string): number | null {
  const tidy = text.trim().replace("\u2212", "-").replace(",", ".");
  if (!/^-?(?:\d+\.?\d*|\.\d+)$/.test(tidy)) return null;
  const value = Number(tidy);
  return Number.isFinite(value) ? value : null;
}
