import { nearest } from '../nearest';
import { Problem } from '../problem';
import type { Decimal } from '../units/parseNumber';
import { COMPOSITION_PARTS, type Composition } from '../estimate/compositionHeatCapacity';
import type { CompositionPart } from '../estimate/compositionConstants';
import { cellNumbers } from './cellNumbers';

const OTHER_WORDS: Readonly<Record<string, CompositionPart>> = {
  fiber: 'fibre',
  carbohydrates: 'carbohydrate',
  minerals: 'ash',
  moisture: 'water',
  proteins: 'protein',
  fats: 'fat',
};

/**
 * Reads a composition: `water 0.55; protein 0.10; carbohydrate 0.25; fibre 0.06; ash 0.04`, also in percent. The
 * fractions add up to 1 within what their last printed digits leave open; they are then divided by their sum.
 *
 * @throws Problem `argument` for an unknown constituent (with the nearest), one given twice, a fraction outside [0, 1],
 * and a sum that is not 1
 */
export function readComposition(text: string, decimal: Decimal): Composition {
  const parts = text.split(/[;\n]|,(?=\s*[a-z])/i).filter((part) => part.trim() !== '');
  if (parts.length === 0) throw refused('nothing', 'mass fractions, as water 0.6; carbohydrate 0.3; ash 0.1');
  const found: Partial<Record<CompositionPart, number>> = {};
  let sum = 0;
  let rounding = 1e-9;
  for (const part of parts) {
    const [, word = '', number = ''] = /^\s*([a-z]+)\s*[=:]?\s*(.*)$/i.exec(part) ?? [];
    const name = constituent(word, part);
    const [one, more] = number === '' ? [] : cellNumbers(number, decimal);
    if (one === undefined || more !== undefined || (one.unit !== '' && one.unit !== '%')) {
      throw refused(`"${part.trim()}"`, `a mass fraction behind ${name}, as ${name} 0.25 or ${name} 25 %`);
    }
    if (found[name] !== undefined) throw refused(`${name} twice`, 'each constituent once');
    const per = one.unit === '%' ? 0.01 : 1;
    const fraction = one.value * per;
    if (!(fraction >= 0 && fraction <= 1)) throw refused(`"${part.trim()}"`, 'a mass fraction within [0, 1]');
    found[name] = fraction;
    sum += fraction;
    rounding = Math.min(MOST_ROUNDING, rounding + 0.5 * per * lastDigit(number, decimal, per));
  }
  if (Math.abs(sum - 1) > rounding) {
    throw refused(`a sum of ${Number(sum.toPrecision(6))}`, 'mass fractions that add up to 1');
  }
  return Object.fromEntries(Object.entries(found).map(([name, fraction]) => [name, fraction / sum]));
}

function constituent(word: string, part: string): CompositionPart {
  const plain = word.toLowerCase();
  const name = COMPOSITION_PARTS.find((each) => each === plain) ?? OTHER_WORDS[plain];
  if (name !== undefined) return name;
  const close = nearest(plain, COMPOSITION_PARTS);
  throw new Problem({
    code: 'argument',
    argument: 'coefficients',
    allowed: COMPOSITION_PARTS.join(', '),
    received: `"${part.trim()}"`,
    ...(close === undefined ? {} : { nearest: close }),
  });
}

/** However coarsely fractions are printed, more than this is no rounding. */
const MOST_ROUNDING = 0.01;

/** The size of the last printed digit of a number; a whole 0 or 1 is exact, a whole percentage is not. */
function lastDigit(number: string, decimal: Decimal, per: number): number {
  const digits = /[\d.,]+/.exec(number)?.[0] ?? '';
  const at = digits.indexOf(decimal);
  if (at < 0) return per === 1 ? 0 : 1;
  return 10 ** -(digits.length - at - 1);
}

function refused(received: string, allowed: string): Problem {
  return new Problem({ code: 'argument', argument: 'coefficients', allowed, received });
}
