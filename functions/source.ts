import { plainName, refused } from '../core/catalogue/find';
import type { Curve, Substance } from '../core/substance';
import { shortNumber } from '../core/problem';
import { answer } from './edge/answer';
import { writerFor } from './edge/cellError';
import { substanceKey, textKey } from './edge/keys';
import { STANDARD_ATMOSPHERE_PA } from './edge/pathPlan';
import type { CellwiseSpec } from './edge/spec';
import type { Settings } from './settings/settings';

const spec: CellwiseSpec = {
  family: 'cellwise',
  name: 'SOURCE',
  args: [
    { name: 'substance', kind: 'key' },
    { name: 'item', kind: 'key' },
  ],
  options: [],
  plan: (keys, settings) => {
    const words = sourceWords(substanceKey(keys[0]), textKey('item', keys[1]), settings);
    return { compute: () => words };
  },
};

/** Citation, valid range, uncertainty and standing of a constant, a change or a property. */
function sourceWords(substance: Substance, item: string, settings: Settings): string {
  const name = plainName(item);
  const datum = substance.constants.find((d) => plainName(d.item) === name);
  if (datum !== undefined) {
    const u =
      datum.uncertainty === undefined
        ? 'no stated uncertainty'
        : `standard uncertainty ${shortNumber(datum.uncertainty)} ${datum.unit}`;
    return `${datum.source}; ${u}; ${datum.confirmed ? 'confirmed' : 'unconfirmed'}`;
  }
  const curves = curvesOf(substance);
  const found = curves.find(([word]) => plainName(word) === name);
  if (found === undefined) {
    throw refused('item', item, [...curves.map(([word]) => word), ...substance.constants.map((d) => d.item)]);
  }
  const curve = found[1]();
  const write = writerFor(settings)[curve.axis];
  const middle = (curve.from + curve.to) / 2;
  const u = curve.uncertaintyAt?.(middle);
  return [
    curve.sources.join('; '),
    curve.method,
    `valid from ${write(curve.from)} to ${write(curve.to)}`,
    u === undefined
      ? 'no stated uncertainty'
      : `standard uncertainty ${shortNumber(u)} ${curve.unit} at ${write(middle)}`,
  ].join('; ');
}

function curvesOf(substance: Substance): readonly (readonly [string, () => Curve])[] {
  return [
    ...substance.changes.map(
      (change) => [change, () => substance.latent(change, substance.defaultKind(change))] as const,
    ),
    ['saturation pressure', () => substance.saturationPressure('stable')],
    ['saturation temperature', () => substance.saturationTemperature('stable')],
    ['solid heat capacity', () => substance.heatCapacity('solid', STANDARD_ATMOSPHERE_PA)],
    ['liquid heat capacity', () => substance.heatCapacity('liquid', STANDARD_ATMOSPHERE_PA)],
    ['gas heat capacity', () => substance.heatCapacity('gas', STANDARD_ATMOSPHERE_PA)],
    ['ideal gas heat capacity', () => substance.heatCapacity('gas', 'standard')],
  ];
}

/**
 * Where a number comes from: citation, valid range, stated uncertainty, and whether it is confirmed.
 * @customfunction SOURCE
 * @param substance Substance by name, formula or CAS number, as "water".
 * @param item A change ("vaporization"), a property ("saturation pressure") or a constant ("molar mass").
 * @param [settings] Latentry_units, or text as "temperature=K".
 * @param invocation The call itself.
 * @returns One text.
 */
export function source(
  substance: any[][],
  item: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [substance, item, settings, invocation]);
}
