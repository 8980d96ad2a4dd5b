import type { BasketLine, BasketParcel } from "#shared/schemas/basket";
import type { WorkshopSummary } from "#shared/schemas/part";

/** A line that was taken out a moment ago, and where it stood. */
export type RemovedLine = { line: BasketLine; workshop: WorkshopSummary; index: number };
export type Entry = { line: BasketLine; isRemoved: boolean };
export type Section = { workshop: WorkshopSummary; parcel: BasketParcel | null; entries: Entry[] };

/**
 * The parcels with what was taken out of them still standing where it stood, so that it can be put back. A workshop whose
 * last line was taken out keeps a section without a parcel, at the end. What is in the basket again is not removed.
 */
export function withRemoved(parcels: readonly BasketParcel[], removed: readonly RemovedLine[]): Section[] {
  const sections: Section[] = parcels.map((parcel) => ({
    workshop: parcel.workshop,
    parcel,
    entries: parcel.lines.map((line) => ({ line, isRemoved: false })),
  }));
  const inBasket = new Set(parcels.flatMap(({ lines }) => lines.map(({ part }) => part.id)));
  for (const { line, workshop, index } of removed) {
    if (inBasket.has(line.part.id)) continue;
    let section = sections.find((one) => one.workshop.id === workshop.id);
    if (!section) {
      section = { workshop, parcel: null, entries: [] };
      sections.push(section);
    }
    section.entries.splice(index, 0, { line, isRemoved: true });
  }
  return sections;
}
