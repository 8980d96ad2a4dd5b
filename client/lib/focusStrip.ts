import type { DimensionName } from "#shared/domain/partKinds";

type Opener = (dimension: DimensionName) => void;
let opener: Opener | null = null;

/** The strip on the page says how a field of it is opened and focused. */
export function offerStrip(open: Opener): () => void {
  opener = open;
  return () => {
    if (opener === open) opener = null;
  };
}

/** Puts the cursor where this dimension is written, adding the field where it is not there yet. */
export function focusStripField(dimension: DimensionName): void {
  opener?.(dimension);
}
