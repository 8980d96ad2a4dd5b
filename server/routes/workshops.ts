import { countryName } from "#shared/domain/countries";
import { type ListingKind, listingKinds } from "#shared/domain/partKinds";
import { WorkshopList, WorkshopPage } from "#shared/schemas/catalogue";
import { SlugParams } from "#shared/schemas/common";
import type { WorkshopSummary } from "#shared/schemas/part";
import { select } from "../db/select";
import { AppError } from "../errors/AppError";
import { type Endpoint, endpoint } from "../http/endpoint";
import { Part } from "../models/Part";
import { ShippingCountry } from "../models/ShippingCountry";
import { ShippingRate } from "../models/ShippingRate";
import { TaxRegistration } from "../models/TaxRegistration";
import { Workshop } from "../models/Workshop";
import { presentParts } from "../presenters/presentParts";
import { presentWorkshopPage } from "../presenters/presentWorkshopPage";

const tag = "Catalogue";
const partsShown = 60;

type Row = Omit<WorkshopSummary, "countryName"> & { partCount: number; kinds: ListingKind[] | null };
const listSql = `
  SELECT w.id, w.slug, w.name, w.town, w.country, count(p.id)::integer AS "partCount",
    array_agg(DISTINCT p.kind) FILTER (WHERE p.kind IS NOT NULL) AS kinds
  FROM workshops w LEFT JOIN parts p ON p.workshop_id = w.id AND p.state = 'published'
  WHERE w.state = 'admitted' GROUP BY w.id ORDER BY w.name, w.id`;

export function workshopRoutes(): Endpoint[] {
  return [
    endpoint(
      {
        method: "get",
        path: "/workshops",
        summary: "Every workshop that sells here, with how many parts it offers and of which kinds.",
        tag,
        access: "anyone",
        answer: WorkshopList,
      },
      async () => {
        const rows = await select<Row>(listSql);
        return {
          items: rows.map(({ kinds, ...workshop }) => ({
            ...workshop,
            countryName: countryName(workshop.country),
            kinds: listingKinds.filter((kind) => kinds?.includes(kind)),
          })),
        };
      },
    ),
    endpoint(
      {
        method: "get",
        path: "/workshops/:slug",
        summary: "A workshop: who it is, what it asks for postage, and the first 60 of its parts.",
        tag,
        access: "anyone",
        params: SlugParams,
        answer: WorkshopPage,
      },
      async ({ params: { slug } }) => {
        const workshop = await Workshop.findOne({ where: { slug, state: "admitted" } });
        if (!workshop) throw new AppError("not-found", `No workshop is called “${slug}” here`);
        const workshopId = workshop.id;
        const [ids, rates, countries, registrations] = await Promise.all([
          Part.findAll({
            attributes: ["id"],
            where: { workshopId, state: "published" },
            order: ["kind", "title", "id"],
            limit: partsShown,
          }),
          ShippingRate.findAll({ where: { workshopId }, order: ["baseMinor", "zone"] }),
          ShippingCountry.findAll({ where: { workshopId }, order: ["country"] }),
          TaxRegistration.findAll({ where: { workshopId }, order: ["country"] }),
        ]);
        const summaries = await presentParts(ids.map(({ id }) => id));
        const parts = ids.flatMap(({ id }) => summaries.get(id) ?? []);
        return presentWorkshopPage(workshop, { rates, countries, registrations, parts });
      },
    ),
  ];
}
