import type { Book } from '../../book';

/** What the browser keeps of one open workbook. */
export interface Kept {
  readonly id: string;
  readonly savedAt: number;
  readonly name: string;
  readonly book: Book;
  /** True where the workbook holds changes that no file holds. */
  readonly changed: boolean;
  /** The file that it was opened from: what we don't understand of it is kept when it is saved again. */
  readonly file?: Uint8Array;
}

const DATABASE = 'latentry';
const STORE = 'workbooks';

/** The workbooks kept in this browser. */
export interface Database {
  get(id: string): Promise<Kept | undefined>;
  put(kept: Kept): Promise<void>;
  remove(id: string): Promise<void>;
  all(): Promise<Kept[]>;
}

/** Opens the browser's store; rejects where the browser refuses one. */
export async function openDatabase(): Promise<Database> {
  const opening = indexedDB.open(DATABASE, 1);
  opening.onupgradeneeded = () => opening.result.createObjectStore(STORE, { keyPath: 'id' });
  const database = await settled(opening);
  const store = (mode: IDBTransactionMode) => database.transaction(STORE, mode).objectStore(STORE);
  return {
    get: (id) => settled(store('readonly').get(id) as IDBRequest<Kept | undefined>),
    put: async (kept) => {
      await settled(store('readwrite').put(kept));
    },
    remove: (id) => settled(store('readwrite').delete(id)),
    all: () => settled(store('readonly').getAll() as IDBRequest<Kept[]>),
  };
}

function settled<T>(request: IDBRequest<T>): Promise<T> {
  return new Promise((resolve, reject) => {
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error ?? new Error('the browser gave no reason'));
  });
}
