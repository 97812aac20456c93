/** P(N ≥ count) for a Poisson number with this mean, by adding the chances up: slow, and free of the special functions. */
export function poissonUpperTail(count: number, mean: number): number {
  let term = Math.exp(-mean);
  let below = 0;
  for (let k = 0; k < count; k++) {
    below += term;
    term *= mean / (k + 1);
  }
  let above = 0;
  for (let k = count; term > 1e-18 * above; k++) {
    above += term;
    term *= mean / (k + 1);
  }
  return below < 0.5 ? 1 - below : above;
}
