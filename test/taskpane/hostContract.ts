import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { HostFailure } from '../../taskpane/hosts/hostFailure';
import type { Block, Cell, Change, HostError, HostEvent, Ref, WorkbookHost } from '../../taskpane/port';

/** A host and what a person does in the same workbook, outside the port. */
export interface HostHarness {
  readonly host: WorkbookHost;
  select(ref: Ref): void | Promise<void>;
  /** A person types; text that starts with `=` is a formula. */
  type(ref: Ref, cells: readonly (readonly Cell[])[]): void | Promise<void>;
  protect(sheet: string): void | Promise<void>;
  /** Leaves a name of workbook scope without cells behind it. */
  breakName(name: string): void | Promise<void>;
  activate(sheet: string): void | Promise<void>;
  /** Another person's session types, where the host can know of one. */
  typeElsewhere?(ref: Ref, cells: readonly (readonly Cell[])[]): void | Promise<void>;
  /** The note's text on one cell, or null. */
  noteAt(ref: Ref): string | null | Promise<string | null>;
  dispose?(): void | Promise<void>;
}

const data = (address: string): Ref => ({ sheet: 'Data', address });

const start: Change[] = [
  { kind: 'sheet', name: 'Data' },
  { kind: 'sheet', name: 'My notes' },
  {
    kind: 'cells',
    ref: data('A1:B3'),
    values: [
      ['T', 'ΔH'],
      [20, 44.2],
      [25, 43.99],
    ],
  },
];

async function scanned(host: WorkbookHost, formula: RegExp, signal = new AbortController().signal): Promise<Block[]> {
  const blocks: Block[] = [];
  for await (const block of host.scan(formula, signal)) blocks.push(block);
  return blocks;
}

const reasons = (errors: readonly HostError[]) => errors.map((error) => error.reason);

/**
 * What every host must do, whatever lies behind it.
 * `makeHost` gives a workbook in which no sheet is called "Data" or "My notes".
 */
