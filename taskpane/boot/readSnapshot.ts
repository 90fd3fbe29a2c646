import { Problem } from '../../core/problem';
import { settingCell } from '../../functions/settings/settingCell';
import { DEFAULT_SETTINGS, parseSettingsBlock, settingsStamp } from '../../functions/settings/settings';
import type { StoreState } from '../../functions/settings/store';
import { formatArea, parseArea } from '../hosts/address';
import type { Block, Ref, WorkbookHost } from '../port';
import { textHash } from './textHash';

export const UNITS_NAME = 'Latentry_units';
export const SUBSTANCES_NAME = 'Latentry_substances';

/** What the workbook says at one moment, and where it says it. */
export interface Snapshot {
  readonly store: Exclude<StoreState, { state: 'unread' }>;
  /** Hash of the settings in force; equal hashes give equal answers. */
  readonly settings: string;
  /** Hash of the house substances; empty where there are none. */
  readonly house: string;
  /** Sheets whose changes matter, in lower case. */
  readonly sheets: ReadonlySet<string>;
}

/** The parser names the row by its number in the block. */
function brokenAt({ ref, values }: Block, problem: Problem): Snapshot['store'] {
  const { data } = problem;
  const area = parseArea(ref.address);
  const row = data.code === 'argument' ? Number(/\brow (\d+)\b/.exec(data.argument)?.[1]) - 1 : Number.NaN;
  const message = data.code === 'argument' ? data.allowed : problem.message;
  if (area === null || !(row >= 0 && row < area.rows)) {
    return { state: 'broken', cell: ref.address, text: '', message };
  }
  const column = Math.min(1, area.columns - 1);
  const cell = formatArea({ top: area.top + row, left: area.left + column, rows: 1, columns: 1 });
  return { state: 'broken', cell, text: settingCell(values[row]?.[column]), message };
}

function storeOf(units: Ref | 'broken' | undefined, block: Block | undefined): Snapshot['store'] {
  if (units === undefined) return { state: 'absent' };
  if (units === 'broken' || block === undefined) {
    return {
      state: 'broken',
      cell: UNITS_NAME,
      text: '#REF!',
      message: 'the name has to lead to the rows of the Units sheet',
    };
  }
  try {
    const settings = parseSettingsBlock(block.values, DEFAULT_SETTINGS);
    return { state: 'ready', settings, stamp: settingsStamp(settings, '') };
  } catch (error) {
    if (!(error instanceof Problem)) throw error;
    return brokenAt(block, error);
  }
}

function nameIn(names: ReadonlyMap<string, Ref | 'broken'>, wanted: string): Ref | 'broken' | undefined {
  return [...names].find(([name]) => name.toLowerCase() === wanted.toLowerCase())?.[1];
}

/** Reads the Units block and the house substances: two crossings. */
export async function readSnapshot(host: WorkbookHost): Promise<Snapshot> {
  const names = await host.names('Latentry_');
  const units = nameIn(names, UNITS_NAME);
  const substances = nameIn(names, SUBSTANCES_NAME);
  const refs = [units, substances].filter((ref) => ref !== undefined && ref !== 'broken');
  const blocks = refs.length === 0 ? [] : await host.read(refs);
  const blockOf = (ref: Ref | 'broken' | undefined) =>
    ref === undefined || ref === 'broken' ? undefined : blocks[refs.indexOf(ref)];
  const store = storeOf(units, blockOf(units));
  const house = blockOf(substances);
  return {
    store,
    settings: store.state === 'ready' ? store.stamp : textHash(JSON.stringify(store)),
    house: house === undefined ? '' : textHash(JSON.stringify(house.values)),
    sheets: new Set(['units', 'substances', ...refs.map(({ sheet }) => sheet.toLowerCase())]),
  };
}
