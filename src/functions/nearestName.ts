/** The name among `names` that takes the fewest typing errors to become `typed`; undefined where all are far. */
export function nearestName(typed: string, names: readonly string[]): string | undefined {
  const wanted = typed.toUpperCase();
  let best: string | undefined;
  let least = Math.max(3, Math.ceil(wanted.length / 2));
  for (const name of names) {
    const errors = typingErrors(wanted, name.toUpperCase());
    if (errors < least) [least, best] = [errors, name];
  }
  return best;
}

/** Levenshtein's distance: letters put in, left out or exchanged. */
function typingErrors(a: string, b: string): number {
  let previous = Array.from({ length: b.length + 1 }, (_, i) => i);
  for (let i = 1; i <= a.length; i++) {
    const current = [i];
    for (let j = 1; j <= b.length; j++) {
      const changed = previous[j - 1]! + (a[i - 1] === b[j - 1] ? 0 : 1);
      current.push(Math.min(changed, previous[j]! + 1, current[j - 1]! + 1));
    }
    previous = current;
  }
  return previous[b.length]!;
}
