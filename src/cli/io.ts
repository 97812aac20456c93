/** The outside world of a command: what it writes to, what it may read. */
export interface Io {
  out(text: string): void;
  err(text: string): void;
  /** The bytes of a file, or of standard input for "-". */
  read(path: string): Promise<Uint8Array>;
  /** Writes a file, in place of one with the same name; with `only` "new" a file that is there already is left alone and ends the command. */
  write(path: string, bytes: Uint8Array, only?: "new"): Promise<void>;
}

/** What ends a command: a sentence for the user. Nothing was judged, so the exit code is 2. */
export class Stop extends Error {
  override readonly name = "Stop";
}

export interface Command {
  readonly name: string;
  /** What stands behind its name. */
  readonly usage: string;
  readonly summary: string;
  /** The whole help text below the usage. */
  readonly help: string;
  run(args: readonly string[], io: Io): Promise<number>;
}
