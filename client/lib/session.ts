import { queryOptions, useQuery } from "@tanstack/react-query";
import type { SessionUser } from "#shared/schemas/session";
import { fetchSession } from "./api";

export const sessionQuery = queryOptions({
  queryKey: ["session"] as const,
  queryFn: ({ signal }) => fetchSession(signal),
  staleTime: 5 * 60_000,
});

/** Who is signed in: undefined while it is not known yet, null for nobody. */
export function useSessionUser(): (SessionUser & { emailVerified: boolean }) | null | undefined {
  const { data, isError } = useQuery(sessionQuery);
  return isError && !data ? null : data?.user;
}
