import type { Material, OfferType } from "#shared/schemas/part";

export type { Material, OfferType };

// The schema's own lists, written out because importing a schema brings its parser along; the types hold them together.
export const offerTypes = ["stocked", "made-to-order", "re-mould"] as const satisfies readonly OfferType[];
export const materials = [
  "NBR",
  "CR",
  "EPDM",
  "silicone",
  "polyurethane",
  "natural-rubber",
  "cork",
  "felt",
] as const satisfies readonly Material[];
