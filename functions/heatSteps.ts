import { STANDARD_ATMOSPHERE_PA } from '../core/atmosphere';
import { heatSteps as pathSteps } from '../core/path/heatSteps';
import { Problem } from '../core/problem';
import { fromMolar } from '../core/units/fromMolar';
import { answer } from './edge/answer';
import { scalarOf, type Block } from './edge/block';
import { CellFault, shown } from './edge/cell';
import { substanceKey } from './edge/keys';
import { quantityOf } from './edge/quantityOf';
import { onScale } from './edge/scale';
import type { BlockwiseSpec, Key, Table } from './edge/spec';
import { stateKey } from './edge/stateText';
import type { Settings } from './settings/settings';

const spec: BlockwiseSpec = {
  family: 'blockwise',
  name: 'HEATSTEPS',
  args: [
    { name: 'substance', kind: 'key' },
    { name: 'from', kind: 'key' },
    { name: 'to', kind: 'key' },
    { name: 'pressure', kind: 'pressure', optional: true },
  ],
  options: [],
  run: ([substance, from, to, pressure], settings) => table(substance, from, to, pressure, settings),
};

function table(
  substanceBlock: Block | undefined,
  from: Block | undefined,
  to: Block | undefined,
  pressure: Block | undefined,
  settings: Settings,
): Table {
  const substance = substanceKey(keyOf('substance', substanceBlock));
  const first = stateKey('from', keyOf('from', from), settings);
  const last = stateKey('to', keyOf('to', to), settings);
  const pressurePa = pressure === undefined ? STANDARD_ATMOSPHERE_PA : quantityOf(pressure, 'pressure', settings);
  const path = pathSteps(substance, first, last, pressurePa, settings.outOfRange);
  const { heat: heatUnit, temperature } = settings.units;
  const { scale } = fromMolar(heatUnit, substance.molarMass);
  const celsius = onScale(temperature, settings);
  const degrees = (kelvin: number): number => kelvin * celsius.scale + celsius.offset;
  const share = (heat: number): number => (path.heat === 0 ? 0 : heat / path.heat);
  return [
    ['Step', `From / ${temperature.symbol}`, `To / ${temperature.symbol}`, `Heat / ${heatUnit.symbol}`, 'Share'],
    ...path.steps.map(({ label, fromK, toK, heat }) => [
      label,
      degrees(fromK),
      degrees(toK),
      heat * scale,
      share(heat),
    ]),
    [
      'total',
      degrees(path.from.temperatureK),
      degrees(path.to.temperatureK),
      path.heat * scale,
      path.heat === 0 ? 0 : 1,
    ],
    ...path.marks.map((mark) => [`${mark.code}: ${mark.text}`, '', '', '', '']),
  ];
}

function keyOf(name: string, block: Block | undefined): Key {
  const cell = block === undefined ? undefined : scalarOf(block);
  if (cell instanceof CellFault) throw cell;
  if (typeof cell === 'string' || typeof cell === 'number') return cell;
  const received = cell === undefined ? 'nothing' : shown(cell);
  throw new Problem({ code: 'argument', argument: name, allowed: 'one cell with a value', received });
}

/**
 * The heating path between two states at one pressure as a table: step, from, to, heat, share; then the total and any warnings.
 * @customfunction HEATSTEPS
 * @requiresParameterAddresses
 * @param substance Substance by name, formula or CAS number, as "water".
 * @param from First state: temperature in the workbook's unit, or text as "-20 degC", "98 degC liquid", "saturated liquid", "melting solid".
 * @param to Last state, in the same way.
 * @param [pressure] Absolute pressure unless it says gauge; one standard atmosphere when left out.
 * @param [settings] Latentry_units, or text as "heat=kJ/mol".
 * @param invocation The call itself.
 * @returns A table with a heading row.
 */
export function heatSteps(
  substance: any[][],
  from: any[][],
  to: any[][],
  pressure?: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [substance, from, to, pressure, settings, invocation]);
}
