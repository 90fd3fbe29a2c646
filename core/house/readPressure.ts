import { shortNumber } from '../problem';
import type { Unit } from '../units/unit';
import { unitOf } from '../units/unitOf';
import type { PressureData } from './materialData';
import { antoineShape, pressureTable, type PressureShape } from './pressureShape';
import type { FormWord } from './readForm';
import { readPoints } from './readTable';
import { refusal, type Read, type RowReader } from './rowReader';

export const PRESSURE_FORMS: readonly FormWord[] = ['Antoine', 'table'];

/** A two-phase line; the unit cell holds the unit of pressure, and that of temperature behind it: `kPa; degC`. */
export function readPressure(reader: RowReader): PressureData {
  const { word, temperature } = reader.form(PRESSURE_FORMS);
  const units = readUnits(reader);
  const scale = temperature ?? units.temperature;
  const read = word === 'table' ? table(reader, units.pressure, scale) : antoine(reader, units.pressure, scale);
  const piece = reader.bounded(read, reader.limits());
  const low = piece.shape.at(piece.fromK);
  reader.checkEnds(piece, (p) => p > 0, 'a pressure above 0 over its range');
  if (piece.shape.at(piece.toK) > low) return piece;
  throw reader.refused('coefficients', `${shortNumber(low)} Pa at both ends`, 'a pressure that rises with temperature');
}

function readUnits(reader: RowReader): { pressure: Unit; temperature: Unit | undefined } {
  return reader.cell('unit', () => {
    const text = reader.text('unit');
    const [p = '', t] = text.split(/[,;]|\s+and\s+/).map((part) => part.trim());
    if (p === '') throw refusal('nothing', 'the units of pressure and of temperature, as kPa; degC');
    const pressure = unitOf(p, 'pressure');
    if (pressure.gauge) throw refusal(`"${text}"`, 'a unit of absolute pressure');
    return { pressure, temperature: t === undefined ? undefined : unitOf(t, 'temperature') };
  });
}

function antoine(reader: RowReader, pressure: Unit, scale: Unit | undefined): Read<PressureShape> {
  if (scale === undefined) {
    const allowed = 'the units of pressure and of temperature, as kPa; degC';
    throw reader.refused('unit', `"${reader.text('unit')}"`, allowed);
  }
  const { fromK } = reader.limits();
  const [a = NaN, b = NaN, c = NaN] = reader.bareNumbers(3, 3, 'A; B; C of log10(p) = A - B/(C + t)');
  if (!(b > 0)) throw reader.refused('coefficients', `B = ${b}`, 'a B above 0');
  const denominator = c + ((fromK ?? Infinity) - scale.offset) / scale.factor;
  if (!(denominator > 0)) {
    throw reader.refused('coefficients', `C + t = ${shortNumber(denominator)}`, 'C + t above 0 at "valid from"');
  }
  const method = `Antoine, log10(p/${pressure.symbol}) and t in ${scale.symbol}`;
  return { shape: antoineShape(a, b, c, pressure.factor, scale), natural: undefined, method };
}

function table(reader: RowReader, pressure: Unit, scale: Unit | undefined): Read<PressureShape> {
  const { x, y } = readPoints(reader, scale);
  if (!y.every((p, i) => p > (y[i - 1] ?? 0))) {
    throw reader.refused(
      'coefficients',
      `"${reader.text('coefficients')}"`,
      'pressures above 0 that rise with temperature',
    );
  }
  const pressures = y.map((p) => p * pressure.factor);
  return {
    shape: pressureTable(x, pressures),
    natural: { fromK: x[0] ?? NaN, toK: x.at(-1) ?? NaN },
    method: 'table, interpolated monotonically as ln p against 1/T',
  };
}
