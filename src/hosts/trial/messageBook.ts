/** The last message of each cell in which a call failed: an error value alone doesn't say what was wrong. */
export interface MessageBook {
  keep(sheetId: string, row: number, column: number, message: string): void;
  messageAt(sheetId: string, row: number, column: number): string | undefined;
}

export function messageBook(): MessageBook {
  const kept = new Map<string, string>();
  const key = (sheetId: string, row: number, column: number) => `${sheetId} ${row} ${column}`;
  return {
    keep: (sheetId, row, column, message) => void kept.set(key(sheetId, row, column), message),
    messageAt: (sheetId, row, column) => kept.get(key(sheetId, row, column)),
  };
}
