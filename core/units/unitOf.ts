import { Problem } from '../problem';
import { asKind, likelyOf } from './asKind';
import { kindExamples, kindWords } from './kindWords';
import { plainText } from './plainText';
import { readUnit } from './readUnit';
import type { Unit, UnitKind } from './unit';

const LONGEST_MEMORY = 1000;
const remembered = new Map<UnitKind | undefined, Map<string, Unit>>();

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
  let units = remembered.get(kind);
  if (units === undefined) remembered.set(kind, (units = new Map<string, Unit>()));
  const found = units.get(text);
  if (found !== undefined) return found;
  const unit = checked(text, kind, argument);
  if (units.size >= LONGEST_MEMORY) units.clear();
  units.set(text, unit);
  return unit;
}

function checked(text: string, kind: UnitKind | undefined, argument: string): Unit {
  const read = readUnit(plainText(text));
  if (read.unit !== undefined) {
    const unit = asKind(read.unit, kind);
    if (unit !== undefined) return unit;
    throw new Problem({
      code: 'argument',
      argument,
      allowed: unitsOf(kind),
      received: `"${text}", a unit of ${kindWords(read.unit.kind)}`,
    });
  }
  const likely = likelyOf(read, kind);
  throw new Problem({
    code: 'argument',
    argument,
    allowed: likely.length > 0 ? likely.join(' or ') : unitsOf(kind),
    received: likely.length > 0 ? `"${text}", which is ambiguous` : `"${text}"`,
    ...(read.nearest === undefined ? {} : { nearest: read.nearest }),
  });
}

function unitsOf(kind: UnitKind | undefined): string {
  return kind === undefined ? 'a unit, as kJ/kg, degC, kPa' : `a unit of ${kindWords(kind)}, as ${kindExamples(kind)}`;
}
