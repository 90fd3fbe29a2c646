import { shortNumber } from '../problem';
import type { Unit } from '../units/unit';
import { unitOf } from '../units/unitOf';
import type { CellNumber } from './cellNumbers';
import { majerSvobodaShape } from './majerSvobodaShape';
import type { HeatData } from './materialData';
import type { FormWord } from './readForm';
import { readPolynomial } from './readPolynomial';
import { readTable } from './readTable';
import { refusal, type Read, type RowReader } from './rowReader';
import type { Shape } from './shape';
import { watsonShape } from './watsonShape';

export const HEAT_FORMS: readonly FormWord[] = ['constant', 'polynomial', 'table', 'Watson', 'Majer-Svoboda'];

/** Equations of the heat of vaporization are not made for temperatures below about this part of the critical one. */
const COLDEST_REDUCED = 0.3;

/** A heat of transition. A constant without a range is a value at the transition temperature only. */
export function readHeat(reader: RowReader): HeatData {
  const { word, temperature } = reader.form(HEAT_FORMS);
  const scale = reader.perAmount('heat');
  const limits = reader.limits();
  const read = readShape(reader, word, scale, temperature);
  if (word === 'constant' && limits.fromK === undefined && limits.toK === undefined) {
    const evidence = reader.evidence('one value, at the transition temperature', []);
    reader.checkEnds({ shape: read.shape, fromK: 1, toK: 1 }, (heat) => heat > 0, 'a heat above 0');
    return { shape: read.shape, single: true, fromK: NaN, toK: NaN, ...evidence };
  }
  const piece = reader.bounded(read, limits);
  reader.checkEnds(piece, (heat) => heat >= 0, 'a heat of at least 0 over its range');
  return { ...piece, single: false };
}

function readShape(reader: RowReader, word: FormWord, scale: number, temperature: Unit | undefined): Read<Shape> {
  switch (word) {
    case 'Watson':
      return reader.cell('coefficients', () => watson(reader, scale, temperature));
    case 'Majer-Svoboda':
      return reader.cell('coefficients', () => majerSvoboda(reader, scale, temperature));
    case 'table':
      return readTable(reader, scale, temperature);
    default:
      return readPolynomial(reader, scale, temperature);
  }
}

function criticalOf(reader: RowReader, given: CellNumber | undefined, bare: Unit, allowed: string): number {
  const criticalK = given === undefined ? reader.beside.criticalK() : reader.si(given, 'temperature', bare);
  if (criticalK === undefined) throw refusal('no critical temperature', `${allowed}, or a row for the last`);
  return criticalK;
}

function watson(reader: RowReader, scale: number, temperature: Unit | undefined): Read<Shape> {
  const allowed = 'heat; its temperature; critical temperature';
  const [heat, at, critical, exponent] = reader.numbers(2, 4, `${allowed}; exponent`);
  const bare = temperature ?? unitOf('K', 'temperature');
  const atK = at === undefined ? NaN : reader.si(at, 'temperature', bare);
  const criticalK = criticalOf(reader, critical, bare, allowed);
  if (!(atK < criticalK)) {
    throw refusal(`${shortNumber(atK)} K`, `a temperature below the critical one, ${shortNumber(criticalK)} K`);
  }
  const n = exponent?.value;
  if (n !== undefined && !(n > 0 && n < 1)) throw refusal(`exponent ${n}`, 'an exponent within (0, 1)');
  return {
    shape: watsonShape((heat?.value ?? NaN) * scale, atK, criticalK, n),
    natural: { fromK: COLDEST_REDUCED * criticalK, toK: criticalK },
    method: `Watson from one value at ${shortNumber(atK)} K`,
  };
}

function majerSvoboda(reader: RowReader, scale: number, temperature: Unit | undefined): Read<Shape> {
  const allowed = 'A; alpha; beta; critical temperature';
  const [a, alpha, beta, critical] = reader.numbers(3, 4, allowed);
  const criticalK = criticalOf(reader, critical, temperature ?? unitOf('K', 'temperature'), allowed);
  return {
    shape: majerSvobodaShape((a?.value ?? NaN) * scale, alpha?.value ?? NaN, beta?.value ?? NaN, criticalK),
    natural: { fromK: COLDEST_REDUCED * criticalK, toK: criticalK },
    method: 'Majer and Svoboda',
  };
}
