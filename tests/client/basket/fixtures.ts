import type { PartKind } from "#shared/domain/partKinds";
import type { Basket, BasketLine, BasketParcel } from "#shared/schemas/basket";
import type { Order } from "#shared/schemas/order";
import type { PartSummary, StatedDimensions, WorkshopSummary } from "#shared/schemas/part";
import type { Session } from "#shared/schemas/session";

export const idOf = (n: number): string => `00000000-0000-4000-8000-${String(n).padStart(12, "0")}`;

export function sizes(values: Partial<Record<string, number>>): StatedDimensions {
  const stated = ([name, nominalMm]: [string, number | undefined]) => [
    name,
    { nominalMm, plusMinusMm: 0.1, tolerance: "stated", toleranceClass: null },
  ];
  return Object.fromEntries(Object.entries(values).map(stated));
}

export const wheelSizes = sizes({ outsideDiameter: 44.2, bore: 4, treadWidth: 6, overallHeight: 12.5 });
export const beltSizes = sizes({ insideCircumference: 530, width: 5, thickness: 0.8 });

export function partOf(n: number, title: string, kind: PartKind, dimensions: StatedDimensions): PartSummary {
  return {
    id: idOf(n),
    kind,
    title,
    offerType: "stocked",
    material: "NBR",
    hardnessShoreA: 45,
    priceMinor: 2400,
    currency: "EUR",
    available: 7,
    dispatchDays: 2,
    dimensions,
    kitLines: [],
    photo: null,
  };
}

export const workshopOf = (
  n: number,
  name: string,
  town: string,
  country: string,
  countryName: string,
): WorkshopSummary => ({
  id: idOf(n),
  slug: name.toLowerCase().replaceAll(" ", "-"),
  name,
  town,
  country,
  countryName,
});
export const northMoor = workshopOf(900, "North Moor Rubber", "Vassborg", "SE", "Sweden");
export const kadeWorks = workshopOf(901, "Kade Works", "Osterwolde", "NL", "Netherlands");

export const wheel = partOf(1, "Platter idler, ground after moulding", "idler-wheel", wheelSizes);
export const belt = { ...partOf(2, "Flat belt, joined without a seam", "flat-belt", beltSizes), priceMinor: 900 };

export const lineOf = (part: PartSummary, quantity = 1, more: Partial<BasketLine> = {}): BasketLine => ({
  part,
  quantity,
  forNeed: null,
  unitMinor: part.priceMinor,
  lineMinor: part.priceMinor * quantity,
  madeToSize: false,
  problem: null,
  ...more,
});

export function parcelOf(
  workshop: WorkshopSummary,
  lines: BasketLine[],
  more: Partial<BasketParcel> = {},
): BasketParcel {
  const partsMinor = lines.reduce((sum, { lineMinor, problem }) => sum + (problem ? 0 : lineMinor), 0);
  const { shippingMinor = 740, taxRatePercent = 19 } = more;
  const totalMinor = partsMinor + shippingMinor;
  const taxMinor = Math.round((totalMinor * taxRatePercent) / (100 + taxRatePercent));
  return {
    workshop,
    lines,
    partsMinor,
    shippingMinor,
    taxMinor,
    taxRatePercent,
    totalMinor,
    leavesInDays: 2,
    problem: null,
    ...more,
  };
}

export function basketOf(parcels: BasketParcel[], shipTo = "DE"): Basket {
  const sum = (pick: (parcel: BasketParcel) => number) => parcels.reduce((total, parcel) => total + pick(parcel), 0);
  const lines = parcels.flatMap((parcel) => parcel.lines);
  return {
    shipTo,
    count: lines.reduce((count, { quantity }) => count + quantity, 0),
    parcels,
    partsMinor: sum(({ partsMinor }) => partsMinor),
    shippingMinor: sum(({ shippingMinor }) => shippingMinor),
    taxMinor: sum(({ taxMinor }) => taxMinor),
    totalMinor: sum(({ totalMinor }) => totalMinor),
    currency: "EUR",
    canCheckOut: lines.length > 0 && parcels.every((p) => !p.problem) && lines.every(({ problem }) => !problem),
  };
}

export const twoParcels = (quantity = 1, shipTo = "DE"): Basket =>
  basketOf(
    [
      parcelOf(northMoor, [lineOf(wheel, quantity, { forNeed: "idler wheel, outside diameter 44.05 mm, glazed" })]),
      parcelOf(kadeWorks, [lineOf(belt, 1, { madeToSize: true })], { taxRatePercent: 0, shippingMinor: 500 }),
    ],
    shipTo,
  );

export const countries = {
  items: [
    { code: "DE", name: "Germany" },
    { code: "NO", name: "Norway" },
    { code: "SE", name: "Sweden" },
  ],
};

export const signedOut: Session = { user: null, csrfToken: "token" };
export const signedIn: Session = {
  user: { id: idOf(500), email: "ada@example.test", displayName: "Ada", role: "restorer", emailVerified: true },
  csrfToken: "token",
};

export const home = {
  id: idOf(700),
  name: "Ada Winter",
  line1: "Uferweg 12",
  line2: "",
  postcode: "20999",
  town: "Neuwarden",
  region: "",
  country: "DE",
};

const { id: _, ...withoutId } = home;
export const homeAddress = withoutId;

export function orderOf(more: Partial<Order> = {}): Order {
  const basket = twoParcels();
  return {
    id: idOf(800),
    number: "26-10007",
    state: "awaiting-payment",
    createdAt: "2026-12-01T12:30:00.000Z",
    paidAt: null,
    holdUntil: "2026-12-01T13:05:00.000Z",
    shippingAddress: homeAddress,
    billingAddress: homeAddress,
    parcels: basket.parcels.map(({ workshop, lines, problem: __, leavesInDays: ___, ...sums }, index) => ({
      ...sums,
      id: idOf(810 + index),
      state: "to-accept",
      workshop,
      trader: {
        legalName: `${workshop.name} Ltd`,
        address: ["Quay 3", `1234 ${workshop.town}`, workshop.countryName],
        email: `post@${workshop.slug}.example`,
        phone: "+46 70 000 00 00",
        registration: "Register no. 000000-0000",
      },
      lines: lines.map(({ part, ...line }) => ({
        id: part.id.replace(/^0/, "1"),
        partId: part.id,
        title: part.title,
        kind: part.kind,
        dimensions: part.dimensions,
        forNeed: line.forNeed,
        quantity: line.quantity,
        unitMinor: line.unitMinor,
        lineMinor: line.lineMinor,
        taxMinor: 0,
        madeToSize: line.madeToSize,
      })),
      leavesBy: "2026-12-03T12:30:00.000Z",
      dispatchedAt: null,
      carrier: null,
      trackingNumber: null,
    })),
    partsMinor: basket.partsMinor,
    shippingMinor: basket.shippingMinor,
    taxMinor: basket.taxMinor,
    totalMinor: basket.totalMinor,
    refundedMinor: 0,
    currency: "EUR",
    history: [{ at: "2026-12-01T12:30:00.000Z", what: "Order placed; the parts are held for you" }],
    can: { pay: true, cancel: true },
    ...more,
  };
}
