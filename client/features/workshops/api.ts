import { queryOptions } from "@tanstack/react-query";
import type { z } from "zod";
import type { WorkshopList, WorkshopPage } from "#shared/schemas/catalogue";
import { api } from "../../lib/api";

export const workshopsQuery = queryOptions({
  queryKey: ["workshops"] as const,
  queryFn: ({ signal }) => api<z.infer<typeof WorkshopList>>("/workshops", { signal }),
});

export const workshopQuery = (slug: string) =>
  queryOptions({
    queryKey: ["workshop", slug] as const,
    queryFn: ({ signal }) => api<WorkshopPage>(`/workshops/${encodeURIComponent(slug)}`, { signal }),
  });
