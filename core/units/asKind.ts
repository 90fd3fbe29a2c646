import { differenceUnit } from './differenceUnit';
import type { ReadUnit } from './readUnit';
import { readUnit } from './readUnit';
import type { Unit, UnitKind } from './unit';

/** A unit as one of the expected kind: a temperature scale serves as a difference; `undefined` where it can't. */
export function asKind(unit: Unit, kind: UnitKind | undefined): Unit | undefined {
  if (kind === undefined || unit.kind === kind) return unit;
  return kind === 'difference' && unit.kind === 'temperature' ? differenceUnit(unit) : undefined;
}

/** The likely spellings of an ambiguous text, those of the expected kind only. */
export function likelyOf(read: ReadUnit, kind: UnitKind | undefined): readonly string[] {
  return (read.likely ?? []).filter((spelling) => {
    const { unit } = readUnit(spelling);
    return unit !== undefined && asKind(unit, kind) !== undefined;
  });
}
