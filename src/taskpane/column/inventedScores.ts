import type { Port } from "../../hosts/port";
import { formatSheetName } from "../../sheet/address";

/** Invented: what a panel gave 48 applications for a garden plot, from 0 to 100 in halves, in the order in which they came. */
// prettier-ignore
const SCORES: readonly number[] = [
  59, 67.5, 59.5, 58.5, 52, 59.5, 74, 66.5, 73.5, 64.5, 66.5, 64,
  43.5, 71.5, 67.5, 67.5, 43.5, 43, 52, 57, 65.5, 61.5, 67.5, 55,
  65.5, 66.5, 54.5, 81, 68, 75, 55, 54, 58, 61, 69, 64.5,
  57, 51.5, 56.5, 75.5, 53, 64.5, 66.5, 45.5, 62.5, 76.5, 40, 58.5,
];

/** Puts invented scores on a sheet of their own and selects them: something to try the pane on where no scores are at hand. */
export async function putInventedScores(port: Port, sheetName: string, heading: string): Promise<void> {
  const sheet = formatSheetName(await port.addSheet(sheetName));
  await port.write(`${sheet}!A1`, [[heading], ...SCORES.map((score) => [score])]);
  await port.select(`${sheet}!A2:A${SCORES.length + 1}`);
}
