import { execFileSync } from "node:child_process";
import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { readXlsx } from "../../src/hosts/file/readXlsx";
import type { Workbook } from "../../src/sheet/workbook";
import { soffice } from "./soffice";

/** Without LibreOffice these tests say so and are left out; where the build is checked for good they fail instead. */
export const withoutOffice = soffice === undefined && process.env["CI"] !== "true";
if (withoutOffice) console.warn("The tests in LibreOffice are skipped: this machine has none.");

/** A profile of its own in which every file is calculated anew when it is opened: 0 is "always". */
const ALWAYS_RECALCULATE = `<?xml version="1.0" encoding="UTF-8"?>
<oor:items xmlns:oor="http://openoffice.org/2001/registry" xmlns:xs="http://www.w3.org/2001/XMLSchema" xmlns:xsi="http://www.w3.org/2001/XMLSchema-instance">
<item oor:path="/org.openoffice.Office.Calc/Formula/Load"><prop oor:name="OOXMLRecalcMode" oor:op="fuse"><value>0</value></prop></item>
</oor:items>`;

/** The files (.xlsx by name, without its ending) as LibreOffice holds them after it has calculated every formula anew: one run for all. */
export function recalculated(files: Readonly<Record<string, Uint8Array>>): Record<string, Workbook> {
  if (soffice === undefined) throw new Error("LibreOffice is not installed: its tests can't run.");
  const folder = mkdtempSync(join(tmpdir(), "weirmark-office-"));
  try {
    mkdirSync(join(folder, "profile/user"), { recursive: true });
    writeFileSync(join(folder, "profile/user/registrymodifications.xcu"), ALWAYS_RECALCULATE);
    const names = Object.keys(files);
    for (const name of names) writeFileSync(join(folder, `${name}.xlsx`), files[name]!);
    const sources = names.map((name) => join(folder, `${name}.xlsx`));
    const profile = `-env:UserInstallation=file://${join(folder, "profile")}`;
    const convert = ["--headless", "--convert-to", "xlsx", "--outdir", join(folder, "out")];
    execFileSync(soffice, [profile, ...convert, ...sources], { stdio: "ignore", timeout: 90_000 });
    return Object.fromEntries(names.map((name) => [name, readXlsx(readFileSync(join(folder, "out", `${name}.xlsx`)))]));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
