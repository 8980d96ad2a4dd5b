import loadHighs from "highs";
import { type Milp, rowOf, sumOf } from "./Milp";
import { NotProved } from "./NotProved";

const loaded = loadHighs();

/** Compressed sparse rows, as the solver takes them. */
function sparse({ rows, costs }: Milp) {
  const starts = [0];
  for (const { columns } of rows) starts.push((starts.at(-1) ?? 0) + columns.length);
  return {
    format: "csr" as const,
    numRows: rows.length,
    numCols: costs.length,
    starts,
    indices: rows.flatMap(({ columns }) => columns),
    values: rows.flatMap(({ values }) => values),
  };
}

function holds({ rows, uppers }: Milp, amounts: readonly number[]): boolean {
  return (
    amounts.every((amount, i) => amount >= 0 && amount <= (uppers[i] ?? 0)) &&
    rows.every((row) => {
      const sum = sumOf(row, amounts);
      return row.lower <= sum && sum <= row.upper;
    })
  );
}

/**
 * Whole amounts of least cost, proved so, by branch and cut (HiGHS). The same model always gives the same amounts.
 *
 * Proof:  the solver works in floating point. Its amounts are rounded and every row is held again in whole numbers; its
 *         bound from below must lie less than 1 under their cost, so that no cheaper whole cost is left.
 * Errors: NotProved where any of that fails, the time is over, or no amounts satisfy the rows.
 */
export async function solveMilp(model: Milp, seconds: number): Promise<number[]> {
  const { costs, uppers, rows } = model;
  if (costs.length === 0) return [];
  const highs = await loaded;
  const { status, values, bound } = highs.withModel(
    {
      numCols: costs.length,
      numRows: rows.length,
      colCost: [...costs],
      colLower: costs.map(() => 0),
      colUpper: [...uppers],
      rowLower: rows.map(({ lower }) => lower),
      rowUpper: rows.map(({ upper }) => upper),
      integrality: costs.map(() => highs.constants.variableType.integer),
      matrix: sparse(model),
    },
    (solver) => {
      solver.options.set({ output_flag: false, time_limit: seconds, mip_rel_gap: 0, mip_abs_gap: 0.5, random_seed: 0 });
      solver.run();
      return {
        status: solver.getModelStatus(),
        values: Array.from(solver.getSolution().colValue ?? []),
        bound: Number(solver.info.get("mip_dual_bound")),
      };
    },
  );
  const amounts = values.map(Math.round);
  const cost = sumOf(rowOf(costs, 0, 0), amounts);
  const proved = status === highs.constants.modelStatus.optimal && holds(model, amounts) && cost - bound < 0.9;
  if (!proved) throw new NotProved(`status ${status}, cost ${cost}, bound ${bound}`);
  return amounts;
}
