import { describe, expect, it } from 'vitest';
import { planFit, type FitInsert } from '../../../taskpane/plan/planFit';
import type { Change } from '../../../taskpane/port';
import { memoryHost } from '../memoryHost';

const insert: FitInsert = {
  at: { sheet: 'Out', address: 'C2' },
  temperatures: { sheet: 'Run 1', address: 'A1:A9' },
  latents: { sheet: 'Run 1', address: 'B1:B9' },
  settings: 'reference=298.15 K; kind=coexistence',
  table: [
    ['fit', 'value', 'unit'],
    ['slope of latent heat', -2.4, 'kJ/(kg K)'],
  ],
  example: {
    temperature: 25,
    temperatureUnit: 'degC',
    heatUnit: 'kJ/kg',
    latent: 2441.5,
    uncertainty: 0.5,
    settings: '',
  },
};

const cellsAt = (changes: readonly Change[], address: string) =>
  changes.find((change) => change.kind === 'cells' && change.ref.address === address) as
    Extract<Change, { kind: 'cells' }> | undefined;

describe('planFit', () => {
  it('writes one spilling fit with its whole place, and the latent heat from it', () => {
    const changes = planFit(insert, 'formulas');
    expect(cellsAt(changes, 'C3:E4')?.formulas).toEqual([
      [
        `=LATENTRY.FITDELTACP('Run 1'!A1:A9,'Run 1'!B1:B9,,,Latentry_units,"reference=298.15 K; kind=coexistence")`,
        '',
        '',
      ],
      ['', '', ''],
    ]);
    expect(cellsAt(changes, 'C3:E4')?.values).toBeUndefined();
    expect(cellsAt(changes, 'C6:E6')?.values).toEqual([['T / degC', 'ΔH / kJ/kg', 'standard uncertainty']]);
    expect(cellsAt(changes, 'C7')?.values).toEqual([[25]]);
    expect(cellsAt(changes, 'D7:E7')?.formulas).toEqual([['=LATENTRY.FITLATENT(C3:E4,C7,Latentry_units)', '']]);
  });

  it('passes the settings that the example needs, with quotes doubled', () => {
    const changes = planFit(
      { ...insert, settings: 'a="b"', example: { ...insert.example, settings: 'heat=J/g' } },
      'formulas',
    );
    expect(cellsAt(changes, 'C3:E4')?.formulas?.[0]?.[0]).toContain('Latentry_units,"a=""b""")');
    expect(cellsAt(changes, 'D7:E7')?.formulas?.[0]?.[0]).toBe(
      '=LATENTRY.FITLATENT(C3:E4,C7,Latentry_units,"heat=J/g")',
    );
  });

  it('writes no formula at all as values', () => {
    const changes = planFit({ ...insert, example: { ...insert.example, uncertainty: undefined } }, 'values');
    expect(changes.some((change) => change.kind === 'cells' && change.formulas !== undefined)).toBe(false);
    expect(cellsAt(changes, 'C3:E4')?.values).toEqual(insert.table);
    expect(cellsAt(changes, 'D7:E7')?.values).toEqual([[2441.5, '']]);
  });

  it('lets a host see every cell that the spill needs', async () => {
    const host = memoryHost();
    host.book.addSheet('Out');
    expect(await host.check(planFit(insert, 'formulas'))).toEqual([]);
    host.type({ sheet: 'Out', address: 'E4' }, [['mine']]);
    expect(await host.check(planFit(insert, 'formulas'))).toMatchObject([
      { reason: 'occupied', ref: { address: 'E4' } },
    ]);
  });
});
