/** A row of a model: lower <= sum of values x columns <= upper. */
export type Row = { columns: readonly number[]; values: readonly number[]; lower: number; upper: number };

/** Minimise costs x columns, every column a whole number from 0 to its upper end, every coefficient whole. */
export type Milp = { costs: readonly number[]; uppers: readonly number[]; rows: readonly Row[] };

/** The value of a row or an objective, exact in whole numbers up to 2^53. */
export const sumOf = ({ columns, values }: Pick<Row, "columns" | "values">, amounts: readonly number[]): number =>
  columns.reduce((sum, column, i) => sum + (values[i] ?? 0) * (amounts[column] ?? 0), 0);

/** A row of what is not 0 in a list of coefficients, one for each column. */
export function rowOf(coefficients: readonly number[], lower: number, upper: number): Row {
  const columns = coefficients.flatMap((value, column) => (value === 0 ? [] : [column]));
  return { columns, values: columns.map((column) => coefficients[column] ?? 0), lower, upper };
}
