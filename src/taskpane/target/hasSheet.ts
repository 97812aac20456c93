import type { Port } from "../../hosts/port";

/** Whether the workbook has a sheet of that name, in any case. */
export async function hasSheet(port: Port, wanted: string): Promise<boolean> {
  return (await port.sheetNames()).some((name) => name.toLowerCase() === wanted.toLowerCase());
}
