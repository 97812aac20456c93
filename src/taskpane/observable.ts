/** A value that parts of the pane share: whoever asked is told of each change, at once and in the order of asking. */
export interface Observable<T> {
  get(): T;
  set(value: T): void;
  /** Calls the listener now and after every change; returns the way to stop. */
  watch(listener: (value: T) => void): () => void;
}

export function observable<T>(first: T): Observable<T> {
  let current = first;
  const listeners = new Set<(value: T) => void>();
  return {
    get: () => current,
    set(value) {
      if (Object.is(value, current)) return;
      current = value;
      for (const listener of [...listeners]) listener(value);
    },
    watch(listener) {
      listeners.add(listener);
      listener(current);
      return () => listeners.delete(listener);
    },
  };
}
