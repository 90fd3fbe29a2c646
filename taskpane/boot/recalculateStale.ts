import type { Ref, WorkbookHost } from '../port';
import { readSnapshot } from './readSnapshot';
import { recalculateOurs } from './recalculateOurs';
import { staleness } from './staleness';
import { editionNow, stampOf, writeStamp } from './stamp';

/** What the pane's button for stale values does: all our formulas anew, then the stamp of the edition that runs. */
export async function recalculateStale(host: WorkbookHost, signal = new AbortController().signal): Promise<Ref[]> {
  const cells = await recalculateOurs(host, 'all', signal);
  if (signal.aborted) return [];
  await writeStamp(host, stampOf(await readSnapshot(host), editionNow()));
  staleness.publish({ state: 'fresh' });
  return cells;
}
