import type { NamedPulley } from "./beltState";

/** The pulley that is being dragged, as it lies in this frame; told to what follows it. */
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
