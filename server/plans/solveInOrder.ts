import { type Milp, rowOf, sumOf } from "./Milp";
import { solveMilp } from "./solveMilp";

/** What is to be small: whole costs of at least 0, and the most that it can be in the best amounts of all. */
export type Objective = { costs: readonly number[]; most: number };

/** Coefficients up to this keep well inside the digits and tolerances of the solver. */
const largestCost = 1e8;

/** Two objectives as one, in which a step of the first outweighs all of the second. */
const merged = (first: Objective, second: Objective): Objective => ({
  costs: first.costs.map((cost, i) => cost * (second.most + 1) + (second.costs[i] ?? 0)),
  most: first.most * (second.most + 1) + second.most,
});

/**
 * Amounts for which the first objective is least, then the second among those, and so on: exact, by whole weights where
 * the numbers stay small, else by one solution after the other with the earlier value held.
 * Errors: NotProved.
 */
export async function solveInOrder(
  { uppers, rows }: Omit<Milp, "costs">,
  [first, ...later]: readonly Objective[],
  seconds: () => number,
): Promise<number[]> {
  if (!first) return uppers.map(() => 0);
  const all = later.reduce(merged, first);
  if (later.length === 0 || Math.max(...all.costs) <= largestCost) {
    return solveMilp({ costs: all.costs, uppers, rows }, seconds());
  }
  const amounts = await solveMilp({ costs: first.costs, uppers, rows }, seconds());
  const least = sumOf(rowOf(first.costs, 0, 0), amounts);
  return solveInOrder({ uppers, rows: [...rows, rowOf(first.costs, 0, least)] }, later, seconds);
}
