import type { LatentryBundle } from '../../functions/index';
import type { StoreState } from '../../functions/settings/store';
import { formatArea } from '../../taskpane/hosts/address';
import type { Book } from '../book';
import { handedOver, namedBlock } from './namedBlock';

/** The block of unit settings in a workbook. */
const UNITS_NAME = 'latentry_units';

/**
 * The unit settings of a book as the functions are told them.
 * @param book Any book, or none.
 * @param unitsText Settings on top of the book's own, `key=value; key=value`.
 * @throws Problem of the bundle where `unitsText` can't be read.
 */
export function bookSettings(
  book: Book | undefined,
  unitsText: string | undefined,
  latentry: LatentryBundle,
): StoreState {
  const state = book === undefined ? { state: 'absent' as const } : blockState(book, latentry);
  if (unitsText === undefined) return state;
  const base = state.state === 'ready' ? state.settings : latentry.defaultSettings;
  const settings = latentry.parseSettingsText(unitsText, base);
  if (state.state === 'broken') return state;
  return { state: 'ready', settings, stamp: JSON.stringify(latentry.settingsRows(settings)) };
}

function blockState(book: Book, latentry: LatentryBundle): StoreState {
  const block = namedBlock(book, UNITS_NAME);
  if (block === undefined) return { state: 'absent' };
  if (block.area === undefined) {
    const message = 'a range of two columns on a sheet of this workbook';
    return { state: 'broken', cell: block.name, text: block.text, message };
  }
  const { area } = block;
  const cell = (row: number, column: number) =>
    formatArea({ top: area.top + row, left: area.left + column, rows: 1, columns: 1 });
  const values = block.values.map((row) => row.map(handedOver));
  try {
    const settings = latentry.parseSettingsBlock(values, latentry.defaultSettings);
    return { state: 'ready', settings, stamp: JSON.stringify(latentry.settingsRows(settings)) };
  } catch (thrown) {
    const { allowed, received, nearest, row } = problemOf(thrown);
    const value = values[row]?.[1];
    const inValue = (typeof value === 'number' || typeof value === 'string') && String(value) === received;
    const words = nearest === undefined ? allowed : `${allowed} (nearest: ${nearest})`;
    return { state: 'broken', cell: cell(row, inValue ? 1 : 0), text: received, message: words };
  }
}

interface BlockProblem {
  readonly allowed: string;
  readonly received: string;
  readonly nearest: string | undefined;
  /** Row of the block, from zero. */
  readonly row: number;
}

/** The data of a refusal by the bundle; anything else is a defect and is thrown on. */
function problemOf(thrown: unknown): BlockProblem {
  const data = (thrown as { data?: Readonly<Record<string, unknown>> }).data;
  const argument = data?.['argument'];
  const row = /^Units row (\d+)/.exec(typeof argument === 'string' ? argument : '');
  if (data === undefined || row === null) throw thrown;
  const nearest = data['nearest'];
  return {
    allowed: String(data['allowed']),
    received: String(data['received']).replace(/^(?:the key )?"(.*)"$/, '$1'),
    nearest: typeof nearest === 'string' ? nearest : undefined,
    row: Number(row[1]) - 1,
  };
}
