import { queryOptions } from "@tanstack/react-query";
import type { PartPage } from "#shared/schemas/catalogue";
import { api } from "../../lib/api";

/** A part, and how it fits the need in these parameters. */
export const partQuery = (id: string, need: string) =>
  queryOptions({
    queryKey: ["part", id, need] as const,
    queryFn: ({ signal }) => api<PartPage>(`/parts/${encodeURIComponent(id)}?${need}`, { signal }),
  });
