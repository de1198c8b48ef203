/* The browser's own database, shared by the page and its threads. Nothing of it leaves the machine. */

const DATABASE = "layerhead";
/** Goes up when a store is added. */
const VERSION = 2;

/** The state of the page; the samples of its casts, each set under a key of its own; the files they were read from. */
const STORES = ["work", "samples", "files"] as const;

type StoreName = (typeof STORES)[number];

const settled = <T>(request: IDBRequest<T>): Promise<T> =>
  new Promise((resolve, reject) => {
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error);
  });

/** One request to one store. Rejects where the browser withholds its database or has no room left. */
export async function inStore<T>(
  name: StoreName,
  mode: IDBTransactionMode,
  request: (store: IDBObjectStore) => IDBRequest<T>,
): Promise<T> {
  const opening = indexedDB.open(DATABASE, VERSION);
  opening.onupgradeneeded = () => {
    for (const store of STORES)
      if (!opening.result.objectStoreNames.contains(store)) opening.result.createObjectStore(store);
  };
  const database = await settled(opening);
  const transaction = database.transaction(name, mode);
  const close = () => database.close();
  transaction.oncomplete = close;
  transaction.onabort = close;
  return settled(request(transaction.objectStore(name)));
}

/** Deletes every entry of a store whose key is not among those still needed. */
export async function keepOnly(name: StoreName, keys: ReadonlySet<string>): Promise<void> {
  const all = await inStore(name, "readonly", (store) => store.getAllKeys());
  for (const key of all) if (!keys.has(String(key))) await inStore(name, "readwrite", (store) => store.delete(key));
}
