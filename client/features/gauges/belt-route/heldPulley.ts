import { useSyncExternalStore } from "react";
import type { NamedPulley } from "./beltState";

/** The pulley that is being dragged, as it lies in this frame; told to the few things that follow it. */
export type HeldPulley = {
  get: () => NamedPulley | null;
  set: (pulley: NamedPulley | null) => void;
  subscribe: (follow: () => void) => () => void;
};

export function createHeldPulley(): HeldPulley {
  let held: NamedPulley | null = null;
  const followers = new Set<() => void>();
  return {
    get: () => held,
    set: (pulley) => {
      held = pulley;
      for (const follow of followers) follow();
    },
    subscribe: (follow) => {
      followers.add(follow);
      return () => followers.delete(follow);
    },
  };
}

export const useHeldPulley = (held: HeldPulley): NamedPulley | null => useSyncExternalStore(held.subscribe, held.get);

/** The pulley, or what it has become under the finger. */
export const useFollowed = (held: HeldPulley, pulley: NamedPulley): NamedPulley =>
  useSyncExternalStore(held.subscribe, () => {
    const now = held.get();
    return now?.id === pulley.id ? now : pulley;
  });
