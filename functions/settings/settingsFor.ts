import { Problem } from '../../core/problem';
import { isHouseBlock } from '../house/isHouseBlock';
import { parseSettingsBlock } from './parseSettingsBlock';
import { parseSettingsText } from './parseSettingsText';
import type { Settings } from './settingsType';

type Rows = readonly (readonly unknown[])[];

interface Remembered {
  readonly base: Settings;
  /** Copies of the parts, since a host may fill the same arrays anew. */
  readonly parts: readonly unknown[];
  readonly settings: Settings;
}

/** How many different sets of settings arguments are remembered for each list of options. */
const LONGEST_MEMORY = 12;
const memory = new WeakMap<readonly string[], Remembered[]>();

/**
 * The settings of one call: every settings argument put onto `base`, from left to right. What the same list of options
 * met before is remembered, compared cell by cell, so that thousands of calls with the same arguments read them once
 * and get the same object.
 *
 * @param parts settings arguments: texts, blocks of one column (settings texts), blocks of two (label and value); blanks
 * and the block of substances don't count
 * @param base settings that hold where the arguments are silent
 * @param allowedOptions option keys of the function; the same array at each call
 * @throws Problem `argument` as `parseSettingsText` and `parseSettingsBlock` do
 */
export function settingsFor(parts: readonly unknown[], base: Settings, allowedOptions: readonly string[]): Settings {
  if (parts.length === 0) return base;
  let met = memory.get(allowedOptions);
  if (met === undefined) memory.set(allowedOptions, (met = []));
  for (let i = 0; i < met.length; i++) {
    const one = met[i] as Remembered;
    if (one.base !== base || !sameParts(one.parts, parts)) continue;
    if (i > 0) {
      met[i] = met[i - 1] as Remembered;
      met[i - 1] = one;
    }
    return one.settings;
  }
  const settings = parts.reduce<Settings>((onto, part) => withPart(onto, part, allowedOptions), base);
  if (met.length >= LONGEST_MEMORY) met.pop();
  met.unshift({ base, parts: parts.map(copied), settings });
  return settings;
}

function withPart(base: Settings, part: unknown, allowedOptions: readonly string[]): Settings {
  if (part === null || part === undefined || part === '' || part === 0) return base;
  if (typeof part === 'string') return parseSettingsText(part, base, allowedOptions);
  if (!isRows(part))
    throw refused(typeof part === 'number' || typeof part === 'boolean' ? String(part) : 'something else');
  if (isHouseBlock(part)) return base;
  if (part.every((row) => row.length === 1)) {
    return part.reduce<Settings>((onto, [cell]) => withPart(onto, cell, allowedOptions), base);
  }
  return parseSettingsBlock(part, base, allowedOptions);
}

function isRows(part: unknown): part is Rows {
  return Array.isArray(part) && part.every(Array.isArray);
}

function refused(received: string): Problem {
  return new Problem({
    code: 'argument',
    argument: 'settings',
    allowed: 'Latentry_units, or a text as "temperature=K; heat=kJ/mol"',
    received,
  });
}

function copied(part: unknown): unknown {
  return Array.isArray(part) ? part.map((row: unknown) => (Array.isArray(row) ? [...(row as unknown[])] : row)) : part;
}

function sameParts(a: readonly unknown[], b: readonly unknown[]): boolean {
  if (a.length !== b.length) return false;
  for (let i = 0; i < a.length; i++) if (!samePart(a[i], b[i])) return false;
  return true;
}

function samePart(a: unknown, b: unknown): boolean {
  return Array.isArray(a) && Array.isArray(b) ? sameRows(a as unknown[][], b as unknown[][]) : a === b;
}

/** Rows may still turn out to be no arrays: then they are compared as they are. */
function sameRows(a: readonly (readonly unknown[])[], b: readonly (readonly unknown[])[]): boolean {
  const rows = a.length;
  if (b.length !== rows) return false;
  for (let r = 0; r < rows; r++) {
    const x = a[r];
    const y = b[r];
    if (!Array.isArray(x) || !Array.isArray(y)) {
      if (x !== y) return false;
      continue;
    }
    const columns = x.length;
    if (y.length !== columns) return false;
    for (let c = 0; c < columns; c++) if (x[c] !== y[c]) return false;
  }
  return true;
}
