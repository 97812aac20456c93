/**
 * The value that would stand at place `n` (0 for the smallest) if `values` were sorted. Reorders `values`: what stands before place n is
 * then no larger, what stands after it no smaller.
 *
 * Domain     no NaN; 0 ≤ n < values.length.
 * Method     Hoare's FIND with the middle of three as pivot: a few passes, where sorting millions takes seconds.
 * Reference  Hoare (1961), Algorithm 65: FIND, Comm. ACM 4(7).
 */
export function nthSmallest(values: Float64Array, n: number, end = values.length): number {
  let low = 0;
  let high = end - 1;
  while (low < high) {
    const pivot = middleOf(values[low], values[(low + high) >>> 1], values[high]);
    let i = low;
    let j = high;
    while (i <= j) {
      while (values[i] < pivot) i++;
      while (values[j] > pivot) j--;
      if (i <= j) {
        const held = values[i];
        values[i++] = values[j];
        values[j--] = held;
      }
    }
    if (n <= j) high = j;
    else if (n >= i) low = i;
    else break;
  }
  return values[n];
}

function middleOf(a: number, b: number, c: number): number {
  return Math.max(Math.min(a, b), Math.min(Math.max(a, b), c));
}
