import { infiniteQueryOptions, keepPreviousData } from "@tanstack/react-query";
import type { SearchAnswer } from "#shared/schemas/search";
import { api } from "../../lib/api";

export const searchKeys = {
  all: ["search"] as const,
  list: (params: string) => ["search", params] as const,
};

/** The parts for the need and filters in these parameters, page by page; what was shown stays until the next is there. */
export const searchQuery = (params: string) =>
  infiniteQueryOptions({
    queryKey: searchKeys.list(params),
    queryFn: ({ signal, pageParam }) =>
      api<SearchAnswer>(`/search?${params}${pageParam ? `&cursor=${encodeURIComponent(pageParam)}` : ""}`, { signal }),
    initialPageParam: null as string | null,
    getNextPageParam: (last) => last.nextCursor,
    placeholderData: keepPreviousData,
  });
