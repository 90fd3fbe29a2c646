import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { settingsStore, type StoreState } from '../../../functions/settings/store';
import { recalculateStale } from '../../../taskpane/boot/recalculateStale';
import { staleness } from '../../../taskpane/boot/staleness';
import { editionNow } from '../../../taskpane/boot/stamp';
import { startSettings } from '../../../taskpane/boot/startSettings';
import { memoryHost, type MemoryHost } from '../memoryHost';
import { unitCell, unitsChanges, workbookWithFormulas } from './unitsSheet';

const data = (address: string) => ({ sheet: 'Data', address });
const ambient = [data('A1:A2')];

describe('startSettings', () => {
  const stops: (() => void)[] = [];
  beforeEach(() => {
    vi.useFakeTimers();
    settingsStore.publish({ state: 'unread' });
    staleness.publish({ state: 'fresh' });
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

  /** Lets every request run out. */
  async function settle(): Promise<void> {
    await vi.advanceTimersByTimeAsync(10_000);
  }

  function setUnit(host: MemoryHost, label: string, value: string, remote = false): void {
    host.type({ sheet: 'Units', address: unitCell(label) }, [[value]], remote);
  }

  async function ready(): Promise<MemoryHost> {
    const host = await workbookWithFormulas();
    await start(host);
    host.recalculated.length = 0;
    return host;
  }

  const pressure = (): string | undefined => {
    const state = settingsStore.current();
    return state.state === 'ready' ? state.settings.units.pressure.symbol : undefined;
  };

  it('says absent where no Units block is, and leaves such a workbook without our formulas untouched', async () => {
    const host = memoryHost();
    host.book.addSheet('Data');
    host.type(data('A1'), [['=SUM(1)']]);
    await start(host);
    expect(settingsStore.current()).toEqual({ state: 'absent' });
    expect(host.book.state.size).toBe(0);
    expect(host.undoLog).toEqual([]);
    expect(host.recalculated).toEqual([]);
  });

  it('publishes the settings of the block', async () => {
    const host = await workbookWithFormulas();
    setUnit(host, 'Pressure', 'bar');
    await start(host);
    expect(pressure()).toBe('bar');
  });

  it('says where a damaged setting stands and what stands there', async () => {
    const host = await workbookWithFormulas();
    setUnit(host, 'Pressure', 'kPascals');
    await start(host);
    expect(settingsStore.current()).toMatchObject({
      state: 'broken',
      cell: unitCell('Pressure'),
      text: 'kPascals',
    });
  });

  it('says broken, not absent, where the name leads nowhere', async () => {
    const host = await workbookWithFormulas();
    host.book.setName('Latentry_units', '=#REF!');
    await start(host);
    expect(settingsStore.current()).toMatchObject({ state: 'broken', cell: 'Latentry_units', text: '#REF!' });
  });

  it('follows an edit and recalculates only formulas that rest on the store', async () => {
    const host = await ready();
    setUnit(host, 'Pressure', 'bar');
    await settle();
    expect(pressure()).toBe('bar');
    expect(host.recalculated).toEqual(ambient);
  });

  it('follows its own edit too, the pane’s Apply', async () => {
    const host = await ready();
    await host.apply(
      [{ kind: 'cells', ref: { sheet: 'Units', address: unitCell('Pressure') }, values: [['bar']] }],
      'units',
    );
    await settle();
    expect(pressure()).toBe('bar');
    expect(host.recalculated).toEqual(ambient);
  });

  it('notices a block that comes and one that goes', async () => {
    const host = await workbookWithFormulas(false);
    await start(host);
    expect(settingsStore.current().state).toBe('absent');
    await host.apply(unitsChanges(), 'units');
    await settle();
    expect(settingsStore.current().state).toBe('ready');
    host.book.names.clear();
    host.book.emit('activated', { remote: false, own: false });
    await settle();
    expect(settingsStore.current().state).toBe('absent');
  });

  it('makes one step of a burst of edits', async () => {
    const host = await ready();
    const seen: StoreState[] = [];
    stops.push(settingsStore.subscribe((state) => seen.push(state)));
    for (const value of ['bar', 'Pa', 'MPa', 'mbar', 'bar']) setUnit(host, 'Pressure', value);
    await settle();
    expect(seen).toHaveLength(1);
    expect(host.recalculated).toEqual(ambient);
  });

  it('does nothing where the text changes but not its meaning, nor after calculations and activations', async () => {
    const host = await ready();
    setUnit(host, 'Pressure', ' kPa ');
    for (let i = 0; i < 20; i += 1) {
      host.book.calculate();
      host.book.emit('activated', { remote: false, own: false });
      await vi.advanceTimersByTimeAsync(50);
    }
    await settle();
    expect(host.recalculated).toEqual([]);
  });

  it('comes to rest after its own recalculation', async () => {
    const host = await ready();
    setUnit(host, 'Pressure', 'bar');
    await settle();
    const crossings = host.crossings;
    const evaluated = host.book.evaluations.get('Data!A1');
    await vi.advanceTimersByTimeAsync(60_000);
    expect(host.crossings).toBe(crossings);
    expect(host.book.evaluations.get('Data!A1')).toBe(evaluated);
  });

  it('does not read the workbook for edits elsewhere', async () => {
    const host = await ready();
    const before = host.crossings;
    host.book.emit('change', { ref: data('F9'), remote: false, own: false });
    await vi.advanceTimersByTimeAsync(500);
    expect(host.crossings).toBe(before);
  });

  it('stops for good', async () => {
    const host = await ready();
    for (const stop of stops.splice(0)) stop();
    setUnit(host, 'Pressure', 'bar');
    await settle();
    expect(pressure()).toBe('kPa');
    for (const name of ['select', 'change', 'calculated', 'activated'] as const) {
      expect(host.book.listenerCount(name)).toBe(0);
    }
  });

  it('is asked again when the host cannot be read, and says so in the end', async () => {
    const host = memoryHost();
    let fails = 3;
    const names = host.names.bind(host);
    host.names = (prefix) => {
      fails -= 1;
      return fails >= 0 ? Promise.reject(new Error('busy')) : names(prefix);
    };
    const started = startSettings(host);
    await vi.advanceTimersByTimeAsync(100);
    expect(settingsStore.current().state).toBe('unread');
    await vi.advanceTimersByTimeAsync(20_000);
    stops.push(await started);
    expect(settingsStore.current().state).toBe('absent');

    settingsStore.publish({ state: 'unread' });
    const dead = memoryHost();
    dead.names = () => Promise.reject(new Error('busy'));
    const second = startSettings(dead);
    await vi.advanceTimersByTimeAsync(20_000);
    stops.push(await second);
    expect(settingsStore.current()).toMatchObject({ state: 'broken', message: 'the workbook could not be read: busy' });
  });

  describe('the stamp in the file', () => {
    it('is written once our values are there, and then keeps', async () => {
      const host = await workbookWithFormulas();
      await start(host);
      expect(host.book.state.get('stamp')).toMatch(new RegExp(`^${editionNow()}\\|[0-9a-f]+\\|$`));
      // Without a stamp nobody knows what the values were computed with: all of ours, with the block too.
      expect(host.recalculated).toEqual([data('A1:A2'), data('B1')]);
    });

    it('comes with the first formula typed into a workbook without one', async () => {
      const host = memoryHost();
      host.book.addSheet('Data');
      await start(host);
      host.type(data('A1'), [['no formula']]);
      await settle();
      // Whole rows, as Excel reports an insertion: nothing to read there.
      host.book.emit('change', { ref: data('5:5'), remote: false, own: false });
      await settle();
      expect(host.book.state.size).toBe(0);
      host.type(data('A2'), [['=LATENTRY.EDITION()']]);
      await settle();
      expect(host.book.state.get('stamp')).toContain(editionNow());
    });

    it('tells on load that settings changed while the add-in was away', async () => {
      const host = await ready();
      for (const stop of stops.splice(0)) stop();
      const before = host.book.state.get('stamp');
      setUnit(host, 'Heat', 'kJ/mol');
      host.recalculated.length = 0;
      await start(host);
      expect(host.recalculated).toEqual(ambient);
      expect(host.book.state.get('stamp')).not.toBe(before);
    });

    it('leaves values alone on load when nothing changed', async () => {
      const host = await ready();
      for (const stop of stops.splice(0)) stop();
      await start(host);
      expect(host.recalculated).toEqual([]);
    });

    it('tells of another edition and leaves its values until asked', async () => {
      const host = await ready();
      for (const stop of stops.splice(0)) stop();
      const [, settings = '', house = ''] = (host.book.state.get('stamp') ?? '').split('|');
      host.book.state.set('stamp', `0.0.1 2020-01-01|${settings}|${house}`);
      await start(host);
      expect(staleness.current()).toEqual({ state: 'stale', from: '0.0.1 2020-01-01', to: editionNow() });
      expect(host.recalculated).toEqual([]);
      expect(host.book.state.get('stamp')).toContain('0.0.1');

      await recalculateStale(host);
      expect(host.recalculated).toEqual([data('A1:A2'), data('B1')]);
      expect(staleness.current()).toEqual({ state: 'fresh' });
      expect(host.book.state.get('stamp')).toContain(editionNow());
    });

    it('is left to the person who made the change', async () => {
      const host = await ready();
      const before = host.book.state.get('stamp');
      setUnit(host, 'Pressure', 'bar', true);
      await settle();
      expect(pressure()).toBe('bar');
      expect(host.recalculated).toEqual(ambient);
      expect(host.book.state.get('stamp')).toBe(before);
    });

    it('counts house substances: when they change, all of our formulas do', async () => {
      const host = await workbookWithFormulas();
      host.book.addSheet('Substances');
      host.type({ sheet: 'Substances', address: 'A2:B2' }, [['kelp wax', 180]]);
      host.book.setName('Latentry_substances', { sheet: 'Substances', address: 'A2:B2' });
      await start(host);
      host.recalculated.length = 0;
      host.type({ sheet: 'Substances', address: 'B2' }, [[181]]);
      await settle();
      expect(host.recalculated).toEqual([data('A1:A2'), data('B1')]);
    });
  });
});
