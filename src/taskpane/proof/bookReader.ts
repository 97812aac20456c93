import type { OpenWorkbook, Port } from "../../hosts/port";
import { observable, type Observable } from "../observable";

/** Longer than this, and the whole workbook is read only when somebody asks for it. */
const SLOW_MS = 500;

/** Reads the whole workbook, and knows whether the reading still holds. */
export interface BookReader {
  /** Reads it anew. */
  read(): Promise<OpenWorkbook>;
  /** What was read last where no cell was told to have changed since, else what is read now. */
  current(): Promise<OpenWorkbook>;
  /** True where reading took too long to be done unasked. */
  slow(): boolean;
  /** How often cells have changed. */
  readonly edits: Observable<number>;
  stop(): void;
}

export function bookReader(port: Port, now: () => number = () => performance.now()): BookReader {
  const edits = observable(0);
  let last: { readonly book: Promise<OpenWorkbook>; readonly upTo: number } | undefined;
  let took = 0;
  const stop = port.onChange((what) => {
    if (what === "cells") edits.set(edits.get() + 1);
  });
  const read = (): Promise<OpenWorkbook> => {
    const began = now();
    const upTo = edits.get();
    const book = port.workbook();
    const mine = (last = { book, upTo });
    book.then(
      () => (took = now() - began),
      // What could not be read is not kept.
      () => last === mine && (last = undefined),
    );
    return book;
  };
  return {
    read,
    current: () => (last !== undefined && last.upTo === edits.get() ? last.book : read()),
    slow: () => took > SLOW_MS && last?.upTo !== edits.get(),
    edits,
    stop,
  };
}
