import { verdictOf } from "#shared/domain/verdict";
import type { NearMiss, SearchAnswer, SearchItem } from "#shared/schemas/search";

const stated = (nominalMm: number, plusMinusMm: number) => ({
  nominalMm,
  plusMinusMm,
  tolerance: "stated" as const,
  toleranceClass: null,
});

/** A wheel of this size, with this chance to fit. */
export function buildItem({ title = "Test wheel", nominalMm = 44.2, chance = 0.96 } = {}): SearchItem {
  return {
    part: {
      id: title.replaceAll(" ", "-"),
      kind: "idler-wheel",
      title,
      offerType: "stocked",
      material: "NBR",
      hardnessShoreA: 45,
      priceMinor: 2400,
      currency: "EUR",
      available: 7,
      dispatchDays: 2,
      dimensions: { outsideDiameter: stated(nominalMm, 0.1), bore: stated(4, 0.02) },
      kitLines: [],
      photo: null,
    },
    workshop: { id: "w", slug: "test-works", name: "Test Works", town: "Testby", country: "NO", countryName: "Norway" },
    fit: {
      chance,
      verdict: verdictOf(chance),
      coverage: 0.5,
      checked: 2,
      matters: 4,
      reason: `Reason of ${title}.`,
      dimensions: [
        {
          dimension: "outsideDiameter",
          chance,
          deviationMm: nominalMm - 44.15,
          combinedUncertaintyMm: 0.1,
          lowerMm: 43.65,
          upperMm: 44.65,
          reason: "",
        },
      ],
    },
    kitLineId: null,
    landedMinor: 3140,
    shippingMinor: 740,
    currency: "EUR",
    evidence: { fitted: 0, fittedAfterWork: 0, didNotFit: 0, sentence: "No fit reports yet" },
  };
}

type Given = { items?: SearchItem[]; nearMisses?: NearMiss[]; total?: number; nextCursor?: string | null };

export function buildSearchAnswer({ items = [buildItem()], nearMisses = [], ...given }: Given = {}): SearchAnswer {
  const { total = items.length, nextCursor = null } = given;
  return {
    need: {
      kind: "idler-wheel",
      dimensions: [
        {
          dimension: "outsideDiameter",
          text: "44.05 mm",
          echo: "44.05 mm",
          asFoundMm: 44.05,
          asNewMm: 44.15,
          standardUncertaintyMm: 0.085,
          lowerMm: 43.65,
          upperMm: 44.65,
          bandFrom: "common-practice",
          basis: [],
        },
      ],
      instrument: "digital-caliper",
      condition: "glazed",
      family: null,
      q: null,
      shipTo: "DE",
    },
    items,
    rail: {
      dimension: "outsideDiameter",
      fromMm: 42,
      toMm: 46.3,
      ticks: items.map(({ part, fit }) => ({
        partId: part.id,
        title: part.title,
        nominalMm: part.dimensions.outsideDiameter?.nominalMm ?? 0,
        plusMinusMm: 0.1,
        verdict: fit?.verdict ?? "unfit",
      })),
    },
    nearMisses,
    total,
    nextCursor,
  };
}
