import { zodResolver } from "@hookform/resolvers/zod";
import type { Resolver } from "react-hook-form";
import { currencyExponent, toMinor } from "#shared/domain/money";
import { WorkshopSettings, type WorkshopSettingsPage } from "#shared/schemas/workshopSettings";

/** The settings as they stand in the form: numbers as typed, amounts in whole units of the currency. */
export type SettingsValues = Omit<WorkshopSettings, "dispatchDays" | "zones" | "taxRegistrations"> & {
  dispatchDays: string;
  zones: { zone: string; countries: string[]; baseMinor: string; perItemMinor: string; freeOverMinor: string }[];
  taxRegistrations: { country: string; number: string; ratePercent: string }[];
};

export const emptyZone = { zone: "", countries: [], baseMinor: "", perItemMinor: "", freeOverMinor: "" };
export const emptyRegistration = { country: "", number: "", ratePercent: "" };

function amountText(minor: number, currency: string): string {
  const places = currencyExponent(currency);
  return (minor / 10 ** places).toFixed(places);
}

/** Minor units of what was typed, with a point or a comma; NaN for what is no amount, which the schema refuses. */
export function readAmount(text: string, currency: string): number {
  try {
    return toMinor(text.trim().replace(",", "."), currency);
  } catch {
    return Number.NaN;
  }
}

const readPlain = (text: string): number => (text.trim() === "" ? Number.NaN : Number(text.trim().replace(",", ".")));

/** What the form starts with. */
export function valuesOf({ settings, currency }: WorkshopSettingsPage): SettingsValues {
  return {
    ...settings,
    dispatchDays: String(settings.dispatchDays),
    zones: settings.zones.map(({ baseMinor, perItemMinor, freeOverMinor, ...zone }) => ({
      ...zone,
      baseMinor: amountText(baseMinor, currency),
      perItemMinor: amountText(perItemMinor, currency),
      freeOverMinor: freeOverMinor === null ? "" : amountText(freeOverMinor, currency),
    })),
    taxRegistrations: settings.taxRegistrations.map((one) => ({ ...one, ratePercent: String(one.ratePercent) })),
  };
}

/** What the form says, as it is sent; not checked yet. */
export function settingsOf(values: SettingsValues, currency: string): WorkshopSettings {
  return {
    ...values,
    dispatchDays: readPlain(values.dispatchDays),
    zones: values.zones.map((zone) => ({
      ...zone,
      baseMinor: readAmount(zone.baseMinor, currency),
      perItemMinor: readAmount(zone.perItemMinor, currency),
      freeOverMinor: zone.freeOverMinor.trim() === "" ? null : readAmount(zone.freeOverMinor, currency),
    })),
    taxRegistrations: values.taxRegistrations.map((one) => ({ ...one, ratePercent: readPlain(one.ratePercent) })),
  };
}

/** Checks with the server's own schema: its fields have the same names here. */
export const settingsResolver =
  (currency: string): Resolver<SettingsValues, unknown, WorkshopSettings> =>
  (values, context, options) => {
    const check = zodResolver(WorkshopSettings) as unknown as Resolver<WorkshopSettings, unknown, WorkshopSettings>;
    return check(settingsOf(values, currency), context, options as never) as never;
  };
