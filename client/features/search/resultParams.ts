import { offerNames } from "../../ui/offerWords";
import { type Material, materials, type OfferType, offerTypes } from "./filterNames";

export const sorts = [
  { value: "fit", words: "best fit" },
  { value: "price", words: "landed price" },
  { value: "dispatch", words: "soonest" },
] as const;

export type Applied = { name: string; words: string };

export const materialName = (material: Material): string =>
  material === "natural-rubber" ? "natural rubber" : material;

/** The filters that stand in an address, each in words. */
export function appliedFilters(params: URLSearchParams): Applied[] {
  const offer = offerTypes.find((one) => one === params.get("offer"));
  const material = materials.find((one) => one === params.get("material"));
  const chance = Number(params.get("minChance") ?? Number.NaN);
  return [
    ...(offer ? [{ name: "offer", words: offerNames[offer as OfferType] }] : []),
    ...(material ? [{ name: "material", words: materialName(material) }] : []),
    ...(chance > 0 && chance <= 1
      ? [{ name: "minChance", words: `chance of ${Math.round(chance * 100)} % or more` }]
      : []),
  ];
}

/** The address with one parameter set, or taken out with an empty value. */
export function withParam(params: URLSearchParams, name: string, value: string): URLSearchParams {
  const next = new URLSearchParams(params);
  if (value) next.set(name, value);
  else next.delete(name);
  return next;
}
