/** The name among `names` that takes the fewest letters to mend, if that is few enough for a slip of the finger or the memory. */
export function nearestName(wanted: string, names: Iterable<string>): string | undefined {
  const typed = wanted.toUpperCase();
  let best: string | undefined;
  let fewest = Math.max(2, Math.floor(typed.length * 0.6));
  for (const name of names) {
    if (Math.abs(name.length - typed.length) > fewest) continue;
    const distance = editDistance(typed, name.toUpperCase());
    if (distance < fewest || (distance === fewest && best === undefined)) {
      fewest = distance;
      best = name;
    }
  }
  return best;
}

/** Letters to insert, drop, change or swap with the next (Damerau 1964, adjacent swaps only). */
function editDistance(a: string, b: string): number {
  let before: number[] = [];
  let above = Array.from({ length: b.length + 1 }, (_, index) => index);
  for (let i = 1; i <= a.length; i++) {
    const line = [i];
    for (let j = 1; j <= b.length; j++) {
      const change = above[j - 1]! + (a[i - 1] === b[j - 1] ? 0 : 1);
      let least = Math.min(change, above[j]! + 1, line[j - 1]! + 1);
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1]) least = Math.min(least, before[j - 2]! + 1);
      line.push(least);
    }
    [before, above] = [above, line];
  }
  return above[b.length]!;
}
