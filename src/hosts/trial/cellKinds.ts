/**
 * The engine's numbers for kinds of values. Written out, since its own list of them would bring the whole engine into every background that
 * reads or writes a workbook.
 */
export const CELL_KIND = { text: 1, number: 2, flag: 3, forcedText: 4 } as const;
