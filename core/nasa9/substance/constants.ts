import type { Datum } from '../../answer';
import { nasa9Species } from '../nasa9Species';
import { NASA9_SOURCE } from '../nasa9Source';
import type { CondensedModel } from './model';
import { boilingK, vapourPart } from './uncertainty';

/** Two independent prints of a temperature agree when they differ by less than this part: common practice, no source. */
const AGREE_PART = 0.005;

const COMPUTED = `equal Gibbs energies of liquid and ideal-gas vapour; ${NASA9_SOURCE}`;

/** Named constants, each with its source. */
export function condensedConstants(model: CondensedModel): readonly Datum[] {
  const { record, forms, solids, meltingK, overLiquid } = model;
  const data: Datum[] = [
    { item: 'molar mass', value: molarMassOf(model), unit: 'kg/mol', source: NASA9_SOURCE, confirmed: true },
  ];
  for (const { changeAbove, toK, form } of solids) {
    if (changeAbove === undefined || changeAbove === 'fusion') continue;
    data.push({
      item: `${changeAbove} temperature`,
      value: toK,
      unit: 'K',
      source: `${NASA9_SOURCE}, upper limit of ${form ?? ''}`,
      confirmed: false,
    });
  }
  for (const { name, temperatureK } of record.lambdaPoints ?? []) {
    if (forms.some(({ changeAbove }) => changeAbove === name)) continue;
    const item = `${name} temperature`;
    data.push({ item, value: temperatureK, unit: 'K', source: NASA9_SOURCE, confirmed: false });
  }
  if (meltingK !== undefined) data.push(printedBeside('melting temperature', meltingK, NASA9_SOURCE, record.melts));
  const boiling = boilingK(model);
  if (boiling !== undefined) {
    const part = vapourPart(model);
    data.push({
      ...printedBeside('boiling temperature', boiling, `at 101325 Pa: ${COMPUTED}`, record.vapour?.boils),
      ...(part === undefined ? {} : { uncertainty: part * boiling }),
    });
  }
  if (meltingK !== undefined && overLiquid !== undefined) {
    const value = overLiquid.pressurePa(meltingK);
    const source = `at the melting temperature: ${COMPUTED}`;
    data.push({ item: 'triple temperature', value: meltingK, unit: 'K', source: NASA9_SOURCE, confirmed: false });
    data.push({ item: 'triple pressure', value, unit: 'Pa', source, confirmed: false });
  }
  for (const [item, value, unit, source] of record.constants ?? []) {
    data.push({ item, value, unit, source, confirmed: false });
  }
  return data;
}

function printedBeside(
  item: string,
  value: number,
  source: string,
  other: readonly [number, string] | undefined,
): Datum {
  if (other === undefined) return { item, value, unit: 'K', source, confirmed: false };
  const [printed, where] = other;
  return {
    item,
    value,
    unit: 'K',
    source: `${source}; beside it ${printed} K (${where})`,
    confirmed: Math.abs(printed - value) <= AGREE_PART * value,
  };
}

/** kg/mol of one formula unit. */
export function molarMassOf({ forms, record }: CondensedModel): number {
  const first = forms[0];
  if (first !== undefined) return first.species.molarMass;
  const [name = '', units = 1] = record.vapour?.species[0] ?? [];
  return nasa9Species(name).molarMass / units;
}
