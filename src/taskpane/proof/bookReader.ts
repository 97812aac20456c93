import type { OpenWorkbook, Port } from "../../hosts/port";
import { observable, type Observable } from "../observable";

/** Longer than this, and the whole workbook is read only when somebody asks for it. */
const SLOW_MS = 500;

/** So often a reading is begun anew because cells changed before it ended. */
const MOST_READINGS = 3;

export interface Reading {
  readonly book: OpenWorkbook;
  /** The count of changes that it takes in. */
  readonly upTo: number;
}

/** Reads the whole workbook, and knows whether the reading still holds. */
export interface BookReader {
  /** Reads it anew. */
  read(): Promise<Reading>;
  /** What was read last where no cell was told to have changed since, else what is read now. */
  current(): Promise<Reading>;
  /** True where reading took too long to be done unasked. */
  slow(): boolean;
  /** How often cells have changed. */
  readonly edits: Observable<number>;
  stop(): void;
}

export function bookReader(port: Port, now: () => number = () => performance.now()): BookReader {
  const edits = observable(0);
  let last: Reading | undefined;
  let took = 0;
  const stop = port.onChange((what) => {
    if (what === "cells") edits.set(edits.get() + 1);
  });
  const read = async (): Promise<Reading> => {
    const began = now();
    for (let readings = 1; ; readings++) {
      const upTo = edits.get();
      const book = await port.workbook();
      if (upTo !== edits.get() && readings < MOST_READINGS) continue;
      took = now() - began;
      return (last = { book, upTo });
    }
  };
  return {
    read,
    current: async () => (last?.upTo === edits.get() ? last : read()),
    slow: () => took > SLOW_MS && last?.upTo !== edits.get(),
    edits,
    stop,
  };
}
