/**
 * The candidate that differs from a word by the fewest slips of the pen: a letter left out, added or changed, or two
 * neighbours swapped. Case does not count.
 *
 * @param word what was written
 * @param candidates what would have been accepted
 * @param part the part of the word that may change
 * @returns the first candidate with the smallest distance, or `undefined` where more than this part of the
 * word (at least one letter) would have to change
 * @source optimal string alignment distance: F. J. Damerau, Communications of the ACM 7 (1964) 171
 * @example
 * nearest('tempreature', ['temperature', 'pressure']) // => 'temperature'
 */
export function nearest(word: string, candidates: readonly string[], part = 1 / 3): string | undefined {
  const written = word.trim().toLowerCase();
  let best: string | undefined;
  let least = Math.max(1, Math.floor(written.length * part)) + 1;
  for (const candidate of candidates) {
    if (Math.abs(candidate.length - written.length) >= least) continue;
    const slips = slipsBetween(written, candidate.toLowerCase());
    if (slips < least && slips < candidate.length) {
      least = slips;
      best = candidate;
    }
  }
  return best;
}

function slipsBetween(a: string, b: string): number {
  let before: number[] = [];
  let above = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      const same = a[i - 1] === b[j - 1] ? 0 : 1;
      let slips = Math.min((above[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (above[j - 1] ?? 0) + same);
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1]) {
        slips = Math.min(slips, (before[j - 2] ?? 0) + 1);
      }
      row.push(slips);
    }
    before = above;
    above = row;
  }
  return above[b.length] ?? 0;
}
