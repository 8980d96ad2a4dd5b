import { queryOptions } from "@tanstack/react-query";
import type { FamilyPage } from "#shared/schemas/catalogue";
import { api } from "../../lib/api";

export const familyQuery = (slug: string) =>
  queryOptions({
    queryKey: ["family", slug] as const,
    queryFn: ({ signal }) => api<FamilyPage>(`/families/${encodeURIComponent(slug)}`, { signal }),
  });
