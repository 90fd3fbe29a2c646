import { Problem } from '../../core/problem';
import { asKind } from '../../core/units/asKind';
import { findAtom } from '../../core/units/atoms';
import { measureOf } from '../../core/units/dimensions';
import { kindWords } from '../../core/units/kindWords';
import { exactOf, makeUnit } from '../../core/units/makeUnit';
import { plainText } from '../../core/units/plainText';
import { readUnit } from '../../core/units/readUnit';
import type { Rational } from '../../core/units/rational';
import type { Unit, UnitKind } from '../../core/units/unit';
import { unitOf } from '../../core/units/unitOf';
import { SETTINGS } from './schema';

/** Volumes that the unit language knows in one country's size only. */
const CUSTOMARY =
  /\b(?:minim|fluiddram|fluidounce|floz|gill|cup|cp|pint|pt|quart|qt|barrel|obl|bbl|hogshead|teaspoon|tablespoon|drop|gtt)s?\b/i;
const LONGEST_TEXT = 80;

/**
 * The unit that a free text names: everything that `unitOf` reads, and beyond it long names, any decimal prefix and any
 * product that the unit language knows, as `kilojoule per kilogram` or `erg/(g K)`. The language is loaded when first
 * needed.
 *
 * @param text spelling of a unit
 * @param kind what it must measure
 * @returns the unit; its symbol is one that `unitOf` reads wherever a usual unit has exactly the same size, else the text
 * @throws Problem `argument` as `unitOf` does
 * @example
 * (await freeUnit('kilojoule per kilogram')).symbol // => 'kJ/kg'
 */
export async function freeUnit(text: string, kind?: UnitKind): Promise<Unit> {
  const plain = plainText(text);
  if (readUnit(plain).unit !== undefined || isUnclear(plain) || plain.length > LONGEST_TEXT) return unitOf(text, kind);
  const { readUnitLanguage } = await import('./unitLanguage');
  let read;
  try {
    read = readUnitLanguage(inLanguage(plain));
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error;
    return unitOf(text, kind);
  }
  const measure = measureOf(read.dimensions);
  if (measure === undefined || CUSTOMARY.test(plain) || read.factor.n <= 0n) return unitOf(text, kind);
  const unit =
    usualUnit(measure.kind, measure.basis, read.factor, read.offset) ??
    makeUnit(plain, measure.kind, measure.basis, read.factor, read.offset);
  const asked = asKind(unit, kind);
  if (asked !== undefined) return asked;
  throw new Problem({
    code: 'argument',
    argument: 'unit',
    allowed: kind === undefined ? 'a unit' : `a unit of ${kindWords(kind)}`,
    received: `"${text}", a unit of ${kindWords(unit.kind)}`,
  });
}

/** A word that names more than one unit stays refused, whatever the language takes it for. */
function isUnclear(plain: string): boolean {
  return (plain.match(/[A-Za-z_]+/g) ?? []).some((word) => findAtom(word).likely !== undefined);
}

function inLanguage(plain: string): string {
  return plain
    .replace(/\bper\b/gi, '/')
    .replace(/([A-Za-z])([+-]?[1-9])(?![\dA-Za-z])/g, '$1^$2')
    .replace(/\^\(([+-]?\d)\)/g, '^$1');
}

function usualUnit(kind: UnitKind, basis: Unit['basis'], factor: Rational, offset: Rational): Unit | undefined {
  const same = (a: Rational, b: Rational): boolean => a.n * b.d === b.n * a.d;
  for (const { unit: setting, choices } of SETTINGS) {
    if (setting !== kind) continue;
    for (const choice of choices) {
      const unit = unitOf(choice, kind);
      const exact = exactOf(unit);
      if (unit.basis === basis && !unit.gauge && same(exact.factor, factor) && same(exact.offset, offset)) return unit;
    }
  }
  return undefined;
}
