import { afterEach, describe, expect, it, vi } from 'vitest';
import { excelHost } from '../../../taskpane/hosts/excel';
import { HostFailure } from '../../../taskpane/hosts/hostFailure';
import type { Change, HostEvent, WorkbookHost } from '../../../taskpane/port';
import { doubling } from '../doubling';
import { describeHostContract, type HostHarness } from '../hostContract';
import { MemoryWorkbook, type Evaluate } from '../memoryWorkbook';
import { FakeExcel } from './fakeExcel';

async function open(evaluate: Evaluate = doubling): Promise<{ fake: FakeExcel; host: WorkbookHost }> {
  const fake = new FakeExcel(new MemoryWorkbook(evaluate));
  const { Excel, Office } = fake.globals();
  vi.stubGlobal('Excel', Excel);
  vi.stubGlobal('Office', Office);
  return { fake, host: await excelHost() };
}

async function harness(prepare: (fake: FakeExcel) => void = () => undefined): Promise<HostHarness> {
  const { fake, host } = await open();
  prepare(fake);
  return {
    host,
    select: (ref) => fake.select(ref),
    type: (ref, cells) => fake.type(ref, cells),
    typeElsewhere: (ref, cells) => fake.type(ref, cells, 'Remote'),
    protect: (sheet) => {
      fake.book.addSheet(sheet).protected = true;
    },
    breakName: (name) => {
      fake.book.setName(name, '=#REF!');
    },
    activate: (sheet) => fake.fire('activated', { worksheetId: `{${sheet.toLowerCase()}}` }),
    noteAt: ({ sheet, address }) => fake.book.sheet(sheet)?.notes.get(address) ?? null,
    dispose: () => {
      vi.unstubAllGlobals();
    },
  };
}

describeHostContract('the Excel host', () => harness());

describeHostContract('the Excel host on a build without notes, spill lookup and change triggers', () =>
  harness((fake) => {
    for (const version of ['1.12', '1.18', '1.20']) fake.without.add(`ExcelApi ${version}`);
    fake.saysWhoChanged = false;
  }),
);

