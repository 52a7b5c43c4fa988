/** A small store of the browser's own that outlives the page and takes file handles as they are. */
export interface Kept {
  get(key: string): Promise<unknown>;
  put(key: string, value: unknown): Promise<void>;
  remove(key: string): Promise<void>;
  keys(): Promise<readonly string[]>;
}

const DATABASE = 'tautline';
const TABLE = 'kept';

/** Opened at the first use. Every call rejects where the browser gives no database, as in some private windows. */
export function keptInBrowser(): Kept {
  let opened: Promise<IDBDatabase> | null = null;

  async function inTable<T>(
    mode: IDBTransactionMode,
    ask: (table: IDBObjectStore) => IDBRequest<T>,
  ): Promise<T> {
    opened ??= openDatabase();
    const transaction = (await opened).transaction(TABLE, mode);
    const asked = ask(transaction.objectStore(TABLE));
    await finished(transaction);
    return asked.result;
  }

  return {
    get: (key) => inTable<unknown>('readonly', (table) => table.get(key)),
    put: async (key, value) => void (await inTable('readwrite', (table) => table.put(value, key))),
    remove: (key) => inTable('readwrite', (table) => table.delete(key)),
    keys: async () => (await inTable('readonly', (table) => table.getAllKeys())).map(String),
  };
}

function openDatabase(): Promise<IDBDatabase> {
  return new Promise((resolve, reject) => {
    const asked = indexedDB.open(DATABASE, 1);
    asked.onupgradeneeded = () => asked.result.createObjectStore(TABLE);
    asked.onsuccess = () => resolve(asked.result);
    asked.onerror = () => reject(asked.error);
  });
}

function finished(transaction: IDBTransaction): Promise<void> {
  return new Promise((resolve, reject) => {
    transaction.oncomplete = () => resolve();
    transaction.onabort = () => reject(transaction.error);
    transaction.onerror = () => reject(transaction.error);
  });
}
