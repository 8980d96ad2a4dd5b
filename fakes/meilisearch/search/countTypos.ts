/**
 * How many typing errors lie between a query word and a word of a document, or null for more than `most`.
 *
 * An error is one letter too many, too few or wrong, or two neighbours swapped. A different first letter costs one
 * more. With `prefix` the document's word may go on after the query word.
 * Source: Meilisearch documentation, "Typo tolerance calculations" and "Typo tolerance settings" (first letter),
 * "Typo tolerance vs fuzzy search" (swapped neighbours count once). Distance: optimal string alignment.
 */
export function countTypos(query: string, word: string, most: number, prefix: boolean): number | null {
  if (prefix ? word.startsWith(query) : word === query) return 0;
  if (most === 0) return null;
  if (!prefix && Math.abs(query.length - word.length) > most) return null;

  const distance = alignmentDistance([...query], [...word].slice(0, query.length + most), prefix);
  const typos = query[0] === word[0] ? distance : distance + 1;
  return typos <= most ? typos : null;
}

function alignmentDistance(a: string[], b: string[], prefix: boolean): number {
  let beforeLast: number[] = [];
  let last = b.map((_, j) => j).concat(b.length);
  for (const [i, letter] of a.entries()) {
    const row = [i + 1];
    for (const [j, other] of b.entries()) {
      const same = letter === other ? 0 : 1;
      let best = Math.min(last[j]! + same, last[j + 1]! + 1, row[j]! + 1);
      const swapped = i > 0 && j > 0 && letter === b[j - 1] && other === a[i - 1];
      if (swapped) best = Math.min(best, beforeLast[j - 1]! + 1);
      row.push(best);
    }
    beforeLast = last;
    last = row;
  }
  return prefix ? Math.min(...last) : last[b.length]!;
}
