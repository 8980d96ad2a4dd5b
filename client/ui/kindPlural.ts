import { kindFacts, type ListingKind } from "#shared/domain/partKinds";

/** "idler wheels", "rebuild kits". */
export const kindPlural = (kind: ListingKind): string =>
  kind === "rebuild-kit" ? "rebuild kits" : kindFacts[kind].plural;
