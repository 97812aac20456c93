import type { IWorkbookData } from "@univerjs/core";

const DATABASE = "weirmark-trial";
const STORE = "books";
const KEY = "book";
/** The workbook that an opened file has replaced, until the sheet has shown the new one. */
const BEFORE = "before";
const INVENTED = "the invented workbook";

function transaction<Result>(
  mode: IDBTransactionMode,
  ask: (store: IDBObjectStore) => IDBRequest<Result>,
): Promise<Result> {
  return new Promise((resolve, reject) => {
    const opening = indexedDB.open(DATABASE, 1);
    opening.onupgradeneeded = () => opening.result.createObjectStore(STORE);
    opening.onerror = () => reject(opening.error);
    opening.onsuccess = () => {
      const running = opening.result.transaction(STORE, mode);
      const asked = ask(running.objectStore(STORE));
      running.oncomplete = () => {
        opening.result.close();
        resolve(asked.result);
      };
      running.onabort = () => {
        opening.result.close();
        reject(running.error);
      };
    };
  });
}

/** The workbook as the user left it in this browser; undefined where nothing was changed, or where the browser keeps nothing. */
export async function readKeptBook(): Promise<IWorkbookData | undefined> {
  try {
    return await transaction("readonly", (store) => store.get(KEY) as IDBRequest<IWorkbookData | undefined>);
  } catch {
    return undefined;
  }
}

/** True where the user changed or opened a workbook that is kept here. */
export async function hasKeptBook(): Promise<boolean> {
  try {
    return (await transaction("readonly", (store) => store.count(KEY))) > 0;
  } catch {
    return false;
  }
}

/** Says whether the browser took it. */
export async function keepBook(snapshot: IWorkbookData): Promise<boolean> {
  try {
    await transaction("readwrite", (store) => store.put(snapshot, KEY));
    return true;
  } catch {
    return false;
  }
}

/** Puts another workbook in the place of the kept one, which is laid aside; both or neither. Says whether the browser took it. */
export async function replaceBook(snapshot: IWorkbookData): Promise<boolean> {
  try {
    await transaction("readwrite", (store) => {
      const kept = store.get(KEY) as IDBRequest<IWorkbookData | undefined>;
      kept.onsuccess = () => {
        store.put(kept.result ?? INVENTED, BEFORE);
        store.put(snapshot, KEY);
      };
      return kept;
    });
    return true;
  } catch {
    return false;
  }
}

/** The new workbook is shown: what it replaced is let go. */
export async function letBookBeforeGo(): Promise<void> {
  await transaction("readwrite", (store) => store.delete(BEFORE)).catch(() => undefined);
}

/** Puts back what was replaced; false where nothing was laid aside. */
export async function returnToBookBefore(): Promise<boolean> {
  const before = await transaction("readwrite", (store) => {
    const laidAside = store.get(BEFORE) as IDBRequest<IWorkbookData | string | undefined>;
    laidAside.onsuccess = () => {
      if (laidAside.result === undefined) return;
      if (typeof laidAside.result === "string") store.delete(KEY);
      else store.put(laidAside.result, KEY);
      store.delete(BEFORE);
    };
    return laidAside;
  }).catch(() => undefined);
  return before !== undefined;
}

export async function forgetBook(): Promise<void> {
  await transaction("readwrite", (store) => store.clear());
}
