import { nearest } from '../../core/nearest';
import { Problem } from '../../core/problem';
import type { Decimal } from '../../core/units/parseNumber';
import { parseQuantity } from '../../core/units/parseQuantity';
import { unitOf } from '../../core/units/unitOf';
import { SETTINGS, plainKey, type SettingRow } from './schema';
import type { Settings } from './settingsType';

/** One setting as it was written. `where` is how a refusal names it. */
export interface Entry {
  readonly key: string;
  readonly value: string;
  readonly where: string;
}

const rowsByKey = new Map<string, SettingRow>();
for (const row of SETTINGS) {
  rowsByKey.set(plainKey(row.key), row);
  rowsByKey.set(plainKey(row.label), row);
}

/**
 * Puts entries onto settings. The decimal separator is read first, since the barometer's number depends on it.
 *
 * @throws Problem `argument` for a key that is unknown (with the nearest) or given twice, and for a value that can't be read
 */
export function withEntries(base: Settings, entries: readonly Entry[], allowedOptions: readonly string[]): Settings {
  const units = { ...base.units };
  const options = { ...base.options };
  const seen = new Set<string>();
  const found = entries.map((entry) => {
    const plain = plainKey(entry.key);
    const row = rowsByKey.get(plain);
    const option = row === undefined ? allowedOptions.find((name) => plainKey(name) === plain) : undefined;
    const name = row?.key ?? option;
    if (name === undefined) throw unknownKey(entry, allowedOptions);
    if (seen.has(name)) throw refused(entry, `${name} once only`, `it a second time, as "${entry.value}"`);
    if (entry.value === '') throw refused(entry, allowedFor(row), 'nothing');
    seen.add(name);
    return { entry, row, name };
  });
  const decimalEntry = found.find(({ row }) => row?.kind === 'decimal')?.entry;
  const decimal = decimalEntry === undefined ? base.decimal : decimalOf(decimalEntry);
  let { barometerPa, outOfRange } = base;
  for (const { entry, row, name } of found) {
    if (row === undefined) options[name] = entry.value;
    else if (row.unit !== undefined) units[row.unit] = unitOf(entry.value, row.unit, entry.where);
    else if (row.kind === 'barometer') barometerPa = barometerOf(entry, decimal);
    else if (row.kind === 'outOfRange') outOfRange = policyOf(entry);
  }
  return Object.freeze({
    units: Object.freeze(units),
    barometerPa,
    outOfRange,
    decimal,
    options: Object.freeze(options),
  });
}

function barometerOf(entry: Entry, decimal: Decimal): number {
  const { si, unit } = parseQuantity(entry.value, 'pressure', { decimal, barometerPa: 0 }, entry.where);
  if (unit.gauge || si <= 0)
    throw refused(entry, 'an absolute pressure above 0 Pa, as 101.325 kPa', `"${entry.value}"`);
  return si;
}

function policyOf(entry: Entry): Settings['outOfRange'] {
  const word = entry.value.toLowerCase();
  if (word === 'refuse' || word === 'extend') return word;
  throw refused(entry, 'refuse or extend', `"${entry.value}"`, nearest(word, ['refuse', 'extend']));
}

const DECIMAL_WORDS: ReadonlyMap<string, Decimal> = new Map([
  ['.', '.'],
  ['point', '.'],
  [',', ','],
  ['comma', ','],
]);

function decimalOf(entry: Entry): Decimal {
  const decimal = DECIMAL_WORDS.get(entry.value.toLowerCase());
  if (decimal !== undefined) return decimal;
  throw refused(entry, '. or ,', `"${entry.value}"`);
}

function allowedFor(row: SettingRow | undefined): string {
  if (row === undefined) return 'a value';
  return row.choices.length === 0 ? `a value, as ${row.default}` : `a value, as ${row.choices.slice(0, 4).join(', ')}`;
}

function unknownKey(entry: Entry, allowedOptions: readonly string[]): Problem {
  const keys = [...SETTINGS.map((row) => row.key), ...allowedOptions];
  const close = nearest(plainKey(entry.key), keys.map(plainKey));
  const name = keys.find((key) => plainKey(key) === close);
  return refused(entry, keys.join(', '), `the key "${entry.key}"`, name);
}

function refused(entry: Entry, allowed: string, received: string, close?: string): Problem {
  return new Problem({
    code: 'argument',
    argument: entry.where,
    allowed,
    received,
    ...(close === undefined ? {} : { nearest: close }),
  });
}
