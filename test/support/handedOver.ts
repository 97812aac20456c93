import { run } from "../../src/cli/run";

/** The copy that `weirmark handover` makes of a workbook, and what it says of each call. */
export async function handedOver(bytes: Uint8Array): Promise<{
  copy: Uint8Array;
  calls: { sheet: string; cell: string; formula: string; becomes: string; now: unknown; note: string }[];
}> {
  let out = "";
  let copy: Uint8Array | undefined;
  const code = await run(["handover", "book.xlsx", "-o", "copy.xlsx", "--json"], {
    out: (text) => (out += text),
    err: (text) => (out += text),
    read: async () => bytes,
    write: async (_, written) => void (copy = written),
  });
  if (code !== 0 || !copy) throw new Error(out);
  const calls = out
    .trimEnd()
    .split("\n")
    .filter(Boolean)
    .map((line) => JSON.parse(line));
  return { copy, calls };
}
