import { Problem } from '../problem';
import { likelyOf } from './asKind';
import { kindExamples, kindWords } from './kindWords';
import { parseNumber, type Decimal } from './parseNumber';
import { plainText } from './plainText';
import { readUnit } from './readUnit';
import type { Unit, UnitKind } from './unit';
import { unitOf } from './unitOf';

/** The settings that the reading of a quantity depends on. */
export interface QuantitySettings {
  readonly decimal: Decimal;
  /** Pressure that gauge pressures are counted from, Pa. */
  readonly barometerPa: number;
}

/** A value in SI (of the unit's own basis: J/kg for `kJ/kg`, J/mol for `kJ/mol`) and the unit it was written in. */
export interface Quantity {
  readonly si: number;
  readonly unit: Unit;
}

/**
 * Reads a number with its unit: `140 degF`, `−20 °C`, `3 bar gauge`, `1.5e3 Pa`.
 *
 * SI = factor · x + offset, and for gauge pressures + barometer.
 *
 * @param text number and unit; only a share may stand without one
 * @param kind what is expected; a temperature difference may be written in K, degC or degF
 * @param settings decimal separator and barometer in force
 * @param argument how a refusal names the quantity
 * @returns the SI value and the unit
 * @throws Problem `argument` for a text that is no number with a unit of this kind, for an ambiguous number or unit (with
 * the likely spellings), for a temperature at or below absolute zero and for a negative absolute pressure
 * @source NIST Special Publication 811 (2008), Appendix B
 * @example
 * parseQuantity('3 bar gauge', 'pressure', { decimal: '.', barometerPa: 101325 }).si // => 401325
 */
export function parseQuantity(
  text: string,
  kind: UnitKind,
  settings: QuantitySettings,
  argument: string = kindWords(kind),
): Quantity {
  const plain = plainText(text);
  const number = parseNumber(plain, settings.decimal);
  if (number === undefined) throw refused(argument, text, expected(kind));
  if (number.value === undefined) {
    throw refused(argument, text, number.likely.length === 0 ? expected(kind) : number.likely.join(' or '));
  }
  const unit = unitIn(number.rest, text, kind, argument);
  const si = number.value * unit.factor + unit.offset + (unit.gauge ? settings.barometerPa : 0);
  if (!Number.isFinite(si)) throw refused(argument, text, 'a finite number');
  if (kind === 'temperature' && si <= 0) throw refused(argument, text, 'a temperature above absolute zero, 0 K');
  if (kind === 'pressure' && si < 0) throw refused(argument, text, 'an absolute pressure of at least 0 Pa');
  return { si, unit };
}

function unitIn(rest: string, text: string, kind: UnitKind, argument: string): Unit {
  if (rest === '') {
    if (kind === 'share') return unitOf('1', kind);
    throw refused(argument, text, expected(kind));
  }
  try {
    return unitOf(rest, kind, argument);
  } catch (thrown) {
    const likely = likelyOf(readUnit(rest), kind);
    if (likely.length === 0) throw thrown;
    const number = plainText(text).slice(0, -rest.length);
    throw refused(argument, text, likely.map((unit) => `${number}${unit}`).join(' or '));
  }
}

function expected(kind: UnitKind): string {
  return `a number with a unit of ${kindWords(kind)}, as ${kindExamples(kind)}`;
}

function refused(argument: string, text: string, allowed: string): Problem {
  return new Problem({ code: 'argument', argument, allowed, received: `"${text}"` });
}
