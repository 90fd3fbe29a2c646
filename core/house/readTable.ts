import type { Unit } from '../units/unit';
import { cellPairs } from './cellNumbers';
import { monotoneTable } from './monotoneTable';
import { refusal, type Read, type RowReader } from './rowReader';
import type { AreaShape } from './shape';

/** The pairs of a table: temperatures in K, rising, and values as written. Bare temperatures are in the unit of "valid from". */
export function readPoints(reader: RowReader, temperature: Unit | undefined): { x: number[]; y: number[] } {
  return reader.cell('coefficients', () => {
    const pairs = cellPairs(reader.row.cells.coefficients, reader.beside.decimal);
    const { factor, offset } = temperature ?? reader.row.fromUnit;
    const x = pairs.map(([t]) => t * factor + offset);
    if (pairs.length < 2 || !x.every((t, i) => t > (x[i - 1] ?? 0))) {
      throw refusal(`"${reader.text('coefficients')}"`, 'at least two pairs, with temperatures that rise');
    }
    return { x, y: pairs.map(([, value]) => value) };
  });
}

/** A table with monotone interpolation. */
export function readTable(reader: RowReader, scale: number, temperature: Unit | undefined): Read<AreaShape> {
  const { x, y } = readPoints(reader, temperature);
  const values = y.map((value) => value * scale);
  const natural = { fromK: x[0] ?? NaN, toK: x.at(-1) ?? NaN };
  return { shape: monotoneTable(x, values), natural, method: 'table with monotone interpolation' };
}
