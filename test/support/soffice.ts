import { execFileSync } from "node:child_process";
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";

const PLACES = [
  "/usr/bin/soffice",
  "/usr/local/bin/soffice",
  "/opt/libreoffice/program/soffice",
  "/Applications/LibreOffice.app/Contents/MacOS/soffice",
];

/** Where LibreOffice is; undefined where it isn't, and then the tests that open files with it say so in their titles and are left out. */
export const soffice = PLACES.find((place) => existsSync(place));

/** Opens an .xlsx in LibreOffice and saves it by another filter: the files that came out, by name. It doesn't calculate anew. */
export function convert(bytes: Uint8Array, filter: string): Map<string, Buffer> {
  const folder = mkdtempSync(join(tmpdir(), "weirmark-office-"));
  try {
    writeFileSync(join(folder, "book.xlsx"), bytes);
    execFileSync(
      soffice!,
      [
        `-env:UserInstallation=file://${join(folder, "profile")}`,
        "--headless",
        "--convert-to",
        filter,
        "--outdir",
        join(folder, "out"),
        join(folder, "book.xlsx"),
      ],
      { stdio: "ignore", timeout: 90_000 },
    );
    const out = join(folder, "out");
    return new Map(readdirSync(out).map((name) => [name, readFileSync(join(out, name))]));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** Every sheet as comma-separated text with all digits, in UTF-8. */
export const CSV_OF_EVERY_SHEET = "csv:Text - txt - csv (StarCalc):44,34,76,1,,0,false,false,false,false,false,-1";
