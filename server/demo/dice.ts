import { createHash } from "node:crypto";

/**
 * Chance that is the same each time: a number in [0, 1) made from a name. Two names give unrelated numbers, so adding
 * to the demo data leaves the rest as it was.
 */
export function dice(...name: (string | number)[]): number {
  return createHash("sha256").update(name.join("/")).digest().readUInt32BE(0) / 2 ** 32;
}

export function pick<T>(from: readonly T[], ...name: (string | number)[]): T {
  const chosen = from[Math.floor(dice(...name) * from.length)];
  if (chosen === undefined) throw new Error("nothing to pick from");
  return chosen;
}

/** A value between the two, on a grid of `step`. */
export function between(low: number, high: number, step: number, ...name: (string | number)[]): number {
  const steps = Math.round((high - low) / step);
  return Number((low + Math.floor(dice(...name) * (steps + 1)) * step).toFixed(6));
}

/** A UUID made from a name (version 8, RFC 9562: contents of our own choosing). */
export function idOf(...name: (string | number)[]): string {
  const bytes = createHash("sha256")
    .update(`idlewright/${name.join("/")}`)
    .digest()
    .subarray(0, 16);
  bytes[6] = ((bytes[6] ?? 0) & 0x0f) | 0x80;
  bytes[8] = ((bytes[8] ?? 0) & 0x3f) | 0x80;
  const hex = bytes.toString("hex");
  return [hex.slice(0, 8), hex.slice(8, 12), hex.slice(12, 16), hex.slice(16, 20), hex.slice(20)].join("-");
}
