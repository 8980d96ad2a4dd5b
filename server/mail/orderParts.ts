import type { Logger } from "pino";
import { countryName } from "#shared/domain/countries";
import { formatMoney } from "#shared/domain/money";
import type { Address } from "#shared/schemas/order";
import type { OrderLine } from "../models/OrderLine";
import type { Block } from "./Letter";
import { partPicture } from "./pictures";
import { sizesText } from "./sizesText";

const dateFormat = new Intl.DateTimeFormat("en-GB", { dateStyle: "long", timeZone: "UTC" });

/** A day in words: "4 December 2026" (UTC). */
export const dayInWords = (at: Date): string => dateFormat.format(at);

export const addressLines = ({ name, line1, line2, postcode, town, region, country }: Address): string[] =>
  [name, line1, line2, `${postcode} ${town}`, region, countryName(country)].filter(Boolean);

const offerNotes = {
  stocked: [],
  "made-to-order": ["Made to order"],
  "re-mould": ["Re-mould: the old core is sent in"],
};

/** Lines of a parcel, each with its drawing; `madeToSize` is what the reader is told of a line made to size. */
export function lineBlocks(
  lines: readonly OrderLine[],
  { currency, madeToSize, logger }: { currency: string; madeToSize: string; logger: Logger },
): Promise<Block[]> {
  const money = (minor: number) => formatMoney(minor, currency);
  return Promise.all(
    lines.map(async (line) => ({
      part: {
        title: line.title,
        sizes: sizesText(line.listing),
        forNeed: line.forNeed,
        notes: [...offerNotes[line.listing.offerType], ...(line.madeToSize ? [madeToSize] : [])],
        amount: `${line.quantity} x ${money(line.unitMinor)} = ${money(line.lineMinor)}`,
        picture: await partPicture(`${line.id}@idlewright`, line.listing, logger),
      },
    })),
  );
}
