import { Problem } from '../problem';
import { differenceUnit } from './differenceUnit';
import { kindExamples, kindWords } from './kindWords';
import { plainText } from './plainText';
import { readUnit } from './readUnit';
import type { Unit, UnitKind } from './unit';

const LONGEST_MEMORY = 1000;
const remembered = new Map<string, Unit>();

/**
 * The unit that a text names, in any of its usual spellings: `kJ/(kg K)`, `kJ kg⁻¹ K⁻¹`, `°C`, `bar(g)`.
 *
 * @param text spelling of a unit; case counts only where it tells two units apart
 * @param kind what it must measure; a temperature scale serves as a difference where one is expected
 * @param argument how a refusal names the text
 * @throws Problem `argument` for an unknown unit (with the nearest), an ambiguous one as `cal` or `F` (with the likely
 * spellings), or one that measures something else
 * @source NIST Special Publication 811 (2008), Appendix B; SI Brochure, 9th edition, section 5
 * @example
 * unitOf('kJ kg⁻¹').symbol // => 'kJ/kg'
 * unitOf('Btu_IT/lb').factor // => 2326
 */
export function unitOf(text: string, kind?: UnitKind, argument = 'unit'): Unit {
  const key = `${kind ?? ''}:${text}`;
  const found = remembered.get(key);
  if (found !== undefined) return found;
  const unit = checked(text, kind, argument);
  if (remembered.size >= LONGEST_MEMORY) remembered.clear();
  remembered.set(key, unit);
  return unit;
}

function checked(text: string, kind: UnitKind | undefined, argument: string): Unit {
  const read = readUnit(plainText(text));
  if (read.unit !== undefined) {
    if (kind === undefined || read.unit.kind === kind) return read.unit;
    if (kind === 'difference' && read.unit.kind === 'temperature') return differenceUnit(read.unit);
    throw new Problem({
      code: 'argument',
      argument,
      allowed: `a unit of ${kindWords(kind)}, as ${kindExamples(kind)}`,
      received: `"${text}", a unit of ${kindWords(read.unit.kind)}`,
    });
  }
  const allowed = kind === undefined ? 'a unit' : `a unit of ${kindWords(kind)}, as ${kindExamples(kind)}`;
  if (read.likely !== undefined) {
    throw new Problem({
      code: 'argument',
      argument,
      allowed: read.likely.join(' or '),
      received: `"${text}", which is ambiguous`,
    });
  }
  throw new Problem({
    code: 'argument',
    argument,
    allowed,
    received: `"${text}"`,
    ...(read.nearest === undefined ? {} : { nearest: read.nearest }),
  });
}
