import { type Market, mostUseful } from "./Market";
import { type Row, rowOf } from "./Milp";
import type { Objective } from "./solveInOrder";

/** How many units towards each need each workshop can give, at most what is needed. */
export function reachOf({ quantities, workshops, offers }: Market): number[][] {
  const reach = workshops.map(() => quantities.map(() => 0));
  for (const { workshop, stock, covers } of offers) {
    for (const { need } of covers) {
      const row = reach[workshop];
      if (row) row[need] = Math.min((row[need] ?? 0) + stock, quantities[need] ?? 0);
    }
  }
  return reach;
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);

/**
 * A market as a model: a column for the units of each offer, then one for whether each workshop sends a parcel.
 *
 * Rows: every need is covered; an offer is bought only where its workshop sends; and, what follows from these but lets
 *       the solver see it, the workshops that send can reach every need between them.
 */
export function coverModel(market: Market) {
  const { quantities, workshops, offers } = market;
  const reach = reachOf(market);
  const units = offers.map((offer) => mostUseful(market, offer));
  const columns = (ofOffer: (i: number) => number, ofWorkshop: (w: number) => number) => [
    ...offers.map((_, i) => ofOffer(i)),
    ...workshops.map((_, w) => ofWorkshop(w)),
  ];
  const none = () => 0;
  const covered = quantities.map((quantity, need) =>
    rowOf(
      columns((i) => (offers[i]?.covers.some((covering) => covering.need === need) ? 1 : 0), none),
      quantity,
      Infinity,
    ),
  );
  const sent: Row[] = offers.map(({ workshop }, i) => ({
    columns: [i, offers.length + workshop],
    values: [1, -(units[i] ?? 0)],
    lower: -Infinity,
    upper: 0,
  }));
  const reached = quantities.map((quantity, need) =>
    rowOf(
      columns(none, (w) => reach[w]?.[need] ?? 0),
      quantity,
      Infinity,
    ),
  );
  const pieces = sum(quantities);
  const unitMinor = ({ priceMinor, workshop }: Market["offers"][number]) =>
    priceMinor + (workshops[workshop]?.perItemMinor ?? 0);
  const total: Objective = {
    costs: columns(
      (i) => unitMinor(offers[i]!),
      (w) => workshops[w]!.baseMinor,
    ),
    most:
      sum(offers.map((offer, i) => unitMinor(offer) * units[i]!)) + sum(workshops.map(({ baseMinor }) => baseMinor)),
  };
  // In the best plan every unit is wanted by some need, else it would be left out: so there are never more than needed.
  const parcels: Objective = { costs: columns(none, () => 1), most: Math.min(workshops.length, pieces) };
  const bought: Objective = { costs: columns(() => 1, none), most: pieces };
  return {
    uppers: columns(
      (i) => units[i]!,
      () => 1,
    ),
    rows: [...covered, ...sent, ...reached],
    objectives: { total, parcels, bought },
  };
}
