/**
 * Whether each entry's values reach all the minimums: at or above each; a minimum of NaN asks for nothing.
 *
 * Domain     values row by row, one row an entry, as many to a row as there are minimums.
 * Edges      an entry of NaN meets nothing that is asked for.
 */
export function minimumsMet(values: Float64Array, minimums: Float64Array): boolean[] {
  const columns = minimums.length;
  return Array.from({ length: values.length / columns }, (_, entry) =>
    minimums.every((minimum, j) => Number.isNaN(minimum) || values[entry * columns + j] >= minimum),
  );
}
