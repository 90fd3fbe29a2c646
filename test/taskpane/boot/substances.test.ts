import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { HOUSE_HEADS } from '../../../core/house/houseRow';
import { currentRegistry, takeMissed } from '../../../functions/house/currentRegistry';
import { houseStore } from '../../../functions/house/store';
import { settingsStore } from '../../../functions/settings/store';
import { startSettings } from '../../../taskpane/boot/startSettings';
import type { Cell } from '../../../taskpane/port';
import type { MemoryHost } from '../memoryHost';
import { unitCell, workbookWithFormulas } from './unitsSheet';

const WIDTH = 9;
const LAST = 12;
const cp = (value: Cell): Cell[] => [
  'kelp wax',
  'liquid heat capacity',
  null,
  value,
  'kJ/(kg K)',
  60,
  110,
  'laboratory',
  'A',
];

describe('startSettings and the substances of the workbook', () => {
  const stops: (() => void)[] = [];
  beforeEach(() => {
    vi.useFakeTimers();
    settingsStore.publish({ state: 'unread' });
    houseStore.publish({ state: 'unread' });
    takeMissed();
  });
  afterEach(() => {
    for (const stop of stops.splice(0)) stop();
    vi.useRealTimers();
  });

  async function start(host: MemoryHost): Promise<void> {
    const started = startSettings(host);
    await vi.advanceTimersByTimeAsync(0);
    stops.push(await started);
    await settle();
  }

  async function settle(): Promise<void> {
    await vi.advanceTimersByTimeAsync(10_000);
  }

  /** The memory host holds single cells or blocks of one size: header, one row, room. */
  async function workbook(value: Cell): Promise<MemoryHost> {
    const host = await workbookWithFormulas();
    host.book.addSheet('Substances');
    const room = Array.from({ length: LAST - 5 }, () => new Array<Cell>(WIDTH).fill(null));
    host.type({ sheet: 'Substances', address: `A4:I${LAST}` }, [[...HOUSE_HEADS], cp(value), ...room]);
    host.book.setName('Latentry_substances', { sheet: 'Substances', address: `A4:I${LAST}` });
    return host;
  }

  const known = (): number | undefined =>
    currentRegistry().entry('kelp wax')?.make().heatCapacity('liquid', 1e5).at(350);

  it('are known before the settings are, which formulas wait for', async () => {
    const host = await workbook(2.2);
    const seen: string[] = [];
    stops.push(settingsStore.subscribe(() => seen.push(houseStore.current().state)));
    await start(host);
    expect(seen).toEqual(['ready']);
    expect(known()).toBeCloseTo(2200, 9);
  });

  it('name rows by their number on the sheet', async () => {
    await start(await workbook('much'));
    const state = houseStore.current();
    expect(state.state === 'ready' ? state.house.faults : []).toMatchObject([{ row: 5, column: 'coefficients' }]);
  });

  it('follow an edit, and all formulas of ours with them', async () => {
    const host = await workbook(2.2);
    await start(host);
    const before = host.book.state.get('stamp');
    host.recalculated.length = 0;
    host.type({ sheet: 'Substances', address: 'D5' }, [[2.5]]);
    await settle();
    expect(known()).toBeCloseTo(2500, 9);
    expect(host.recalculated).not.toEqual([]);
    expect(host.book.state.get('stamp')).not.toBe(before);
  });

  it('do nothing where nothing changed', async () => {
    const host = await workbook(2.2);
    await start(host);
    const version = houseStore.version();
    host.recalculated.length = 0;
    host.type({ sheet: 'Substances', address: 'D5' }, [[2.2]]);
    host.book.calculate();
    await settle();
    expect(houseStore.version()).toBe(version);
    expect(host.recalculated).toEqual([]);
  });

  it('are read anew when the decimal separator changes', async () => {
    const host = await workbook('2,2');
    await start(host);
    expect(() => known()).toThrow(/received "2,2"/);
    host.type({ sheet: 'Units', address: unitCell('Barometer') }, [['101,325 kPa']]);
    host.type({ sheet: 'Units', address: unitCell('Decimal separator') }, [[',']]);
    await settle();
    expect(known()).toBeCloseTo(2200, 9);
  });

  it('come and go with their name', async () => {
    const host = await workbook(2.2);
    await start(host);
    host.book.setName('Latentry_substances', '=#REF!');
    host.book.emit('activated', { remote: false, own: false });
    await settle();
    expect(houseStore.current()).toEqual({ state: 'broken', text: '#REF!' });
    host.book.names.delete('latentry_substances');
    host.book.emit('activated', { remote: false, own: false });
    await settle();
    expect(houseStore.current()).toEqual({ state: 'absent' });
  });

  it('are said to be absent where there is no block', async () => {
    await start(await workbookWithFormulas());
    expect(houseStore.current()).toEqual({ state: 'absent' });
  });

  it('recalculate what asked for a name before they were read, though nothing else changed', async () => {
    const host = await workbook(2.2);
    await start(host);
    for (const stop of stops.splice(0)) stop();
    houseStore.publish({ state: 'unread' });
    host.recalculated.length = 0;
    expect(() => currentRegistry().find('kelp wax')).toThrow(/not read yet/);
    await start(host);
    expect(host.recalculated).not.toEqual([]);
    for (const stop of stops.splice(0)) stop();
    host.recalculated.length = 0;
    await start(host);
    expect(host.recalculated).toEqual([]);
  });
});
