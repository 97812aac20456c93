import type { IWorkbookData } from "@univerjs/core";

const DATABASE = "weirmark-trial";
const STORE = "books";
const KEY = "book";

function request<Result>(
  mode: IDBTransactionMode,
  ask: (store: IDBObjectStore) => IDBRequest<Result>,
): Promise<Result> {
  return new Promise((resolve, reject) => {
    const opening = indexedDB.open(DATABASE, 1);
    opening.onupgradeneeded = () => opening.result.createObjectStore(STORE);
    opening.onerror = () => reject(opening.error);
    opening.onsuccess = () => {
      const transaction = opening.result.transaction(STORE, mode);
      const asked = ask(transaction.objectStore(STORE));
      transaction.oncomplete = () => {
        opening.result.close();
        resolve(asked.result);
      };
      transaction.onabort = () => reject(transaction.error);
    };
  });
}

/** The workbook as the user left it in this browser; undefined where nothing was changed, or where the browser keeps nothing. */
export async function readKeptBook(): Promise<IWorkbookData | undefined> {
  try {
    return await request("readonly", (store) => store.get(KEY) as IDBRequest<IWorkbookData | undefined>);
  } catch {
    return undefined;
  }
}

/** Says whether the browser took it. */
export async function keepBook(snapshot: IWorkbookData): Promise<boolean> {
  try {
    await request("readwrite", (store) => store.put(snapshot, KEY));
    return true;
  } catch {
    return false;
  }
}

export async function forgetBook(): Promise<void> {
  await request("readwrite", (store) => store.delete(KEY));
}
