import { formatMoney } from "#shared/domain/money";

/** An amount of integer minor units in its currency. */
export function Money({ minor, currency }: { minor: number; currency: string }) {
  return <span className="whitespace-nowrap">{formatMoney(minor, currency)}</span>;
}
