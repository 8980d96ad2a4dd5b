import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import type { WorkshopSettings, WorkshopSettingsPage } from "#shared/schemas/workshopSettings";
import { api } from "../../lib/api";
import { sessionQuery } from "../../lib/session";

/** The settings of the workshop that is signed in. Never fetched behind a form that is being filled in. */
export const settingsQuery = queryOptions({
  queryKey: ["workshop-settings"] as const,
  queryFn: ({ signal }) => api<WorkshopSettingsPage>("/workshop/settings", { signal }),
  staleTime: 0,
  gcTime: 0,
  refetchOnWindowFocus: false,
  refetchOnReconnect: false,
});

/** Keeps the settings; what was fetched of prices before is fetched anew. */
export function useSaveSettings() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (body: WorkshopSettings) => api<WorkshopSettingsPage>("/workshop/settings", { method: "PUT", body }),
    onSuccess: async () => {
      const own: readonly unknown[] = [sessionQuery.queryKey[0], settingsQuery.queryKey[0]];
      await queryClient.invalidateQueries({ predicate: ({ queryKey }) => !own.includes(queryKey[0]) });
    },
  });
}
