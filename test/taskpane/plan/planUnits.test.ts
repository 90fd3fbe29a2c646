import { describe, expect, it } from 'vitest';
import { DEFAULT_SETTINGS, parseSettingsBlock, settingsRows } from '../../../functions/settings/settings';
import { planUnits } from '../../../taskpane/plan/planUnits';
import { planUnitsAnew } from '../../../taskpane/plan/planUnitsAnew';
import type { Block, Cell } from '../../../taskpane/port';
import { memoryHost } from '../memoryHost';

const rows = settingsRows(DEFAULT_SETTINGS);
const withHeat = (heat: string) => rows.map(([label, value]) => [label, label === 'Heat' ? heat : value] as const);

const block = (address: string, values: Cell[][]): Block => ({
  ref: { sheet: 'Units', address },
  values,
  formulas: values.map((row) => row.map(() => '')),
});

describe('planUnits', () => {
  it('makes sheet, block and name where there are none, and the settings read back', async () => {
    const host = memoryHost();
    await host.apply(planUnits([], withHeat('kJ/mol')), 'Units');
    const ref = (await host.names('Latentry_units')).get('Latentry_units');
    if (ref === undefined || ref === 'broken') throw new Error('the name leads nowhere');
    const [made] = await host.read([ref]);
    expect(parseSettingsBlock(made?.values ?? [], DEFAULT_SETTINGS).units.heat.symbol).toBe('kJ/mol');
    expect(made?.values).toHaveLength(rows.length);
  });

  it('rewrites only the value cells that differ', () => {
    expect(
      planUnits(
        [
          block(
            'B4:C14',
            rows.map((row) => [...row]),
          ),
        ],
        withHeat('J/g'),
      ),
    ).toEqual([{ kind: 'cells', ref: { sheet: 'Units', address: 'C7' }, values: [['J/g']] }]);
    expect(
      planUnits(
        [
          block(
            'B4:C14',
            rows.map((row) => [...row]),
          ),
        ],
        rows,
      ),
    ).toEqual([]);
  });

  it('finds rows by label in any order and spelling', () => {
    const swapped = [
      ['heat_capacity', 'J/(g K)'],
      ['HEAT', 'kJ/kg'],
      ...rows.filter(([label]) => !label.startsWith('Heat')),
    ];
    expect(planUnits([block('A1:B11', swapped)], withHeat('J/g'))).toEqual(
      [
        { kind: 'cells', ref: { sheet: 'Units', address: 'B1' }, values: [['kJ/(kg K)']] },
        { kind: 'cells', ref: { sheet: 'Units', address: 'B2' }, values: [['J/g']] },
      ].sort((a, b) => (a.ref.address < b.ref.address ? 1 : -1)),
    );
  });

  it('adds a missing setting only when it is not the default, in a blank row first', () => {
    const short = rows.filter(([label]) => label !== 'Heat');
    expect(
      planUnits(
        [
          block(
            'A1:B10',
            short.map((row) => [...row]),
          ),
        ],
        rows,
      ),
    ).toEqual([]);
    const gap = [...short.map((row) => [...row]), [null, null]];
    expect(planUnits([block('A1:B11', gap)], withHeat('J/g'))).toEqual([
      { kind: 'cells', ref: { sheet: 'Units', address: 'A11:B11' }, values: [['Heat', 'J/g']] },
    ]);
    expect(
      planUnits(
        [
          block(
            'A1:B10',
            short.map((row) => [...row]),
          ),
        ],
        withHeat('J/g'),
      ),
    ).toEqual([
      { kind: 'cells', ref: { sheet: 'Units', address: 'A11:B11' }, values: [['Heat', 'J/g']] },
      { kind: 'name', name: 'Latentry_units', ref: { sheet: 'Units', address: 'A1:B11' } },
    ]);
  });

  it('writes over an error value and a number', () => {
    const broken: Cell[][] = rows.map(([label, value]) => [label, label === 'Heat' ? { error: '#REF!' } : value]);
    expect(planUnits([block('A1:B11', broken)], rows)).toEqual([
      { kind: 'cells', ref: { sheet: 'Units', address: 'B4' }, values: [['kJ/kg']] },
    ]);
  });
});

describe('planUnitsAnew', () => {
  it('writes every label and value and empties the rest of the block', () => {
    const values: Cell[][] = Array.from({ length: 13 }, () => ['what', 'ever']);
    const [cells, name] = planUnitsAnew(block('C2:D14', values), rows);
    if (cells?.kind !== 'cells') throw new Error('cells first');
    expect(cells.ref.address).toBe('C2:D14');
    expect(parseSettingsBlock(cells.values ?? [], DEFAULT_SETTINGS)).toEqual(DEFAULT_SETTINGS);
    expect(cells.values?.at(-1)).toEqual([null, null]);
    expect(name).toEqual({ kind: 'name', name: 'Latentry_units', ref: { sheet: 'Units', address: 'C2:D14' } });
  });

  it('covers labels that are missing', () => {
    expect(
      planUnitsAnew(
        block('A1:B2', [
          ['x', 'y'],
          ['z', ''],
        ]),
        rows,
      )[1],
    ).toMatchObject({ ref: { address: 'A1:B11' } });
  });
});
