import { SearchAnswer, SearchQuery } from "#shared/schemas/search";
import { type Endpoint, endpoint } from "../http/endpoint";
import type { Services } from "../Services";
import { searchParts } from "../search/searchParts";

export function searchRoutes({ search }: Services): Endpoint[] {
  return [
    endpoint(
      {
        method: "get",
        path: "/search",
        summary: "Parts that fit what was measured, in order, with the reasons, the size rail and near misses.",
        tag: "Search",
        access: "anyone",
        query: SearchQuery,
        answer: SearchAnswer,
        limit: { name: "search", points: 120, perSeconds: 60 },
      },
      ({ query }) => searchParts(search, query),
    ),
  ];
}
