import { readHouseBlock } from '../../functions/house/readHouseBlock';
import type { HouseState } from '../../functions/house/store';
import { DEFAULT_SETTINGS, readSettingsBlock, settingsStamp } from '../../functions/settings/settings';
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
  readonly substances: Exclude<HouseState, { state: 'unread' }>;
  /** Hash of the house substances; empty where there is no block of them. */
  readonly house: string;
  /** Sheets whose changes matter, in lower case. */
  readonly sheets: ReadonlySet<string>;
}

/** The store's state for a block that names a damaged cell, or lacks a row: no default steps in for either. */
function brokenAt(
  { ref, values }: Block,
  row: number,
  column: number,
  text: string,
  message: string,
): Snapshot['store'] {
  const area = parseArea(ref.address);
  if (area === null || row < 0 || row >= values.length) return { state: 'broken', cell: ref.address, text, message };
  const left = area.left + Math.min(column, area.columns - 1);
  return { state: 'broken', cell: formatArea({ top: area.top + row, left, rows: 1, columns: 1 }), text, message };
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
  const { settings, missing, fault } = readSettingsBlock(block.values, DEFAULT_SETTINGS);
  if (fault !== undefined) return brokenAt(block, fault.row, fault.column, fault.text, fault.message);
  if (missing.length > 0) return brokenAt(block, -1, 0, '', `a row for ${missing.join(', ')}: it is missing`);
  return { state: 'ready', settings, stamp: settingsStamp(settings, '') };
}

/** The team's own substances; their rows are read with the decimal separator that is in force. */
function houseOf(
  substances: Ref | 'broken' | undefined,
  block: Block | undefined,
  store: Snapshot['store'],
): Snapshot['substances'] {
  if (substances === undefined) return { state: 'absent' };
  const area = block === undefined ? null : parseArea(block.ref.address);
  if (block === undefined || area === null) return { state: 'broken', text: '#REF!' };
  const { decimal } = store.state === 'ready' ? store.settings : DEFAULT_SETTINGS;
  return readHouseBlock({ values: block.values, firstRow: area.top + 1, decimal });
}

function houseHash(substances: Snapshot['substances']): string {
  if (substances.state === 'absent') return '';
  return textHash(substances.state === 'ready' ? substances.stamp : substances.text);
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
  const house = houseOf(substances, blockOf(substances), store);
  return {
    store,
    substances: house,
    settings: store.state === 'ready' ? store.stamp : textHash(JSON.stringify(store)),
    house: houseHash(house),
    sheets: new Set(['units', 'substances', ...refs.map(({ sheet }) => sheet.toLowerCase())]),
  };
}
