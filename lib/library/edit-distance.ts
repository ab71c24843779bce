/** Optimal string alignment: insertions, deletions, changes and swaps of neighbours, each one edit. */
export function editDistance(from: string, to: string): number {
  let before: number[] = [];
  let above: number[] = Array.from({ length: to.length + 1 }, (_, index) => index);
  for (let i = 1; i <= from.length; i += 1) {
    const row = [i];
    for (let j = 1; j <= to.length; j += 1) {
      const change = from[i - 1] === to[j - 1] ? 0 : 1;
      let least = Math.min((above[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (above[j - 1] ?? 0) + change);
      if (i > 1 && j > 1 && from[i - 1] === to[j - 2] && from[i - 2] === to[j - 1]) {
        least = Math.min(least, (before[j - 2] ?? 0) + 1);
      }
      row.push(least);
    }
    before = above;
    above = row;
  }
  return above[to.length] ?? 0;
}
