import { useSyncExternalStore } from "react";
import type { SizeUnit } from "./formatSize";

const listeners = new Set<() => void>();
const subscribe = (listener: () => void) => {
  listeners.add(listener);
  return () => {
    listeners.delete(listener);
  };
};

function read(key: string): string | null {
  try {
    return localStorage.getItem(key);
  } catch {
    return null;
  }
}

function keep(key: string, value: string): void {
  try {
    if (localStorage.getItem(key) === value) return;
    localStorage.setItem(key, value);
  } catch {
    // No storage: the address bar still carries it.
  }
  for (const listener of listeners) listener();
}

const shipToKey = "idlewright-ship-to";
const unitKey = "idlewright-unit";
export const defaultCountry = "DE";

/** Where parcels go, as last chosen: an ISO 3166-1 alpha-2 code. */
export function storedShipTo(): string {
  const stored = read(shipToKey);
  return stored && /^[A-Z]{2}$/.test(stored) ? stored : defaultCountry;
}
export const keepShipTo = (country: string): void => keep(shipToKey, country);
export const useShipTo = (): string => useSyncExternalStore(subscribe, storedShipTo);

/** The unit that sizes are shown in first, as last chosen. */
export const storedUnit = (): SizeUnit => (read(unitKey) === "in" ? "in" : "mm");
export const keepUnit = (unit: SizeUnit): void => keep(unitKey, unit);
export const useUnit = (): SizeUnit => useSyncExternalStore(subscribe, storedUnit);
