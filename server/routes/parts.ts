import { PartPage } from "#shared/schemas/catalogue";
import { IdParams } from "#shared/schemas/common";
import { NeedQuery } from "#shared/schemas/need";
import { type Endpoint, endpoint } from "../http/endpoint";
import { partPage } from "../search/partPage";

export function partRoutes(): Endpoint[] {
  return [
    endpoint(
      {
        method: "get",
        path: "/parts/:id",
        summary: "A part with its maker, its evidence, and how it fits what was measured.",
        tag: "Catalogue",
        access: "anyone",
        params: IdParams,
        query: NeedQuery,
        answer: PartPage,
      },
      ({ params, query }) => partPage(params.id, query),
    ),
  ];
}
