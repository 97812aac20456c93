export interface Failure {
  readonly error: string;
  readonly message: string;
}

/** The last message of each cell in which a call failed: an error value alone doesn't say what was wrong. */
export interface MessageBook {
  keep(sheetId: string, row: number, column: number, failure: Failure): void;
  /** Undefined also where the cell shows another error than the call gave: the engine computes both branches of an IF. */
  messageAt(sheetId: string, row: number, column: number, error: string): string | undefined;
  /** A calculation begins. */
  startRound(): void;
  /** A cell was calculated in this round: what was kept of it before no longer holds. */
  settle(sheetId: string, row: number, column: number): void;
}

export function messageBook(): MessageBook {
  const kept = new Map<string, Failure & { round: number }>();
  let current = 0;
  const key = (sheetId: string, row: number, column: number) => `${sheetId} ${row} ${column}`;
  return {
    keep: (sheetId, row, column, failure) => void kept.set(key(sheetId, row, column), { ...failure, round: current }),
    messageAt(sheetId, row, column, error) {
      const failure = kept.get(key(sheetId, row, column));
      return failure?.error === error ? failure.message : undefined;
    },
    startRound: () => void current++,
    settle(sheetId, row, column) {
      const at = key(sheetId, row, column);
      if ((kept.get(at)?.round ?? current) < current) kept.delete(at);
    },
  };
}
