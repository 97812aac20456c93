import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { buildSync } from "esbuild";
import { describe, expect, test } from "vitest";
import { strFromU8, unzipSync } from "fflate";
import { run } from "../../src/cli/run";
import { readXlsx } from "../../src/hosts/file/readXlsx";
import { escapeXml } from "../../src/hosts/file/write/xmlText";
import { HOSTILE_FILES } from "../support/hostileFiles";
import { numberRows, xlsxFile } from "../support/xlsxFile";
import { parseXml } from "../support/xml";

/** Seconds that any command may take for any of these files, on a busy machine. */
const MOST_SECONDS = 10;

async function weirmark(bytes: Uint8Array, ...args: string[]) {
  let out = "";
  let err = "";
  const written: Uint8Array[] = [];
  const start = performance.now();
  const code = await run(args, {
    out: (text) => void (out += text),
    err: (text) => void (err += text),
    read: async () => bytes,
    write: async (_, written_) => void written.push(written_),
  });
  return { code, out, err, written, seconds: (performance.now() - start) / 1000 };
}

const commands: readonly (readonly string[])[] = [
  ["audit", "book.xlsx", "--json"],
  ["handover", "book.xlsx", "-o", "copy.xlsx"],
  ["calc", "book.xlsx", "=SUM(A1:A3)"],
];

describe.each(HOSTILE_FILES)("a file with $name", ({ make, refusal, copyRefusal, verdict }) => {
  const bytes = make();

  test.each(commands)("%s ends with a sentence, in time", async (...args) => {
    const { code, out, err, seconds } = await weirmark(bytes, ...args);
    expect(seconds).toBeLessThan(MOST_SECONDS);
    const refused = args[0] === "handover" ? (refusal ?? copyRefusal) : refusal;
    if (refused) {
      expect(code).toBe(2);
      expect(err).toMatch(refused);
      expect(out).toBe("");
    } else expect(err).toBe("");
    if (verdict && args[0] === "audit") expect(JSON.parse(out.split("\n")[0]!).why).toMatch(verdict);
  });
});

test("a copy writes what comes out of the file as text: in its list, its notes and the names of its sheets", async () => {
  const evil = `=HYPERLINK("http://x","<script>alert(1)</script>")`;
  const call = `IF(TRUE,A2,_xldudf_WEIR_CUTOFF_LIMITS(B2:B4,0.1,,,,"<!--"))`;
  const rows = `${numberRows("B", 3, [1, 2])}<row r="5"><c r="A5" t="inlineStr"><is><t>${escapeXml(evil)}</t></is></c><c r="D5" t="str"><f>${escapeXml(call.replace("A2", "A5"))}</f><v>${escapeXml(evil)}</v></c></row>`;
  const { written } = await weirmark(
    xlsxFile({ sheets: [{ name: "&lt;b&gt;=&quot;", rows }] }),
    "handover",
    "book.xlsx",
    "-o",
    "copy.xlsx",
  );
  for (const [part, bytes] of Object.entries(unzipSync(written[0]!))) {
    expect(() => parseXml(strFromU8(bytes)), part).not.toThrow();
    expect(strFromU8(bytes), part).not.toContain("<script");
  }
  const copy = readXlsx(written[0]!);
  expect(copy.sheets.map(({ name }) => name)).toEqual([`<b>="`, "Hand-over"]);
  expect(copy.sheets[1]!.formulas.size).toBe(0);
  expect(copy.sheets[1]!.cell(1, 5)).toBe(evil);
});

test("many cells that each read two ranges of nine million cells take no more memory than one", () => {
  const cells = Array.from({ length: 12 }, (_, i) => {
    const sum = [1, 2].map((j) => `_xldudf_WEIR_TOP_FRACTION_CUTOFF(A1:I${999_000 + 2 * i + j},0.1)`).join("+");
    return `<row r="${i + 4}"><c r="D${i + 4}"><f>${sum}</f><v>1</v></c></row>`;
  });
  const folder = mkdtempSync(join(tmpdir(), "weirmark-hostile-"));
  try {
    const [program, book] = ["weirmark.cjs", "book.xlsx"].map((name) => join(folder, name));
    const entry = join(__dirname, "../../src/cli/weirmark.ts");
    buildSync({
      entryPoints: [entry],
      outfile: program,
      bundle: true,
      platform: "node",
      format: "cjs",
      target: "node20",
    });
    writeFileSync(book!, xlsxFile({ sheets: [{ name: "A", rows: numberRows("A", 1, [1, 2, 4]) + cells.join("") }] }));
    const { status, stdout } = spawnSync("node", ["--max-old-space-size=400", program!, "audit", book!], {
      encoding: "utf8",
      timeout: 60_000,
    });
    expect(status).toBe(0);
    expect(stdout).toMatch(/^12 calls: 0 agree, 0 differ, 12 are not checkable/);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
});