export function describeHostContract(name: string, makeHost: () => Promise<HostHarness>): void {
  describe(`${name} keeps the port's contract`, () => {
    let harness: HostHarness;
    let host: WorkbookHost;
    beforeEach(async () => {
      harness = await makeHost();
      host = harness.host;
      await host.apply(start, 'start');
    });
    afterEach(async () => {
      await harness.dispose?.();
    });

    it('tells what is selected', async () => {
      await harness.select(data('A2:B3'));
      expect(await host.selection()).toEqual(data('A2:B3'));
    });

    it('reads several blocks at once, values and formulas in the shape of each reference', async () => {
      await harness.type(data('D1'), [['=A2*2']]);
      await vi.waitFor(async () => {
        const blocks = await host.read([data('A1:B3'), data('D1:D2'), { sheet: 'My notes', address: 'C5' }]);
        expect(blocks).toEqual([
          {
            ref: data('A1:B3'),
            values: [
              ['T', 'ΔH'],
              [20, 44.2],
              [25, 43.99],
            ],
            formulas: [
              ['', ''],
              ['', ''],
              ['', ''],
            ],
          },
          { ref: data('D1:D2'), values: [[40], [null]], formulas: [['=A2*2'], ['']] },
          { ref: { sheet: 'My notes', address: 'C5' }, values: [[null]], formulas: [['']] },
        ]);
      });
    });

    it('gives addresses back without dollar signs and sheet names as the workbook spells them', async () => {
      const [block] = await host.read([{ sheet: 'data', address: '$B$2' }]);
      expect(block?.ref).toEqual(data('B2'));
    });

    it('keeps numbers, text that looks like a number, truth values and blanks apart', async () => {
      const values: Cell[][] = [[12.5, '12.5', true, null, '1/2', 'TRUE']];
      await host.apply([{ kind: 'cells', ref: data('A10:F10'), values }], 'kinds');
      const [block] = await host.read([data('A10:F10')]);
      expect(block?.values).toEqual(values);
      expect(block?.formulas).toEqual([['', '', '', '', '', '']]);
    });

    it('keeps text that starts with an equals sign as text', async () => {
      await host.apply([{ kind: 'cells', ref: data('A10'), values: [['=A1*2']] }], 'text');
      const [block] = await host.read([data('A10')]);
      expect(block?.values).toEqual([['=A1*2']]);
      expect(block?.formulas).toEqual([['']]);
    });

    it('refuses to read a sheet that is not there and an address that is none', async () => {
      const missing = host.read([{ sheet: 'Nowhere', address: 'A1' }]);
      await expect(missing).rejects.toBeInstanceOf(HostFailure);
      await expect(missing).rejects.toMatchObject({ errors: [{ reason: 'no such sheet' }] });
      await expect(host.read([data('A0')])).rejects.toMatchObject({ errors: [{ reason: 'bad reference' }] });
    });

    it('finds names of the workbook by how they begin, and says which are broken', async () => {
      await host.apply(
        [
          { kind: 'name', name: 'Latentry_units', ref: { sheet: 'My notes', address: 'A2:B12' } },
          { kind: 'name', name: 'Latentry_old', ref: data('A1') },
          { kind: 'name', name: 'Other', ref: data('A1') },
        ],
        'names',
      );
      await harness.breakName('Latentry_old');
      const names = await host.names('Latentry_');
      expect([...names].sort(([a], [b]) => (a < b ? -1 : 1))).toEqual([
        ['Latentry_old', 'broken'],
        ['Latentry_units', { sheet: 'My notes', address: 'A2:B12' }],
      ]);
    });

    it('points a name that is there already at its new cells', async () => {
      await host.apply([{ kind: 'name', name: 'Latentry_units', ref: data('A1') }], 'first');
      await host.apply([{ kind: 'name', name: 'Latentry_units', ref: data('B2:B3') }], 'again');
      expect([...(await host.names('latentry_'))]).toEqual([['Latentry_units', data('B2:B3')]]);
    });

    it('scans for formulas, and yields only blocks that hold one', async () => {
      await harness.type(data('D2'), [['=A2*2']]);
      await harness.type({ sheet: 'My notes', address: 'B7' }, [['=B1*2']]);
      const blocks = await scanned(host, /=A\d\*2/);
      expect(blocks).toHaveLength(1);
      const [block] = blocks;
      expect(block?.ref.sheet).toBe('Data');
      expect(block?.formulas.flat().filter((text) => text !== '')).toEqual(['=A2*2']);
      expect(await scanned(host, /LATENTRY/)).toEqual([]);
    });

    it('scans nothing once the signal is aborted', async () => {
      await harness.type(data('D2'), [['=A2*2']]);
      const control = new AbortController();
      control.abort();
      expect(await scanned(host, /A2/, control.signal)).toEqual([]);
    });

    it('finds nothing in the way of cells that are free or already as wanted', async () => {
      expect(
        await host.check([
          { kind: 'sheet', name: 'Fresh' },
          { kind: 'cells', ref: { sheet: 'Fresh', address: 'A1' }, values: [[1]] },
          { kind: 'cells', ref: data('A2:B2'), values: [[20, 44.2]] },
          { kind: 'cells', ref: data('A1:B1'), format: 'heading' },
        ]),
      ).toEqual([]);
    });

    it('says which cell is occupied, also where a formula would only spill', async () => {
      const errors = await host.check([
        { kind: 'cells', ref: data('C3:C4'), values: [[1], [2]] },
        { kind: 'cells', ref: data('A3:C3'), formulas: [['=A1*2', '', '']] },
      ]);
      expect(errors).toMatchObject([{ reason: 'occupied', ref: data('A3') }]);
    });

    it('says what is protected, missing or no reference', async () => {
      await harness.protect('My notes');
      const errors = await host.check([
        { kind: 'cells', ref: { sheet: 'My notes', address: 'A1' }, values: [[1]] },
        { kind: 'cells', ref: { sheet: 'Nowhere', address: 'A1' }, values: [[1]] },
        { kind: 'cells', ref: data('A0'), values: [[1]] },
        { kind: 'cells', ref: data('F1:F2'), values: [[1]] },
        { kind: 'name', name: 'not a name', ref: data('A1') },
        { kind: 'sheet', name: 'a/b' },
      ]);
      expect(reasons(errors).sort()).toEqual([
        'bad reference',
        'bad reference',
        'bad reference',
        'bad reference',
        'no such sheet',
        'protected',
      ]);
      for (const error of errors) expect(error.text.length).toBeGreaterThan(10);
    });

    it('applies sheets, cells, names and notes in one go', async () => {
      await host.apply(
        [
          { kind: 'sheet', name: 'Fit' },
          { kind: 'cells', ref: { sheet: 'Fit', address: 'A1:B1' }, values: [['slope', null]], format: 'heading' },
          { kind: 'cells', ref: { sheet: 'Fit', address: 'B1' }, formulas: [['=Data!A2*2']] },
          { kind: 'name', name: 'Fit_1', ref: { sheet: 'Fit', address: 'A1:B1' } },
          { kind: 'note', ref: { sheet: 'Fit', address: 'A1' }, text: 'from Data' },
        ],
        'insert fit',
      );
      const [block] = await host.read([{ sheet: 'Fit', address: 'A1:B1' }]);
      expect(block?.formulas).toEqual([['', '=Data!A2*2']]);
      expect(block?.values[0]?.[0]).toBe('slope');
      expect((await host.names('Fit_')).get('Fit_1')).toEqual({ sheet: 'Fit', address: 'A1:B1' });
      expect(await harness.noteAt({ sheet: 'Fit', address: 'A1' })).toBe('from Data');
    });

    it('takes a note away again when its text is empty', async () => {
      await host.apply([{ kind: 'note', ref: data('A1'), text: 'first' }], 'note');
      await host.apply([{ kind: 'note', ref: data('A1'), text: 'second' }], 'note');
      expect(await harness.noteAt(data('A1'))).toBe('second');
      await host.apply([{ kind: 'note', ref: data('A1'), text: '' }], 'note');
      expect(await harness.noteAt(data('A1'))).toBeNull();
    });

    it('leaves cells alone where a change gives neither formula nor values', async () => {
      await host.apply([{ kind: 'cells', ref: data('A2:B2'), formulas: [['', '=A3*2']] }], 'one of two');
      const [block] = await host.read([data('A2:B2')]);
      expect(block?.values[0]?.[0]).toBe(20);
      expect(block?.formulas).toEqual([['', '=A3*2']]);
    });

    it('keeps an existing sheet and its cells when asked to make it', async () => {
      await host.apply([{ kind: 'sheet', name: 'DATA' }], 'again');
      const [block] = await host.read([data('A2')]);
      expect(block?.values).toEqual([[20]]);
    });

    it('changes nothing at all when one change cannot be made', async () => {
      await harness.protect('My notes');
      const changes: Change[] = [
        { kind: 'sheet', name: 'Fit' },
        { kind: 'cells', ref: data('A2'), values: [[99]] },
        { kind: 'name', name: 'Fit_1', ref: data('A1') },
        { kind: 'note', ref: data('A1'), text: 'never' },
        { kind: 'cells', ref: { sheet: 'My notes', address: 'A1' }, values: [[1]] },
      ];
      await expect(host.apply(changes, 'too much')).rejects.toMatchObject({ errors: [{ reason: 'protected' }] });
      const [block] = await host.read([data('A2')]);
      expect(block?.values).toEqual([[20]]);
      expect((await host.names('Fit_')).size).toBe(0);
      expect(await harness.noteAt(data('A1'))).toBeNull();
      await expect(host.read([{ sheet: 'Fit', address: 'A1' }])).rejects.toBeInstanceOf(HostFailure);
    });

    it('tells of changes, and which are its own', async () => {
      const seen: HostEvent[] = [];
      const stop = host.on('change', (event) => seen.push(event));
      await host.apply([{ kind: 'cells', ref: data('A5'), values: [[1]] }], 'own');
      await vi.waitFor(() => {
        expect(seen).toContainEqual({ ref: data('A5'), remote: false, own: true });
      });
      await harness.type(data('A6'), [[2]]);
      await vi.waitFor(() => {
        expect(seen).toContainEqual({ ref: data('A6'), remote: false, own: false });
      });
      if (harness.typeElsewhere !== undefined) {
        await harness.typeElsewhere(data('A7'), [[3]]);
        await vi.waitFor(() => {
          expect(seen).toContainEqual({ ref: data('A7'), remote: true, own: false });
        });
      }
      stop();
      const before = seen.length;
      const other: HostEvent[] = [];
      host.on('change', (event) => other.push(event));
      await harness.type(data('A8'), [[4]]);
      await vi.waitFor(() => {
        expect(other.length).toBeGreaterThan(0);
      });
      expect(seen).toHaveLength(before);
    });

    it('tells of selections and of sheets that come forward', async () => {
      const selections: (Ref | undefined)[] = [];
      const activations: HostEvent[] = [];
      host.on('select', (event) => selections.push(event.ref));
      host.on('activated', (event) => activations.push(event));
      // A host may begin to listen a moment after `on` returns.
      await vi.waitFor(async () => {
        await harness.select(data('B2'));
        expect(selections).toContainEqual(data('B2'));
      });
      await vi.waitFor(async () => {
        await harness.activate('My notes');
        expect(activations.length).toBeGreaterThan(0);
      });
    });

    it('recalculates and tells when that is done', async () => {
      await harness.type(data('D1'), [['=A2*2']]);
      const done: HostEvent[] = [];
      host.on('calculated', (event) => done.push(event));
      await host.recalculate([data('D1')]);
      await vi.waitFor(() => {
        expect(done.length).toBeGreaterThan(0);
      });
    });

    it('keeps a small text in the file', async () => {
      expect(await host.state('stamp')).toBeNull();
      expect(await host.state('stamp', 'abc 1')).toBe('abc 1');
      expect(await host.state('stamp')).toBe('abc 1');
      expect(await host.state('other')).toBeNull();
    });

    it('brings cells into view by selecting them, on any sheet', async () => {
      await host.reveal({ sheet: 'My notes', address: 'C3' });
      await vi.waitFor(async () => {
        expect(await host.selection()).toEqual({ sheet: 'My notes', address: 'C3' });
      });
      await expect(host.reveal({ sheet: 'Nowhere', address: 'A1' })).rejects.toBeInstanceOf(HostFailure);
    });
  });
}
