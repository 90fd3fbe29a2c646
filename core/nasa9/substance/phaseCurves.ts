import type { Mark } from '../../answer';
import { refused } from '../../catalogue/refused';
import { shortNumber } from '../../problem';
import type { Curve, Phase } from '../../substance';
import { nasa9Cp } from '../nasa9Cp';
import { nasa9Enthalpy } from '../nasa9Enthalpy';
import { nasa9Gibbs } from '../nasa9Gibbs';
import type { Nasa9Species } from '../nasa9Types';
import { speciesLabel } from '../speciesWords';
import type { CondensedForm } from './forms';
import { IDEAL_GAS, METASTABLE } from './marks';
import { checkPressure, missing, noVapour, solidAt, stableSpecies, type CondensedModel } from './model';
import { vapourBoundary } from './vapourBoundary';

type Asked = 'enthalpy' | 'heatCapacity';

const WORDS: Readonly<Record<Asked, string>> = { enthalpy: 'enthalpy', heatCapacity: 'heat capacity' };

/** Heat capacity at a pressure, on the two-phase line, or in the standard state. */
export function heatCapacityCurve(
  model: CondensedModel,
  phase: Phase,
  at: number | 'saturated' | 'standard',
  form?: string,
): Curve {
  if (phase === 'gas') return gasHeatCapacity(model, at);
  if (typeof at === 'number') checkPressure(model, at);
  const curve = condensedCurve(model, phase, 'heatCapacity', form, typeof at === 'number' ? at : undefined);
  return at === 'standard' ? { ...curve, kind: 'standard' } : curve;
}

/** Enthalpy at a pressure, on the substance's reference. */
export function enthalpyCurve(model: CondensedModel, phase: Phase, pressurePa: number, form?: string): Curve {
  if (phase === 'gas') return gasAt(model, 'enthalpy', pressurePa);
  checkPressure(model, pressurePa);
  return condensedCurve(model, phase, 'enthalpy', form, pressurePa);
}

function condensedCurve(
  model: CondensedModel,
  phase: 'solid' | 'liquid',
  asked: Asked,
  form?: string,
  pressurePa?: number,
): Curve {
  const { record, solids, liquid } = model;
  const name = `${WORDS[asked]} of ${phase} ${record.name}`;
  const forms = phase === 'liquid' ? (liquid === undefined ? [] : [liquid]) : chosen(solids, form);
  const [first, last] = [forms[0], forms[forms.length - 1]];
  if (first === undefined || last === undefined) throw missing(name, 'no data in the catalogue');
  const speciesAt: (t: number) => Nasa9Species =
    forms.length === 1 ? () => first.species : (t) => solidAt(forms, t).species;
  const vapourK = pressurePa === undefined ? undefined : vapourBoundary(model, pressurePa)?.temperatureK;
  const stableToK = Math.min(last.toK, vapourK ?? Infinity);
  const away: readonly Mark[] = [METASTABLE(`${phase} ${record.name} is not the stable phase here`)];
  return {
    axis: 'temperature',
    from: first.lowK,
    to: last.highK,
    subject: form === undefined ? name : `${name} (${form})`,
    unit: asked === 'enthalpy' ? 'J/mol' : 'J/(mol K)',
    method:
      'nine-coefficient polynomials at 1 bar; effect of pressure on the condensed phase neglected; past its range a phase keeps its heat capacity',
    sources: model.sources,
    at: asked === 'enthalpy' ? (t) => nasa9Enthalpy(speciesAt(t), t) : (t) => nasa9Cp(speciesAt(t), t),
    marksAt: (t) => (t < first.fromK || t > stableToK ? away : []),
  };
}

function chosen(solids: readonly CondensedForm[], form: string | undefined): readonly CondensedForm[] {
  if (form === undefined) return solids;
  const found = solids.filter((one) => one.form === form);
  if (found.length > 0) return found;
  throw refused(
    'form',
    form,
    solids.flatMap((one) => one.form ?? []),
  );
}

/** The ideal gas of the standard kind; it is there also where the real vapour is not. */
function gasHeatCapacity(model: CondensedModel, at: number | 'saturated' | 'standard'): Curve {
  const { vapour, record } = model;
  if (typeof at === 'number') return gasAt(model, 'heatCapacity', at);
  if (at === 'saturated') return saturatedGas(model);
  const gas = vapour?.species[0];
  const units = vapour?.units[0] ?? 1;
  if (gas === undefined) throw noVapour(model);
  return {
    axis: 'temperature',
    from: gas.fromK,
    to: gas.toK,
    subject: `heat capacity of ${record.name} as ideal gas`,
    unit: 'J/(mol K)',
    kind: 'standard',
    method: `ideal gas of ${speciesLabel(gas)} at 1 bar, nine-coefficient polynomials${units === 1 ? '' : `, per mole of ${record.formula}`}`,
    sources: model.sources,
    at: (t) => nasa9Cp(gas, t) / units,
  };
}

function gasAt(model: CondensedModel, asked: Asked, pressurePa: number): Curve {
  const { vapour, record, overLiquid, overSolid } = model;
  if (vapour === undefined || (overLiquid ?? overSolid) === undefined) throw noVapour(model);
  checkPressure(model, pressurePa, record.vapour?.highestPa);
  if (pressurePa === 0) throw missing(`vapour of ${record.name} at 0 Pa`, 'there is no vapour at no pressure');
  const cold: readonly Mark[] = [IDEAL_GAS, METASTABLE(`vapour of ${record.name} is not the stable phase here`)];
  const plain: readonly Mark[] = [IDEAL_GAS];
  const dewK = vapourBoundary(model, pressurePa)?.temperatureK ?? vapour.fromK;
  return {
    axis: 'temperature',
    from: vapour.fromK,
    to: vapour.toK,
    subject: `${WORDS[asked]} of vapour of ${record.name} at ${shortNumber(pressurePa)} Pa`,
    unit: asked === 'enthalpy' ? 'J/mol' : 'J/(mol K)',
    method: gasMethod(model),
    sources: model.sources,
    at: asked === 'enthalpy' ? (t) => vapour.at(t, pressurePa).enthalpy : (t) => vapour.at(t, pressurePa).heatCapacity,
    marksAt: (t) => (t < dewK ? cold : plain),
  };
}

function saturatedGas(model: CondensedModel): Curve {
  const { vapour, record, overLiquid, overSolid } = model;
  const cold = overSolid ?? overLiquid;
  const hot = overLiquid ?? overSolid;
  if (vapour === undefined || cold === undefined || hot === undefined) throw noVapour(model);
  const marks: readonly Mark[] = [IDEAL_GAS];
  return {
    axis: 'temperature',
    from: cold.fromK,
    to: hot.toK,
    subject: `heat capacity of saturated vapour of ${record.name}`,
    unit: 'J/(mol K)',
    method: `isobaric, at the two-phase line; ${gasMethod(model)}`,
    sources: model.sources,
    at: (t) => vapour.over(t, nasa9Gibbs(stableSpecies(model, t), t)).heatCapacity,
    marksAt: () => marks,
  };
}

function gasMethod({ vapour }: CondensedModel): string {
  const names = vapour?.species.map(speciesLabel) ?? [];
  return names.length === 1
    ? `ideal gas of ${names.join()}`
    : `ideal gas of ${names.join(', ')} in equilibrium, what their reactions take up included`;
}
