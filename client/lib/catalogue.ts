import { queryOptions } from "@tanstack/react-query";
import type { z } from "zod";
import type { CountryList, FamilyList } from "#shared/schemas/catalogue";
import { api } from "./api";

const hours = 60 * 60_000;

/** Every mechanism family, by name. */
export const familiesQuery = queryOptions({
  queryKey: ["families"] as const,
  queryFn: ({ signal }) => api<z.infer<typeof FamilyList>>("/families", { signal }),
  staleTime: hours,
});

/** The countries that at least one workshop posts to. */
export const countriesQuery = queryOptions({
  queryKey: ["countries"] as const,
  queryFn: ({ signal }) => api<z.infer<typeof CountryList>>("/countries", { signal }),
  staleTime: 24 * hours,
});
