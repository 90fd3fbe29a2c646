import { DATA_EDITION, EDITION } from '../../functions/edge/editionText';
import type { WorkbookHost } from '../port';
import type { Snapshot } from './readSnapshot';

/** What the values in a file were computed with. */
export interface Stamp {
  readonly edition: string;
  readonly settings: string;
  readonly house: string;
}

const KEY = 'stamp';

/** The edition of functions and data that runs now. */
export function editionNow(): string {
  return `${EDITION} ${DATA_EDITION}`;
}

export function stampOf({ settings, house }: Snapshot, edition: string): Stamp {
  return { edition, settings, house };
}

/** The stamp in the file; null where there is none or an unreadable one. */
export async function readStamp(host: WorkbookHost): Promise<Stamp | null> {
  const parts = ((await host.state(KEY)) ?? '').split('|');
  const [edition, settings, house] = parts;
  if (parts.length !== 3 || edition === undefined || settings === undefined || house === undefined) return null;
  return { edition, settings, house };
}

export async function writeStamp(host: WorkbookHost, { edition, settings, house }: Stamp): Promise<void> {
  await host.state(KEY, `${edition}|${settings}|${house}`);
}
