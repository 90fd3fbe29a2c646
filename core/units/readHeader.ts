import { Problem } from '../problem';
import { likelyOf } from './asKind';
import { differenceUnit } from './differenceUnit';
import { headerRole, roleOfKind, uncertaintyOf, type ColumnRole } from './headerRole';
import { plainText } from './plainText';
import { readUnit } from './readUnit';
import type { Unit } from './unit';

/** What the header of a data column says. */
export interface Header {
  /** The symbol or name before the unit, in plain characters: `T`, `ΔvapH`, `u(ΔH)`. */
  readonly name: string;
  readonly unit: Unit | undefined;
  /** Why the text in the place of the unit is none that can be used, as `cal/mol`. */
  readonly unread: Problem | undefined;
  readonly role: ColumnRole | 'uncertainty';
  /** What an uncertainty belongs to. */
  readonly of: ColumnRole | undefined;
  /** Coverage factor of an uncertainty: 1 for a standard one, as stated for an expanded one, else unknown. */
  readonly coverage: number | undefined;
}

const COVERAGE = /[([]? ?\bk ?= ?(\d+(?:[.,]\d+)?) ?[)\]]?/;

/**
 * Reads the header of a data column: `T / °C`, `ΔH (kJ mol⁻¹)`, `Temperature, degF`, `u(ΔH) / kJ/mol`, `U (k=2) [J/g]`.
 *
 * @param text the header as it stands in the cell
 * @returns name, unit, a guess of the column's role, and for uncertainties what they belong to and their coverage factor
 * @source notation "quantity / unit": SI Brochure, 9th edition, section 5.4.1; u and U: JCGM 100:2008
 * @example
 * readHeader('ΔvapH / kJ·mol−1').unit?.symbol // => 'kJ/mol'
 */
export function readHeader(text: string): Header {
  const plain = plainText(text);
  const stated = COVERAGE.exec(plain);
  const { name, unitText } = split(
    stated === null ? plain : plain.replace(stated[0], ' ').replace(/,? +/g, ' ').trim(),
  );
  const read = unitText === undefined ? undefined : readUnit(unitText);
  const uncertain = uncertaintyOf(name);
  const natural = read?.unit;
  const unit = uncertain !== undefined && natural?.kind === 'temperature' ? differenceUnit(natural) : natural;
  const byUnit = unit === undefined ? 'unknown' : roleOfKind(unit.kind);
  const unread =
    read === undefined || read.unit !== undefined || unitText === undefined ? undefined : unreadUnit(unitText);
  if (uncertain === undefined) {
    const role = unit === undefined || headerRole(name) === byUnit ? headerRole(name) : byUnit;
    return { name, unit, unread, role, of: undefined, coverage: undefined };
  }
  const of = uncertain.of === 'unknown' ? byUnit : uncertain.of;
  const coverage = stated === null ? uncertain.coverage : Number((stated[1] ?? '').replace(',', '.'));
  return { name, unit, unread, role: 'uncertainty', of, coverage };
}

function unreadUnit(unitText: string): Problem {
  const likely = likelyOf(readUnit(unitText), undefined);
  return new Problem({
    code: 'argument',
    argument: 'unit in a header',
    allowed: likely.length > 0 ? likely.join(' or ') : 'a unit, as kJ/kg, degC, kPa',
    received: `"${unitText}"`,
  });
}

interface Split {
  readonly name: string;
  readonly unitText?: string;
}

/** Parts name and unit: brackets at the end, a blank, a slash, a comma, the word "in", or a unit alone. */
function split(plain: string): Split {
  const inBrackets = bracketed(plain);
  if (inBrackets === undefined) return loose(plain) ?? alone(plain) ?? { name: plain };
  if (inBrackets.unitText !== undefined && isUnitLike(inBrackets.unitText)) return inBrackets;
  // The brackets may hold a remark behind the unit.
  return loose(inBrackets.name) ?? inBrackets;
}

function loose(plain: string): Split | undefined {
  return spaced(plain) ?? parted(plain, /\/|, ?| in /g);
}

/** `name [unit]`; in `u(T)` the brackets hold the quantity, not the unit. */
function bracketed(plain: string): Split | undefined {
  const close = plain.at(-1);
  if (close !== ')' && close !== ']') return undefined;
  let depth = 0;
  for (let i = plain.length - 1; i >= 0; i--) {
    const c = plain[i];
    if (c === ')' || c === ']') depth++;
    if (c !== '(' && c !== '[') continue;
    if (--depth > 0) continue;
    const name = plain.slice(0, i).trim();
    const unitText = plain.slice(i + 1, -1).trim();
    // kJ/(mol K) after a slash: the brackets belong to the unit.
    if (name === '' || /[/*^]$/.test(name)) return undefined;
    const quantity =
      c === '(' && plain[i - 1] !== ' ' && headerRole(unitText) !== 'unknown' && uncertaintyOf(name) !== undefined;
    return quantity ? undefined : { name, unitText };
  }
  return undefined;
}

/** At the first separator that leaves a unit, or something ambiguous, on its right. */
function parted(plain: string, separator: RegExp): Split | undefined {
  for (const match of plain.matchAll(separator)) {
    const name = plain.slice(0, match.index).trim();
    const unitText = plain.slice(match.index + match[0].length).trim();
    if (name !== '' && unitText !== '' && !isUnit(plain) && isUnitLike(unitText))
      return { name, unitText: unbracketed(unitText) };
  }
  return undefined;
}

/** `Temperature degC`: without a separator the unit must fit the name. */
function spaced(plain: string): Split | undefined {
  for (const match of plain.matchAll(/ /g)) {
    const name = plain.slice(0, match.index).trim();
    if (/[,:;/]$| in$/.test(name)) continue;
    const unitText = plain.slice(match.index + 1).trim();
    const { unit } = readUnit(unitText);
    const role = uncertaintyOf(name)?.of ?? headerRole(name);
    if (unit !== undefined && role !== 'unknown' && roleOfKind(unit.kind) === role) return { name, unitText };
  }
  return undefined;
}

/** A header that is nothing but a unit; single letters other than K are symbols rather than units. */
function alone(plain: string): Split | undefined {
  if ((plain.length === 1 && plain !== 'K') || headerRole(plain) !== 'unknown' || !isUnit(plain)) return undefined;
  return { name: '', unitText: plain };
}

function isUnit(text: string): boolean {
  return readUnit(text).unit !== undefined;
}

function isUnitLike(text: string): boolean {
  const read = readUnit(unbracketed(text));
  return read.unit !== undefined || (read.likely ?? []).length > 0;
}

function unbracketed(text: string): string {
  const inside = /^[([]([^()[\]]*)[)\]]$/.exec(text);
  return inside?.[1] ?? text;
}
