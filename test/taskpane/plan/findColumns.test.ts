import { describe, expect, it } from 'vitest';
import { findColumns } from '../../../taskpane/plan/findColumns';
import type { Block, Cell } from '../../../taskpane/port';

const block = (address: string, values: Cell[][]): Block => ({
  ref: { sheet: 'Data', address },
  values,
  formulas: values.map((row) => row.map(() => '')),
});

describe('findColumns', () => {
  it('finds temperature and latent heat by their headers, in any order', () => {
    const { columns, parts } = findColumns([
      block('B3:D5', [
        ['run', 'ΔH / kJ mol⁻¹', 'T / °C'],
        ['a', 44.2, 20],
        ['b', 43.99, 25],
      ]),
    ]);
    expect(parts).toEqual({ temperature: 2, latent: 1 });
    expect(columns[1]).toMatchObject({
      ref: { sheet: 'Data', address: 'C3:C5' },
      label: 'C: ΔH / kJ mol⁻¹',
      values: [44.2, 43.99],
      firstRow: 4,
      header: { unit: { symbol: 'kJ/mol' } },
    });
    expect(columns[2]?.header?.unit?.symbol).toBe('degC');
  });

  it('shows uncertainty columns with what they belong to', () => {
    const titles = ['T / K', 'u', 'ΔH / J/g', 'u(ΔH) / J/g'];
    const { parts } = findColumns([block('A1:D2', [titles, [300, 0.01, 2400, 3]])]);
    expect(parts).toEqual({ temperature: 0, uTemperature: 1, latent: 2, uLatent: 3 });
  });

  it('takes columns without headers in order, passing over text', () => {
    const { columns, parts } = findColumns([
      block('A2:E3', [
        [20, 'x', 44.2, 0.1, 0.02],
        [25, 'y', 43.99, 0.1, 0.02],
      ]),
    ]);
    expect(parts).toEqual({ temperature: 0, latent: 2, uLatent: 3, uTemperature: 4 });
    expect(columns[0]).toMatchObject({ label: 'column A', firstRow: 2, values: [20, 25] });
  });

  it('joins ranges that stand apart', () => {
    const { columns, parts } = findColumns([
      block('A1:A2', [['T / °C'], [20]]),
      block('F1:F2', [['latent heat'], [44.2]]),
    ]);
    expect(parts).toEqual({ temperature: 0, latent: 1 });
    expect(columns[1]?.ref.address).toBe('F1:F2');
  });

  it('gives a header that it does not know the part that is left', () => {
    expect(
      findColumns([
        block('A1:B2', [
          ['T / °C', 'mine'],
          [20, 44.2],
        ]),
      ]).parts,
    ).toEqual({ temperature: 0, latent: 1 });
  });

  it('finds nothing where there is nothing', () => {
    expect(
      findColumns([
        block('A1:B2', [
          [null, null],
          [null, null],
        ]),
      ]).parts,
    ).toEqual({});
    expect(findColumns([block('A1', [[5]])]).parts).toEqual({ temperature: 0 });
  });
});
