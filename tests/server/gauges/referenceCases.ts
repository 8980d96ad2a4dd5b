import { expect } from "vitest";
import type { TestSite } from "#tests/support/testSite";
import { ask } from "./calls";

export type Tolerance = { abs?: number; rel?: number } | null;
export type Figures = Record<string, unknown>;
type Case = { id: string; inputs: Figures; expected: Figures; tolerance: Tolerance };

/** The cases of a topic whose ids begin so, for a table of tests. */
export const casesOf = (list: readonly object[], ...ids: string[]) =>
  (list as readonly Case[])
    .filter(({ id }) => ids.some((start) => id.startsWith(start)))
    .map((one) => [one.id, one] as const);

/** Within the tolerance stated; twelve digits are printed. */
export function expectNear(got: number | undefined, wanted: unknown, tolerance: Tolerance, what = "") {
  const value = Number(wanted);
  const allowed = (tolerance?.abs ?? (tolerance?.rel ?? 0) * Math.abs(value)) + 1e-12;
  expect(Math.abs((got ?? Number.NaN) - value), `${what} ${got} against ${value}`).toBeLessThanOrEqual(allowed);
}

/** The answer of a call that must not refuse. */
export async function answered<T>(site: TestSite, name: string, body: object): Promise<T> {
  const res = await ask(site, name, body);
  expect(res.status, JSON.stringify(res.body)).toBe(200);
  return res.body;
}
