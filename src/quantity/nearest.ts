/** Longer words are taken for something other than a slip of the pen. */
const LONGEST = 60;

/** Slips forgiven: one in a short word, one more for every three letters. */
function slipsAllowed(word: string): number {
  return Math.min(Math.max(1, Math.floor(word.length / 3)), word.length - 1);
}

/**
 * The known word that was most likely meant, or null where none is near. Letters left out, put in, changed or swapped
 * with their neighbour count one slip each; words that differ only in case are nearest of all. Of equals the first.
 */
export function nearest(word: string, known: readonly string[]): string | null {
  if (word.length > LONGEST) return null;
  const folded = word.toLowerCase();
  const allowed = slipsAllowed(word);
  let best: { readonly word: string; readonly rank: number } | null = null;
  for (const candidate of known) {
    const rank = rankOf(word, folded, candidate, allowed);
    if (rank !== null && (best === null || rank < best.rank)) best = { word: candidate, rank };
  }
  return best?.word ?? null;
}

/** Slips apart from case count whole, those of case a hundredth each; null where too many. */
function rankOf(word: string, folded: string, candidate: string, allowed: number): number | null {
  if (Math.abs(candidate.length - word.length) > allowed) return null;
  const lower = candidate.toLowerCase();
  const slips = lower === folded ? 0 : editDistance(folded, lower);
  return slips > Math.max(allowed, 0) ? null : slips + editDistance(word, candidate) / 100;
}

/**
 * Optimal string alignment distance: the restricted Damerau–Levenshtein distance, each stretch edited once
 * (F. J. Damerau, Communications of the ACM 7 (1964) 171–176; from memory).
 */
export function editDistance(a: string, b: string): number {
  let before: number[] = [];
  let last = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i += 1) {
    const row = [i];
    for (let j = 1; j <= b.length; j += 1) {
      const same = a[i - 1] === b[j - 1] ? 0 : 1;
      let cost = Math.min((last[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (last[j - 1] ?? 0) + same);
      const swapped = i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1];
      if (swapped) cost = Math.min(cost, (before[j - 2] ?? 0) + 1);
      row.push(cost);
    }
    before = last;
    last = row;
  }
  return last[b.length] ?? 0;
}
