import { expect, it } from "vitest";
import { solveMilp } from "#server/plans/solveMilp";

const atLeast = (lower: number) => ({ columns: [0, 1], values: [2, 3], lower, upper: Infinity });

it("gives whole amounts of least cost", async () => {
  // 2 x + 3 y >= 7 at 3 and 4 each: two of each cost 14, x = 2 and y = 1 cost 10.
  expect(await solveMilp({ costs: [3, 4], uppers: [5, 5], rows: [atLeast(7)] }, 10)).toEqual([2, 1]);
  expect(await solveMilp({ costs: [], uppers: [], rows: [] }, 10)).toEqual([]);
});

it("gives nothing where no amounts will do", async () => {
  await expect(solveMilp({ costs: [1, 1], uppers: [1, 1], rows: [atLeast(6)] }, 10)).rejects.toThrow(
    expect.objectContaining({ name: "NotProved" }),
  );
});
