/**
 * Slips of the finger between two words: letters left out, put in, changed, or two neighbours swapped.
 * Source: optimal string alignment distance (restricted Damerau-Levenshtein).
 */
export function editDistance(a: string, b: string): number {
  let before: number[] = [];
  let last = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      const changed = last[j - 1]! + (a[i - 1] === b[j - 1] ? 0 : 1);
      let least = Math.min(changed, last[j]! + 1, row[j - 1]! + 1);
      const swapped = i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1];
      if (swapped) least = Math.min(least, before[j - 2]! + 1);
      row.push(least);
    }
    before = last;
    last = row;
  }
  return last[b.length]!;
}

/** Slips forgiven in a word: none up to 4 letters, where every neighbour is another word; one from 5, two from 9. */
export const forgivenSlips = (word: string): number => (word.length >= 9 ? 2 : word.length >= 5 ? 1 : 0);

/** Whether `typed` may stand for `meant`. A slip in the first letter, which people seldom make, counts twice. */
export function mayStandFor(typed: string, meant: string): boolean {
  const slips = editDistance(typed, meant) + (typed[0] === meant[0] ? 0 : 1);
  return slips <= forgivenSlips(typed);
}
