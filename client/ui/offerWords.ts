import { countryName } from "#shared/domain/countries";
import type { PartSummary } from "#shared/schemas/part";
import { dispatchWords } from "../lib/formatDate";

const days = (count: number) => `${count} ${count === 1 ? "day" : "days"}`;

/** When a part leaves the workshop: "leaves in 2 days", "made in 18 days after the core arrives". */
export function readyWords({ offerType, dispatchDays }: PartSummary): string {
  if (offerType === "stocked") return dispatchWords(dispatchDays);
  if (offerType === "made-to-order") return `made for you in ${days(dispatchDays)}`;
  return `made in ${days(dispatchDays)} after the core arrives`;
}

/** How many can be had: "7 left", "none left", "made when ordered". */
export function stockWords({ available }: PartSummary): string {
  if (available === null) return "made when ordered";
  if (available === 0) return "none left";
  return `${available} left`;
}

export const offerNames: Record<PartSummary["offerType"], string> = {
  stocked: "stocked",
  "made-to-order": "made to order",
  "re-mould": "re-mould of your core",
};

/** "CR, 50 Shore A". */
export function materialWords({ material, hardnessShoreA }: Pick<PartSummary, "material" | "hardnessShoreA">): string {
  const words = material === "natural-rubber" ? "natural rubber" : material;
  return [words, hardnessShoreA === null ? null : `${hardnessShoreA} Shore A`].filter(Boolean).join(", ");
}

export const toCountry = (code: string): string => `to ${countryName(code)}`;
