/**
 * Number of single-character edits (insert, delete, replace, swap of neighbours) between two words.
 *
 * @param a     first word
 * @param b     second word
 * @returns     optimal string alignment distance
 * @source      Damerau 1964, Levenshtein 1966, optimal string alignment form
 */
function editDistance(a: string, b: string): number {
  const rows: number[][] = [Array.from({ length: b.length + 1 }, (_, j) => j)];
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      const above = rows[i - 1] as number[];
      let least = Math.min((above[j] as number) + 1, (row[j - 1] as number) + 1, (above[j - 1] as number) + (a[i - 1] === b[j - 1] ? 0 : 1));
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1]) least = Math.min(least, ((rows[i - 2] as number[])[j - 2] as number) + 1);
      row.push(least);
    }
    rows.push(row);
  }
  return (rows[a.length] as number[])[b.length] as number;
}

/**
 * The valid name a misspelt one most likely meant, at most two edits away, one in words of up to five letters.
 *
 * @param name   what was written
 * @param valid  the names that exist
 * @returns      the nearest of them, or undefined where none is near
 */
export function nearestName(name: string, valid: readonly string[]): string | undefined {
  const low = name.slice(0, 200).toLowerCase();
  let best: string | undefined;
  const most = low.length > 5 ? 2 : 1;
  let least = Number.POSITIVE_INFINITY;
  for (const candidate of valid) {
    if (Math.abs(candidate.length - low.length) > 2) continue;
    const distance = editDistance(low, candidate.toLowerCase());
    // Of names equally far the one with the same beginning and length: a letter mistyped is likelier than one lost.
    const rank = distance + (candidate[0]?.toLowerCase() === low[0] ? 0 : 0.2) + (candidate.length === low.length ? 0 : 0.1);
    if (distance <= most && rank < least && distance < Math.max(low.length, candidate.length)) {
      least = rank;
      best = candidate;
    }
  }
  return best;
}
