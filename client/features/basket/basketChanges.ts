import { formatMoney } from "#shared/domain/money";
import type { Basket, BasketLine } from "#shared/schemas/basket";

const linesOf = ({ parcels }: Basket) =>
  new Map(parcels.flatMap(({ lines }) => lines).map((line) => [line.part.id, line]));

function lineChanges(was: BasketLine | undefined, now: BasketLine | undefined): string[] {
  const line = now ?? was;
  if (!line) return [];
  const { title, currency } = line.part;
  const money = (minor: number) => formatMoney(minor, currency);
  if (!was) return [`${title} was added: ${money(line.lineMinor)}`];
  if (!now) return [`${title} is no longer in the basket`];
  return [
    ...(was.unitMinor === now.unitMinor
      ? []
      : [`${title} is ${money(now.unitMinor)} each now; it was ${money(was.unitMinor)}`]),
    ...(was.quantity === now.quantity ? [] : [`${title}: ${now.quantity} now, ${was.quantity} before`]),
    ...(was.problem === now.problem || !now.problem ? [] : [`${title}: ${now.problem}`]),
  ];
}

/** In words, what of a basket is no longer as it was shown. Empty where nothing is. */
export function basketChanges(was: Basket, now: Basket): string[] {
  const [before, after] = [linesOf(was), linesOf(now)];
  const ids = [...new Set([...before.keys(), ...after.keys()])];
  const postage = now.parcels.flatMap((parcel) => {
    const earlier = was.parcels.find(({ workshop }) => workshop.id === parcel.workshop.id);
    if (!earlier || earlier.shippingMinor === parcel.shippingMinor) return [];
    const money = (minor: number) => formatMoney(minor, now.currency);
    return [
      `Postage from ${parcel.workshop.name} is ${money(parcel.shippingMinor)} now; it was ${money(earlier.shippingMinor)}`,
    ];
  });
  return [...ids.flatMap((id) => lineChanges(before.get(id), after.get(id))), ...postage];
}
