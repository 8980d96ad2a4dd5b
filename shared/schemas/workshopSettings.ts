import { z } from "zod";
import { countryName } from "../domain/countries";
import { Currency, Slug, Time } from "./common";
import { countryCodes } from "./countryCodes";

const longestText = 4000;
const text = z
  .string("Write some words")
  .trim()
  .max(longestText, `Use at most ${longestText} characters`)
  .regex(/^(?:\P{Cc}|[\n\r\t])*$/u, "Use letters, numbers and line breaks");
const line = (missing: string, max: number) =>
  z
    .string(missing)
    .trim()
    .min(1, missing)
    .max(max, `Use at most ${max} characters`)
    .regex(/^\P{Cc}*$/u, "Use letters and numbers on one line");

const known = new Set(countryCodes);
const Country = z.string("Choose a country").refine((code) => known.has(code), "Choose a country");

const amountWords = "Write an amount like 4.90";
const amount = (mostMinor: number, most: string) =>
  z.int(amountWords).min(0, amountWords).max(mostMinor, `Ask at most ${most}`);

/** A zone of a workshop's postage; amounts in minor units of the market's currency. */
const PostageZone = z.object({
  zone: line("Give the zone a name", 60),
  countries: z.array(Country, "Choose its countries").min(1, "Add at least one country").max(countryCodes.length),
  baseMinor: amount(100_000, "1,000.00"),
  perItemMinor: amount(100_000, "1,000.00"),
  /** Null where postage is never free. */
  freeOverMinor: amount(10_000_000, "100,000.00").min(1, "Write an amount above 0, or leave it empty").nullable(),
});

const rateWords = "Write a rate from 0 to 50, with at most two decimals";
const OwnTaxRegistration = z.object({
  country: Country,
  number: line("Give the number of the registration", 40),
  ratePercent: z.number(rateWords).min(0, rateWords).max(50, rateWords).multipleOf(0.01, rateWords),
});

/** A country lies in one zone only, once, and zones are told apart by their names. */
const Zones = z
  .array(PostageZone, "Give the zones")
  .min(1, "Add at least one zone: without one nobody can buy")
  .max(40, "Use at most 40 zones")
  .superRefine((zones, { addIssue }) => {
    const zoneOf = new Map<string, string>();
    const names = new Set<string>();
    for (const [index, { zone, countries }] of zones.entries()) {
      const name = zone.toLowerCase();
      if (names.has(name)) {
        addIssue({ code: "custom", path: [index, "zone"], message: "Another zone has this name" });
      }
      names.add(name);
      const twice = countries.find((country, at) => zoneOf.has(country) || countries.indexOf(country) !== at);
      if (twice !== undefined) {
        const message = `${countryName(twice)} is in “${zoneOf.get(twice) ?? zone}” already: a country lies in one zone`;
        addIssue({ code: "custom", path: [index, "countries"], message });
      }
      for (const country of countries) if (!zoneOf.has(country)) zoneOf.set(country, zone);
    }
  });

const TaxRegistrations = z
  .array(OwnTaxRegistration, "Give the registrations")
  .max(countryCodes.length)
  .superRefine((registrations, { addIssue }) => {
    for (const [index, { country }] of registrations.entries()) {
      if (registrations.findIndex((one) => one.country === country) === index) continue;
      const message = `${countryName(country)} has a registration already`;
      addIssue({ code: "custom", path: [index, "country"], message });
    }
  });

const daysWords = "Write whole days from 0 to 60";

/** What a workshop says of itself and asks for: sent whole, and kept whole or not at all. */
export const WorkshopSettings = z.object({
  about: text,
  dispatchDays: z.int(daysWords).min(0, daysWords).max(60, daysWords),
  returnsTerms: text,
  zones: Zones,
  taxRegistrations: TaxRegistrations,
  /** The version that was changed, as it was read; another one meanwhile is not written over. */
  version: Time,
});
export type WorkshopSettings = z.infer<typeof WorkshopSettings>;

/** Settings as read, with the workshop that they belong to. */
export const WorkshopSettingsPage = z.object({
  workshop: z.object({
    slug: Slug,
    name: z.string(),
    state: z.enum(["draft", "applied", "admitted", "refused", "suspended"]),
  }),
  /** Of all amounts. */
  currency: Currency,
  // As kept: what was written before a rule was made is shown, and refused when it is sent back.
  settings: z.object({
    about: z.string(),
    dispatchDays: z.int(),
    returnsTerms: z.string(),
    zones: z.array(
      z.object({
        zone: z.string(),
        countries: z.array(z.string()),
        baseMinor: z.int(),
        perItemMinor: z.int(),
        freeOverMinor: z.int().nullable(),
      }),
    ),
    taxRegistrations: z.array(z.object({ country: z.string(), number: z.string(), ratePercent: z.number() })),
    version: Time,
  }),
});
export type WorkshopSettingsPage = z.infer<typeof WorkshopSettingsPage>;
