import type { Datum } from '../../core/answer';
import { plainName, refused } from '../../core/catalogue/find';
import { Problem } from '../../core/problem';
import type { Substance } from '../../core/substance';

/** Constants that the trade knows: a substance that lacks one is told apart from a slip of the pen. */
const KNOWN = [
  'molar mass',
  'melting temperature',
  'boiling temperature',
  'sublimation temperature',
  'triple temperature',
  'triple pressure',
  'critical temperature',
  'critical pressure',
  'critical density',
  'acentric factor',
  'curie point temperature',
];

/** `melting point` and `normal boiling temperature` are other words for the temperatures of one atmosphere. */
function itemWords(item: string): string {
  return plainName(item)
    .replace(/^normal/, '')
    .replace(/^freezing/, 'melting')
    .replace(/^(melting|boiling)point$/, '$1temperature')
    .replace(/^molecular(mass|weight)$/, 'molarmass');
}

/** A constant by its full words, where the substance has it. */
export function constantOf(substance: Substance, item: string): Datum | undefined {
  const words = [plainName(item), itemWords(item)];
  return substance.constants.find((datum) => words.includes(plainName(datum.item)));
}

/**
 * Says why there is no such item.
 *
 * @param allowed what the substance has
 * @returns Problem `missing` for a constant that the trade knows, `argument` with the nearest word for any other
 */
export function noSuchItem(substance: Substance, item: string, allowed: readonly string[]): Problem {
  const words = [plainName(item), itemWords(item)];
  const known = KNOWN.find((name) => words.includes(plainName(name)));
  if (known === undefined) return refused('item', item, allowed, [...allowed, ...KNOWN]);
  const where = substance.group === 'house' ? 'not on the Substances sheet' : 'not in the catalogue';
  return new Problem({
    code: 'missing',
    subject: `${known} of ${substance.name}`,
    reason: `${where}${allowed.length === 0 ? '' : `; it has ${allowed.join(', ')}`}`,
  });
}
