import { hash } from "@node-rs/argon2";
import type { CreationAttributes } from "sequelize";
import { inTransaction } from "#server/db/inTransaction";
import { MeasuredDimension } from "#server/models/MeasuredDimension";
import { MeasuredItem } from "#server/models/MeasuredItem";
import { Part } from "#server/models/Part";
import { ShippingCountry } from "#server/models/ShippingCountry";
import { ShippingRate } from "#server/models/ShippingRate";
import { TaxRegistration } from "#server/models/TaxRegistration";
import { User } from "#server/models/User";
import { Workshop } from "#server/models/Workshop";
import { type DimensionName, kindFacts, type PartKind } from "#shared/domain/partKinds";

let count = 0;
/** A number not given before in this file, to keep names apart. */
const next = () => ++count;

export const testPassword = "correct horse battery staple";
// Cheap on purpose: what a password costs is tested where passwords are.
const cheapHash = hash(testPassword, { memoryCost: 1024, timeCost: 1, parallelism: 1 });

export async function buildUser(given: Partial<CreationAttributes<User>> = {}): Promise<User> {
  const n = next();
  return User.create({
    email: `person${n}@example.org`,
    passwordHash: await cheapHash,
    displayName: `Person ${n}`,
    emailVerifiedAt: new Date(),
    ...given,
  });
}

/** An admitted workshop that ships to `countries` at 5.00 + 1.00 a piece, and collects tax where told. */
export async function buildWorkshop({
  countries = ["DE", "NO", "US"],
  tax = {},
  ...given
}: Partial<CreationAttributes<Workshop>> & {
  countries?: string[];
  tax?: Record<string, number>;
} = {}): Promise<Workshop> {
  const n = next();
  const owner = given.ownerId ? null : await buildUser({ role: "workshop" });
  const workshop = await Workshop.create({
    ownerId: owner?.id ?? "",
    slug: `works-${n}`,
    name: `Works ${n}`,
    state: "admitted",
    town: "Testby",
    country: "DE",
    legalName: `Works ${n} Ltd`,
    legalAddress: [`${n} Mould Lane`, "00001 Testby"],
    phone: "+00 000 000",
    contactEmail: `works${n}@example.org`,
    registration: `REG-${n}`,
    ...given,
  });
  const rate = await ShippingRate.create({
    workshopId: workshop.id,
    zone: "everywhere",
    baseMinor: 500,
    perItemMinor: 100,
    currency: "EUR",
  });
  for (const country of countries) await ShippingCountry.create({ workshopId: workshop.id, country, rateId: rate.id });
  for (const [country, rateBasisPoints] of Object.entries(tax)) {
    await TaxRegistration.create({ workshopId: workshop.id, country, number: `TAX-${n}`, rateBasisPoints });
  }
  return workshop;
}

type Sizes = Partial<Record<DimensionName, number | [nominalMm: number, plusMinusMm: number]>>;

/** A published part with its sizes in mm; a bare number gets a tolerance of 0.1 mm, stated. */
export async function buildPart({
  sizes,
  ...given
}: Partial<Omit<CreationAttributes<Part>, "kind">> & { kind?: PartKind; sizes?: Sizes } = {}): Promise<Part> {
  const n = next();
  const kind = given.kind ?? "idler-wheel";
  const workshopId = given.workshopId ?? (await buildWorkshop()).id;
  const offerType = given.offerType ?? "stocked";
  return inTransaction(async (transaction) => {
    const part = await Part.create(
      {
        reference: `R-${n}`,
        title: `Part ${n}`,
        priceMinor: 2000,
        currency: "EUR",
        state: "published",
        stockOnHand: offerType === "stocked" ? 10 : null,
        coreTerms: offerType === "re-mould" ? "Send the hub" : null,
        searchText: given.title ?? `Part ${n}`,
        ...given,
        offerType,
        kind,
        workshopId,
      },
      { transaction },
    );
    const item = await MeasuredItem.create(
      { partId: part.id, kind, primaryDimension: kindFacts[kind].primary },
      { transaction },
    );
    const stated = Object.entries(sizes ?? { [kindFacts[kind].primary]: 44, bore: 4 }) as [
      DimensionName,
      number | [number, number],
    ][];
    for (const [dimension, size] of stated) {
      const [nominalMm, plusMinusMm] = typeof size === "number" ? [size, 0.1] : size;
      await MeasuredDimension.create(
        {
          itemId: item.id,
          kind,
          dimension,
          nominalUm: Math.round(nominalMm * 1000),
          halfWidthUm: Math.round(plusMinusMm * 1000),
          tolerance: "stated",
          toleranceClass: null,
        },
        { transaction },
      );
    }
    return part;
  });
}
