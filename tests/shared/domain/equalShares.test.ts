import { describe, expect, it } from "vitest";
import { shareOut } from "#shared/domain/money";

describe("an amount shared equally", { timeout: 120_000 }, () => {
  // All nine million of them: a few seconds for each count of shares.
  it.each([2, 3, 4, 5, 6, 7, 8, 9, 10])("is whole again for every amount to a million: %d shares", (count) => {
    const equal = new Array<number>(count).fill(1);
    const wrong: number[] = [];
    for (let total = 0; total <= 1_000_000; total++) {
      const shares = shareOut(total, equal);
      let [sum, least, most] = [0, total, 0];
      for (const share of shares) {
        sum += share;
        least = Math.min(least, share);
        most = Math.max(most, share);
      }
      if (shares.length !== count || sum !== total || most - least > 1) wrong.push(total);
    }
    expect(wrong).toEqual([]);
  });
});
