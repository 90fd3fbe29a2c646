import type { Database } from './database';

const TAB = 'latentry.tab';

/** Older workbooks than these are forgotten. */
const MOST_KEPT = 8;

/**
 * The key of the workbook that this tab has open: the same after a reload; in a new tab the latest one that no other
 * tab has open; in a copy of a tab a new key.
 */
export async function tabKey(database: Database): Promise<string> {
  const known = (await database.all()).sort((a, b) => b.savedAt - a.savedAt);
  for (const { id } of known.slice(MOST_KEPT)) await database.remove(id);
  const before = sessionStorage.getItem(TAB);
  const wanted = [...(before === null ? [] : [before]), ...known.slice(0, MOST_KEPT).map(({ id }) => id)];
  for (const id of wanted) {
    if (await claim(id)) return remember(id);
  }
  const fresh = crypto.randomUUID();
  await claim(fresh);
  return remember(fresh);
}

function remember(id: string): string {
  sessionStorage.setItem(TAB, id);
  return id;
}

/** Holds the key until the tab is closed; false where another tab holds it. */
function claim(id: string): Promise<boolean> {
  return new Promise((resolve, reject) => {
    navigator.locks
      .request(`${TAB}.${id}`, { ifAvailable: true }, (lock) => {
        resolve(lock !== null);
        return lock === null ? undefined : new Promise<void>(() => undefined);
      })
      .catch(reject);
  });
}
