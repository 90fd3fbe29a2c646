import type { Book } from '../../book';
import { openDatabase, type Database, type Kept } from './database';
import { tabKey } from './tabKey';

/** Keeps the open workbook in the browser, so that nothing typed is lost on reload. */
export interface Keeper {
  /** What this tab had open last. */
  load(): Promise<Kept | undefined>;
  save(kept: Omit<Kept, 'id' | 'savedAt'>): Promise<void>;
  /** For a page that is being closed: done before it returns, without the file. */
  saveNow(kept: Omit<Kept, 'id' | 'savedAt' | 'file'>): void;
}

interface Hurried {
  readonly savedAt: number;
  readonly name: string;
  readonly book: Book;
  readonly changed: boolean;
}

const HURRIED = 'latentry.closing.';

/** Rejects where the browser keeps nothing, as in some private windows. */
export async function startKeeper(): Promise<Keeper> {
  const database: Database = await openDatabase();
  const id = await tabKey(database);
  const key = HURRIED + id;
  return {
    load: async () => {
      const kept = await database.get(id);
      const text = localStorage.getItem(key);
      if (text === null) return kept;
      const hurried = JSON.parse(text) as Hurried;
      if (kept !== undefined && kept.savedAt >= hurried.savedAt) return kept;
      const newer = { ...kept, ...hurried, id };
      await database.put(newer);
      localStorage.removeItem(key);
      return newer;
    },
    save: async (kept) => {
      await database.put({ ...kept, id, savedAt: Date.now() });
      localStorage.removeItem(key);
    },
    saveNow: (kept) => {
      try {
        localStorage.setItem(key, JSON.stringify({ ...kept, savedAt: Date.now() }));
      } catch {
        // Too large for this store: the last regular save stands.
      }
    },
  };
}
