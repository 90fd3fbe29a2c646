import { differenceUnit } from './differenceUnit';
import { measureOf } from './dimensions';
import { exactOf, makeUnit } from './makeUnit';
import { ONE, power, times } from './rational';
import { readProduct, type Term } from './readProduct';
import type { Unit } from './unit';

/** A unit, or why a text is none: spellings that are likely meant, or the nearest word. */
export type ReadUnit =
  | { readonly unit: Unit; readonly likely?: undefined; readonly nearest?: undefined }
  | { readonly unit?: undefined; readonly likely: readonly string[]; readonly nearest?: undefined }
  | { readonly unit?: undefined; readonly likely?: undefined; readonly nearest: string | undefined };

const GAUGE = /^(.+?)(?: ?\((gauge|gage|g|absolute|abs|a)\)|[ _](gauge|gage|g|absolute|abs|a))$/i;
/** Written in one word: `psig`, `bara`. */
const ATTACHED_GAUGE = /^(.*(?:psi|bar|pa))([ga])$/i;
const DIFFERENCE = /^(?:(?:Δ|delta) ?(deg ?[CFR]|K)|(deg ?[CFR]|K) (?:difference|diff))$/i;

/** Reads a unit text in plain characters, with `gauge`, `absolute` and `difference` where they belong. */
export function readUnit(plain: string): ReadUnit {
  const difference = DIFFERENCE.exec(plain);
  if (difference !== null) {
    const scale = readWhole(difference[1] ?? difference[2] ?? '');
    return scale.unit === undefined ? scale : { unit: differenceUnit(scale.unit) };
  }
  const gauge = GAUGE.exec(plain) ?? ATTACHED_GAUGE.exec(plain);
  if (gauge !== null) {
    const [, base = '', inBrackets, apart] = gauge;
    const read = readWhole(base);
    const word = inBrackets ?? apart ?? '';
    if (read.unit?.kind === 'pressure') return { unit: /^g/i.test(word) ? gaugeUnit(read.unit) : read.unit };
  }
  return readWhole(plain);
}

function gaugeUnit(unit: Unit): Unit {
  return makeUnit(`${unit.symbol} gauge`, 'pressure', null, exactOf(unit).factor, undefined, true);
}

/** A slash is read strictly; only where that measures nothing, everything after it stands below it. */
function readWhole(plain: string): ReadUnit {
  const strict = readProduct(plain, false);
  if (strict.likely !== undefined) return { likely: strict.likely.flatMap(spelledOut) };
  if (strict.terms === undefined) return strict;
  const unit = unitOfTerms(strict.terms);
  if (unit !== undefined) return { unit };
  const wide = readProduct(plain, true);
  const wideUnit = wide.terms === undefined ? undefined : unitOfTerms(wide.terms);
  return wideUnit === undefined ? { nearest: undefined } : { unit: wideUnit };
}

/** A likely spelling may hold a further ambiguous word, or measure nothing. */
function spelledOut(likely: string): readonly string[] {
  const read = readWhole(likely);
  return read.unit === undefined ? (read.likely ?? []) : [read.unit.symbol];
}

function unitOfTerms(terms: readonly Term[]): Unit | undefined {
  const dimensions = [0, 0, 0, 0, 0];
  let factor = ONE;
  for (const { atom, power: exponent } of terms) {
    atom.dimensions.forEach((d, i) => (dimensions[i] = (dimensions[i] ?? 0) + d * exponent));
    factor = times(factor, power(atom.factor, exponent));
  }
  const measure = measureOf(dimensions.map((d) => d + 0));
  const [first] = terms;
  if (measure === undefined || first === undefined) return undefined;
  if (measure.kind !== 'temperature') return makeUnit(symbolOf(terms), measure.kind, measure.basis, factor);
  if (terms.length > 1) return undefined;
  return makeUnit(first.atom.symbol, 'temperature', null, first.atom.factor, first.atom.offset);
}

/** The one spelling: `kJ/(kg K)`, temperature last; inside a product a degree Celsius is a kelvin. */
function symbolOf(terms: readonly Term[]): string {
  const temperatureLast = [...terms].sort((a, b) => a.atom.dimensions[3] - b.atom.dimensions[3]);
  const side = (sign: 1 | -1): string[] =>
    temperatureLast.filter((t) => t.power * sign > 0 && t.atom.symbol !== '1').map((t) => spelled(t, sign));
  const above = side(1);
  const below = side(-1);
  const top = above.length === 0 ? '1' : above.join(' ');
  if (below.length === 0) return top;
  return `${top}/${below.length === 1 ? below.join('') : `(${below.join(' ')})`}`;
}

function spelled({ atom, power: exponent }: Term, sign: 1 | -1): string {
  const symbol = atom.symbol === 'degC' ? 'K' : atom.symbol;
  return exponent * sign === 1 ? symbol : `${symbol}${exponent * sign}`;
}