describe('the Excel host', () => {
  afterEach(() => {
    vi.unstubAllGlobals();
  });
  const at = (address: string) => ({ sheet: 'Sheet1', address });

  it('reads any number of blocks in one crossing', async () => {
    const { fake, host } = await open();
    fake.book.addSheet('Other');
    const before = fake.syncs;
    await host.read([at('A1:C9'), { sheet: 'Other', address: 'A1' }, at('Z9')]);
    // One that asks, one that closes the batch with nothing queued.
    expect(fake.syncs - before).toBe(2);
  });

  it('reads blocks above the size cap in pieces, and puts them together', async () => {
    const { fake, host } = await open();
    for (const row of [0, 99_999, 100_000, 100_001]) fake.book.write('Sheet1', row, 0, row);
    const [block] = await host.read([at('A1:B100002')]);
    expect(block?.values).toHaveLength(100_002);
    expect([0, 99_999, 100_000, 100_001].map((row) => block?.values[row]?.[0])).toEqual([0, 99_999, 100_000, 100_001]);
    expect(block?.ref).toEqual(at('A1:B100002'));
  });

  it('waits while a person edits a cell, in every batch', async () => {
    const { fake, host } = await open();
    await host.read([at('A1')]);
    await host.apply([{ kind: 'cells', ref: at('A1'), values: [[1]] }], 'one');
    expect(fake.runOptions.length).toBeGreaterThan(2);
    for (const options of fake.runOptions) expect(options).toMatchObject({ delayForCellEdit: true });
  });

  it('merges a step into one undo group where Excel can, and says so', async () => {
    const { fake, host } = await open();
    expect(host.can.undoGroup).toBe(true);
    await host.apply([{ kind: 'cells', ref: at('A1'), values: [[1]] }], 'one');
    expect(fake.runOptions).toContainEqual({ delayForCellEdit: true, mergeUndoGroup: true });
  });

  it.each(['AccessDenied', 'GeneralException'])(
    'takes back what it had written when a batch fails with %s',
    async (code) => {
      const { fake, host } = await open();
      await fake.type(at('A1:B2'), [
        ["'12.5", '=A2*2'],
        [4, ''],
      ]);
      fake.book.setName('Latentry_units', 'Sheet1!A1');
      fake.book.sheet('Sheet1')?.notes.set('A1', 'before');
      const changes: Change[] = [
        { kind: 'sheet', name: 'Fit' },
        {
          kind: 'cells',
          ref: at('A1:B2'),
          values: [
            [1, 2],
            [3, null],
          ],
        },
        { kind: 'name', name: 'Latentry_units', ref: at('B2') },
        { kind: 'name', name: 'Fit_1', ref: at('B2') },
        { kind: 'note', ref: at('A1'), text: 'after' },
        { kind: 'cells', ref: at('D9'), values: [[9]] },
      ];
      fake.failWrite = { at: 'Sheet1!D9', code };
      const failed = host.apply(changes, 'never');
      if (code === 'AccessDenied') await expect(failed).rejects.toBeInstanceOf(HostFailure);
      else await expect(failed).rejects.toMatchObject({ code });
      const [block] = await host.read([at('A1:B2')]);
      expect(block?.values).toEqual([
        ['12.5', 8],
        [4, null],
      ]);
      expect(block?.formulas).toEqual([
        ['', '=A2*2'],
        ['', ''],
      ]);
      expect([...(await host.names(''))]).toEqual([['Latentry_units', at('A1')]]);
      expect(fake.book.sheet('Fit')).toBeUndefined();
      expect(fake.book.sheet('Sheet1')?.notes.get('A1')).toBe('before');
    },
  );

  it('leaves room for a spill when it takes a step back', async () => {
    const { fake, host } = await open(() => [[1], [2], [3]]);
    await fake.type(at('A1'), [['=LATENTRY.UNITS()']]);
    expect(fake.book.values(at('A1:A3'))).toEqual([[1], [2], [3]]);
    fake.failWrite = { at: 'Sheet1!D9', code: 'GeneralException' };
    const changes: Change[] = [
      { kind: 'cells', ref: at('A2'), values: [['over the spill']] },
      { kind: 'cells', ref: at('D9'), values: [[9]] },
    ];
    await expect(host.apply(changes, 'never')).rejects.toMatchObject({ code: 'GeneralException' });
    expect(fake.book.values(at('A1:A3'))).toEqual([[1], [2], [3]]);
  });

  it('refuses more cells than one request can carry', async () => {
    const { host } = await open();
    const values = Array.from({ length: 100_001 }, () => [1]);
    const errors = await host.check([{ kind: 'cells', ref: at('A1:A100001'), values }]);
    expect(errors).toMatchObject([{ reason: 'too large' }]);
  });

  it('marks only the given cells, in addresses the platform takes, and never calculates everything', async () => {
    const { fake, host } = await open();
    const refs = Array.from({ length: 3000 }, (_, i) => at(`B${String(2 * i + 1)}`));
    await host.recalculate(refs);
    expect(fake.dirty).toHaveLength(3000);
    expect(new Set(fake.dirty).size).toBe(3000);
    expect(fake.calculations).toEqual(['Recalculate']);
    await host.recalculate([]);
    expect(fake.calculations).toHaveLength(1);
  });

  it('cuts a selection of whole columns to the cells in use', async () => {
    const { fake, host } = await open();
    await fake.type(at('A1:C2'), [
      [1, 2, 3],
      [4, 5, 6],
    ]);
    await fake.select(at('B1:C1'), 'columns');
    expect(await host.selection()).toEqual(at('B1:C2'));
  });

  it('has no selection while something other than one block is selected', async () => {
    const { fake, host } = await open();
    fake.selectionError = 'InvalidSelection';
    expect(await host.selection()).toBeNull();
    fake.selectionError = 'GeneralException';
    await expect(host.selection()).rejects.toMatchObject({ code: 'GeneralException' });
  });

  it('takes its handlers out of Excel when nobody listens any more', async () => {
    const { fake, host } = await open();
    const stops = (['select', 'change', 'calculated', 'activated'] as const).map((name) =>
      host.on(name, () => undefined),
    );
    const second = host.on('change', () => undefined);
    await vi.waitFor(() => {
      expect(fake.handlerCount()).toBe(4);
    });
    for (const stop of stops) stop();
    await vi.waitFor(() => {
      expect(fake.handlerCount()).toBe(1);
    });
    second();
    await vi.waitFor(() => {
      expect(fake.handlerCount()).toBe(0);
    });
  });

  it('tells a change inside its own write from a person’s change after it, without a word from Excel', async () => {
    const { fake, host } = await open();
    fake.saysWhoChanged = false;
    const seen: HostEvent[] = [];
    host.on('change', (event) => seen.push(event));
    await host.apply([{ kind: 'cells', ref: at('A1:A2'), values: [[1], [2]] }], 'own');
    await vi.waitFor(() => {
      expect(seen).toEqual([{ ref: at('A1:A2'), remote: false, own: true }]);
    });
    await fake.type(at('A1'), [[5]]);
    expect(seen.at(-1)).toEqual({ ref: at('A1'), remote: false, own: false });
  });

  it('believes Excel where it says who wrote: a person’s edit right after a step that failed is no own change', async () => {
    const { fake, host } = await open();
    const seen: HostEvent[] = [];
    host.on('change', (event) => seen.push(event));
    fake.failWrite = { at: 'Sheet1!A1', code: 'GeneralException' };
    await expect(host.apply([{ kind: 'cells', ref: at('A1'), values: [[1]] }], 'never')).rejects.toThrow();
    await vi.waitFor(() => {
      expect(seen.length).toBeGreaterThan(0);
    });
    await fake.type(at('A1'), [[5]]);
    expect(seen.at(-1)).toEqual({ ref: at('A1'), remote: false, own: false });
  });

  it('draws a scatter chart of the given series only', async () => {
    const { fake, host } = await open();
    await host.chart(
      {
        title: 'Latent heat',
        xLabel: 'T / °C',
        yLabel: 'ΔH',
        series: [{ label: 'points', x: at('A2:A9'), y: at('B2:B9'), draw: 'points' }],
      },
      at('E2'),
    );
    expect(fake.chartsMade).toEqual([
      {
        at: 'Sheet1!E2',
        series: [{ label: 'points', x: 'Sheet1!A2:A9', y: 'Sheet1!B2:B9' }],
        titles: ['Latent heat', 'T / °C', 'ΔH'],
      },
    ]);
  });

  it('keeps its texts under its own name, and the startup choice with the file', async () => {
    const { fake, host } = await open();
    await host.state('stamp', 'x');
    expect([...fake.settings]).toEqual([['latentry.stamp', 'x']]);
    expect(await host.startup()).toBe(false);
    expect(await host.startup(true)).toBe(true);
    expect(fake.startup).toBe('Load');
  });

  it('takes the decimal separator from Excel', async () => {
    const fake = new FakeExcel(new MemoryWorkbook());
    fake.decimalSeparator = ',';
    const { Excel, Office } = fake.globals();
    vi.stubGlobal('Excel', Excel);
    vi.stubGlobal('Office', Office);
    expect((await excelHost()).locale).toEqual({ decimal: ',', list: ';' });
  });

  it('stops a scan between pieces', async () => {
    const { fake, host } = await open();
    fake.book.addSheet('Other');
    await fake.type(at('A1'), [['=B1*2']]);
    await fake.type({ sheet: 'Other', address: 'A1' }, [['=B1*2']]);
    const control = new AbortController();
    const sheets: string[] = [];
    for await (const block of host.scan(/\*2/, control.signal)) {
      sheets.push(block.ref.sheet);
      control.abort();
    }
    expect(sheets).toEqual(['Sheet1']);
  });
});
