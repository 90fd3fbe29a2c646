import type { Answer, Datum } from '../core/answer';
import { answer } from './edge/answer';
import { constantOf, noSuchItem } from './edge/constantOf';
import { substanceKey, textKey } from './edge/keys';
import { onScale } from './edge/scale';
import type { CellwiseSpec, Key, Plan } from './edge/spec';
import type { Settings } from './settings/settings';

const spec: CellwiseSpec = {
  family: 'cellwise',
  name: 'CONSTANT',
  args: [
    { name: 'substance', kind: 'key' },
    { name: 'item', kind: 'key' },
  ],
  options: [],
  plan,
};

function plan(keys: readonly Key[], settings: Settings): Plan {
  const substance = substanceKey(keys[0]);
  const item = textKey('item', keys[1]);
  const datum = constantOf(substance, item);
  if (datum === undefined) {
    throw noSuchItem(
      substance,
      item,
      substance.constants.map((known) => known.item),
    );
  }
  const { scale, offset } = cellScale(datum, settings);
  return {
    compute: () => datum.value * scale + offset,
    record: () => recordOf(datum),
    rangeWords: 'no range: one value',
    toCell: (si) => si * scale + offset,
    toCellDifference: (si) => si * scale,
  };
}

function cellScale(datum: Datum, settings: Settings): { scale: number; offset: number } {
  if (datum.unit === 'K') return onScale(settings.units.temperature, settings);
  if (datum.unit === 'Pa') return onScale(settings.units.pressure, settings);
  if (datum.unit === 'kg/mol') return { scale: 1000, offset: 0 };
  return { scale: 1, offset: 0 };
}

function recordOf(datum: Datum): Answer {
  return {
    value: datum.value,
    unit: datum.unit,
    uncertainty: datum.uncertainty,
    method: 'published constant',
    sources: [datum.source],
    range: { axis: 'temperature', from: datum.value, to: datum.value },
    marks: datum.confirmed ? [] : [{ code: 'unconfirmed', text: 'no second source confirms this number' }],
  };
}

/**
 * A constant of a substance: molar mass (g/mol), melting, boiling, triple and critical temperature and pressure, and more.
 * @customfunction CONSTANT
 * @param substance Substance by name, formula or CAS number, as "water".
 * @param item Full words: molar mass, melting, boiling, triple or critical temperature, triple or critical pressure, acentric factor.
 * @param [settings] Latentry_units, or text as "temperature=K".
 * @param invocation The call itself.
 * @returns Temperatures and pressures in the workbook's units, molar mass in g/mol, density in kg/m3.
 */
export function constant(
  substance: any[][],
  item: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [substance, item, settings, invocation]);
}
