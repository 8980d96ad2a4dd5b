import { infiniteQueryOptions, queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import type { ParcelStep } from "#shared/domain/parcelSteps";
import type {
  DispatchParcel,
  WorkshopParcel,
  WorkshopParcelList,
  WorkshopParcelQuery,
} from "#shared/schemas/workshopParcel";
import { api } from "../../lib/api";

const workshopParcelKeys = {
  all: ["workshop-parcels"] as const,
  lists: () => [...workshopParcelKeys.all, "list"] as const,
  list: (state: WorkshopParcelQuery["state"]) => [...workshopParcelKeys.lists(), state] as const,
  detail: (id: string) => [...workshopParcelKeys.all, "detail", id] as const,
};

/** The workshop's own parcels in a state, page by page. */
export const workshopParcelsQuery = (state: WorkshopParcelQuery["state"]) =>
  infiniteQueryOptions({
    queryKey: workshopParcelKeys.list(state),
    queryFn: ({ signal, pageParam }) => {
      const query = new URLSearchParams({ state, ...(pageParam ? { cursor: pageParam } : {}) });
      return api<WorkshopParcelList>(`/workshop/parcels?${query}`, { signal });
    },
    initialPageParam: null as string | null,
    getNextPageParam: (last) => last.nextCursor,
    staleTime: 10_000,
  });

export const workshopParcelQuery = (id: string) =>
  queryOptions({
    queryKey: workshopParcelKeys.detail(id),
    queryFn: ({ signal }) => api<WorkshopParcel>(`/workshop/parcels/${encodeURIComponent(id)}`, { signal }),
    staleTime: 0,
  });

/** Takes a parcel one step on. */
export function useParcelStep(id: string) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ step, details }: { step: ParcelStep; details?: DispatchParcel }) =>
      api<WorkshopParcel>(`/workshop/parcels/${encodeURIComponent(id)}/${step}`, { method: "POST", body: details }),
    onSuccess: async (parcel) => {
      queryClient.setQueryData(workshopParcelQuery(id).queryKey, parcel);
      await queryClient.invalidateQueries({ queryKey: workshopParcelKeys.lists() });
    },
    // Somebody else may have taken it on meanwhile: show what it is now.
    onError: () => queryClient.invalidateQueries({ queryKey: workshopParcelQuery(id).queryKey }),
  });
}
