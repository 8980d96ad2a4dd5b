import { countryName } from "#shared/domain/countries";
import { CountryList } from "#shared/schemas/catalogue";
import { select } from "../db/select";
import { type Endpoint, endpoint } from "../http/endpoint";

const sql = `
  SELECT DISTINCT c.country AS code
  FROM shipping_countries c JOIN workshops w ON w.id = c.workshop_id AND w.state = 'admitted'`;

export function countryRoutes(): Endpoint[] {
  return [
    endpoint(
      {
        method: "get",
        path: "/countries",
        summary: "Countries that at least one workshop sends to, by name.",
        tag: "Catalogue",
        access: "anyone",
        answer: CountryList,
      },
      async () => {
        const rows = await select<{ code: string }>(sql);
        const items = rows.map(({ code }) => ({ code, name: countryName(code) }));
        return { items: items.sort((a, b) => a.name.localeCompare(b.name, "en")) };
      },
    ),
  ];
}
