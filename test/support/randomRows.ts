import { readVectors, type VectorRow } from "./vectors";

const all = readVectors("random/distributions.json");

/** The random points of one function (see test/reference/random/distributions.py); there must be some. */
export function randomRows(name: string): VectorRow[] {
  const rows = all.filter(({ fn }) => fn === name);
  if (rows.length < 10) throw new Error(`only ${rows.length} random points for ${name}`);
  return rows;
}
