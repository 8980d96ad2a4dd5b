import type { Transaction } from "sequelize";
import { hashPassword } from "../accounts/passwords";
import { ShippingCountry } from "../models/ShippingCountry";
import { ShippingRate } from "../models/ShippingRate";
import { TaxRegistration } from "../models/TaxRegistration";
import { User } from "../models/User";
import { Workshop } from "../models/Workshop";
import { demoAccounts, demoPassword } from "./demoAccounts";
import { between, idOf } from "./dice";
import { type DemoWorkshop, demoWorkshops } from "./workshopData";

const europe = ["AT", "BE", "CH", "DE", "DK", "EE", "ES", "FI", "FR", "GB", "IE", "IT", "NL", "NO", "PL", "PT", "SE"];
const overseas = ["AU", "CA", "JP", "NZ", "US"];
const world = [...europe, ...overseas];

export const restorerNames = [
  "Ada Birkwood",
  "Nils Overby",
  "Carla Venn",
  "Joost Akkerman",
  "Petra Holm",
  "Sam Ridley",
];
export const userId = (name: string) => idOf("user", name);
export const workshopId = (slug: string) => idOf("workshop", slug);

const slugOf = (name: string) => name.toLowerCase().replaceAll(/[^a-z]+/g, "-");

function zonesOf({ country, slug }: DemoWorkshop) {
  const near = europe.includes(country) ? europe : overseas.filter((code) => ["US", "CA"].includes(code));
  const rest = world.filter((code) => code !== country && !near.includes(code));
  const base = between(390, 590, 10, slug, "postage");
  return [
    { zone: "home", countries: [country], baseMinor: base, perItemMinor: 0, freeOverMinor: 9000 },
    {
      zone: "near",
      countries: near.filter((code) => code !== country),
      baseMinor: base + 350,
      perItemMinor: 40,
      freeOverMinor: null,
    },
    { zone: "far", countries: rest, baseMinor: base + 990, perItemMinor: 90, freeOverMinor: null },
  ].filter(({ countries }) => countries.length > 0);
}

async function seedWorkshop(data: DemoWorkshop, ownerId: string, transaction: Transaction) {
  const id = workshopId(data.slug);
  await Workshop.create(
    {
      id,
      ownerId,
      slug: data.slug,
      name: data.name,
      state: "admitted",
      about: data.about,
      town: data.town,
      country: data.country,
      legalName: data.legalName,
      legalAddress: [data.street, data.town],
      phone: `+00 555 ${between(1000, 9999, 1, data.slug, "phone")}`,
      contactEmail: `post@${data.slug}.example`,
      registration: data.registration,
      dispatchDays: data.dispatchDays,
      returnsTerms:
        "You can change your mind within 14 days of receiving the last part, and send it back unused. Wheels and belts made to your own size are exempt, and so is your own hub.",
    },
    { transaction },
  );
  for (const { countries, ...zone } of zonesOf(data)) {
    const rate = await ShippingRate.create(
      { id: idOf("rate", data.slug, zone.zone), workshopId: id, currency: "EUR", ...zone },
      { transaction },
    );
    await ShippingCountry.bulkCreate(
      countries.map((country) => ({ workshopId: id, country, rateId: rate.id })),
      { transaction },
    );
  }
  await TaxRegistration.bulkCreate(
    Object.entries(data.tax).map(([country, rateBasisPoints]) => ({
      workshopId: id,
      country,
      number: `${country}-${between(100_000_000, 999_999_999, 1, data.slug, "tax", country)}`,
      rateBasisPoints,
    })),
    { transaction },
  );
}

/** The people of the demo data, their workshops, postage and tax. All share one password, told on the sign-in page. */
export async function seedPeople(transaction: Transaction, now: Date): Promise<void> {
  const passwordHash = await hashPassword(demoPassword);
  const person = (name: string, email: string, role: User["role"]) =>
    User.create(
      { id: userId(name), email, displayName: name, role, passwordHash, emailVerifiedAt: now },
      { transaction },
    );

  const [restorer, owner, administrator] = demoAccounts;
  for (const name of restorerNames) {
    const first = name === restorerNames[0];
    await person(name, first ? restorer.email : `${slugOf(name)}@idlewright.example`, "restorer");
  }
  await person("Ines Falk", administrator.email, "administrator");
  for (const data of demoWorkshops) {
    const first = data === demoWorkshops[0];
    await person(data.owner, first ? owner.email : `${slugOf(data.owner)}@idlewright.example`, "workshop");
    await seedWorkshop(data, userId(data.owner), transaction);
  }
}
