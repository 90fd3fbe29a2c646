import { STANDARD_ATMOSPHERE_PA } from '../../atmosphere';
import type { LatentKind, Mark } from '../../answer';
import { shortNumber } from '../../problem';
import type { Change, Curve } from '../../substance';
import { nasa9Cp } from '../nasa9Cp';
import { nasa9Enthalpy } from '../nasa9Enthalpy';
import { nasa9Gibbs } from '../nasa9Gibbs';
import { NASA9_R } from '../nasa9Source';
import { emptyNasa9State, nasa9State } from '../nasa9State';
import { speciesLabel } from '../speciesWords';
import type { CondensedForm } from './forms';
import { IDEAL_GAS, METASTABLE } from './marks';
import { checkPressure, missing, noLine, noSuchChange, noVapour, solidAt, type CondensedModel } from './model';
import type { SaturationLine } from './saturation';
import { BOILING_WORDS, SPREAD_WORDS, spreadOf, vapourPart } from './uncertainty';

const phase = emptyNasa9State();

export type Asked = 'latent' | 'slope';

/** A latent heat or its slope of one kind. */
export function latentCurve(
  model: CondensedModel,
  change: Change,
  kind: LatentKind,
  asked: Asked,
  pressurePa = STANDARD_ATMOSPHERE_PA,
): Curve {
  const index = model.forms.findIndex(({ changeAbove, secondOrder }) => changeAbove === change && !secondOrder);
  const [cold, warm] = [model.forms[index], model.forms[index + 1]];
  if (cold !== undefined && warm !== undefined)
    return condensedCurve(model, change, kind, asked, cold, warm, pressurePa);
  if (change !== 'vaporization' && change !== 'sublimation') throw noSuchChange(model, change);
  if (model.vapour === undefined) throw noVapour(model);
  if (kind === 'standard') return standardCurve(model, change, asked);
  if (kind === 'coexistence') return alongLine(model, change, asked);
  return atPressure(model, change, asked, pressurePa);
}

const DIFFERENCE = 'difference of the enthalpies of the two phases, nine-coefficient polynomials';

function condensedCurve(
  model: CondensedModel,
  change: Change,
  kind: LatentKind,
  asked: Asked,
  cold: CondensedForm,
  warm: CondensedForm,
  pressurePa: number,
): Curve {
  const subject = `${change} of ${model.record.name}`;
  if (kind === 'coexistence') {
    const reason =
      'its pressure line needs the volumes of both phases, which the data set lacks; kind=isobaric is there';
    throw missing(`coexistence kind of ${subject}`, reason);
  }
  if (kind === 'isobaric') checkPressure(model, pressurePa);
  const at: (t: number) => number =
    asked === 'latent'
      ? (t) => nasa9Enthalpy(warm.species, t) - nasa9Enthalpy(cold.species, t)
      : (t) => nasa9Cp(warm.species, t) - nasa9Cp(cold.species, t);
  const transitionK = cold.toK;
  const spread = asked === 'latent' ? spreadOf(model, change, at(transitionK)) : undefined;
  const away: readonly Mark[] = [METASTABLE(`away from ${transitionK} K one of the two phases is not the stable one`)];
  return {
    axis: 'temperature',
    from: Math.max(cold.lowK, warm.lowK),
    to: Math.min(cold.highK, warm.highK),
    subject,
    unit: asked === 'latent' ? 'J/mol' : 'J/(mol K)',
    kind,
    method: `${DIFFERENCE}; past its range each phase keeps its heat capacity${spread === undefined ? '' : `; ${SPREAD_WORDS}`}`,
    sources: model.sources,
    at,
    ...(spread === undefined ? {} : { uncertaintyAt: () => spread }),
    marksAt: (t) => (t === transitionK ? [] : away),
  };
}

/** The condensed side of a vaporization or sublimation. */
interface Side {
  readonly formAt: (t: number) => CondensedForm;
  readonly from: number;
  readonly to: number;
  readonly line?: SaturationLine;
}

function sideOf(model: CondensedModel, change: Change): Side {
  const { liquid, solids, overLiquid, overSolid } = model;
  const first = solids[0];
  const last = solids[solids.length - 1];
  if (change === 'vaporization' && liquid !== undefined) {
    const line = overLiquid === undefined ? {} : { line: overLiquid };
    return { formAt: () => liquid, from: liquid.lowK, to: liquid.toK, ...line };
  }
  if (change === 'sublimation' && first !== undefined && last !== undefined) {
    const line = overSolid === undefined ? {} : { line: overSolid };
    return { formAt: (t) => solidAt(solids, t), from: first.fromK, to: last.toK, ...line };
  }
  throw noSuchChange(model, change);
}

function gasMarks(model: CondensedModel, change: Change): (t: number) => readonly Mark[] {
  const cold: readonly Mark[] = [IDEAL_GAS, METASTABLE('supercooled liquid: the solid is the stable phase here')];
  const plain: readonly Mark[] = [IDEAL_GAS];
  const { meltingK } = model;
  return (t) => (change === 'vaporization' && meltingK !== undefined && t < meltingK ? cold : plain);
}

/** Against the first species of the vapour as an ideal gas at 1 bar, per formula unit. */
function standardCurve(model: CondensedModel, change: Change, asked: Asked): Curve {
  const { vapour, record } = model;
  const gas = vapour?.species[0];
  const units = vapour?.units[0] ?? 1;
  if (vapour === undefined || gas === undefined) throw noVapour(model);
  const { formAt, from, to } = sideOf(model, change);
  const part = asked === 'latent' ? vapourPart(model) : undefined;
  const at: (t: number) => number =
    asked === 'latent'
      ? (t) => nasa9Enthalpy(gas, t) / units - nasa9Enthalpy(formAt(t).species, t)
      : (t) => nasa9Cp(gas, t) / units - nasa9Cp(formAt(t).species, t);
  const marks = gasMarks(model, change);
  return {
    axis: 'temperature',
    from: Math.max(from, vapour.fromK),
    to: Math.min(to, gas.toK),
    subject: `${change} of ${record.name} to ideal gas`,
    unit: asked === 'latent' ? 'J/mol' : 'J/(mol K)',
    kind: 'standard',
    method: `${DIFFERENCE}; gas: ideal gas of ${speciesLabel(gas)} at 1 bar${part === undefined ? '' : `; ${BOILING_WORDS}`}`,
    sources: model.sources,
    at,
    ...(part === undefined ? {} : { uncertaintyAt: (t: number) => part * at(t) }),
    marksAt: (t) => marks(t).filter(({ code }) => code !== 'ideal-gas'),
  };
}

const EQUILIBRIUM =
  'enthalpy of the ideal-gas vapour in equilibrium with the condensed phase (equal Gibbs energies) less that of the phase';

/** Along the two-phase line. */
function alongLine(model: CondensedModel, change: Change, asked: Asked): Curve {
  const { vapour, record } = model;
  const { line, formAt } = sideOf(model, change);
  if (vapour === undefined || line === undefined) throw noLine(model, change);
  const part = asked === 'latent' ? vapourPart(model) : undefined;
  const at = (t: number): number => {
    nasa9State(formAt(t).species, t, phase);
    const { enthalpy, heatCapacity, enthalpyPerPascal, pressurePa, unitsPerMolecule } = vapour.over(t, phase.gibbs);
    const heat = enthalpy - phase.enthalpy;
    if (asked === 'latent') return heat;
    // dp/dT = ν·p·Δh/(R·T²)
    const along = (enthalpyPerPascal * unitsPerMolecule * pressurePa * heat) / (NASA9_R * t * t);
    return heatCapacity - phase.heatCapacity + along;
  };
  return {
    axis: 'temperature',
    from: line.fromK,
    to: line.toK,
    subject: `${change} of ${record.name}`,
    unit: asked === 'latent' ? 'J/mol' : 'J/(mol K)',
    kind: 'coexistence',
    method: `${EQUILIBRIUM}; up to ${record.vapour?.highestPa ?? 0} Pa${part === undefined ? '' : `; ${BOILING_WORDS}`}`,
    sources: model.sources,
    at,
    ...(part === undefined ? {} : { uncertaintyAt: (t: number) => part * at(t) }),
    marksAt: gasMarks(model, change),
  };
}

/** At one pressure, away from the line with one of the phases metastable. */
function atPressure(model: CondensedModel, change: Change, asked: Asked, pressurePa: number): Curve {
  const { vapour, record } = model;
  const { line, formAt } = sideOf(model, change);
  if (vapour === undefined || line === undefined) throw noLine(model, change);
  checkPressure(model, pressurePa, record.vapour?.highestPa);
  if (pressurePa === 0) throw missing(`${change} of ${record.name} at 0 Pa`, 'there is no vapour at no pressure');
  const part = asked === 'latent' ? vapourPart(model) : undefined;
  const at = (t: number): number => {
    const { species } = formAt(t);
    const { enthalpy, heatCapacity } = vapour.at(t, pressurePa);
    return asked === 'latent' ? enthalpy - nasa9Enthalpy(species, t) : heatCapacity - nasa9Cp(species, t);
  };
  const marks = gasMarks(model, change);
  return {
    axis: 'temperature',
    from: line.fromK,
    to: line.toK,
    subject: `${change} of ${record.name} at ${shortNumber(pressurePa)} Pa`,
    unit: asked === 'latent' ? 'J/mol' : 'J/(mol K)',
    kind: 'isobaric',
    method: 'enthalpy of the ideal-gas vapour, its species in equilibrium, less that of the condensed phase',
    sources: model.sources,
    at,
    ...(part === undefined ? {} : { uncertaintyAt: (t: number) => part * at(t) }),
    marksAt: (t) => [
      ...marks(t),
      METASTABLE('away from the two-phase line one of the two phases is not the stable one'),
    ],
  };
}

/** The part of the slope along the line that is not a heat-capacity difference: from the equilibrium of the vapour's species. */
export function coexistenceTermCurve(model: CondensedModel, change: Change): Curve {
  const slope = latentCurve(model, change, 'coexistence', 'slope');
  const { vapour } = model;
  const { formAt } = sideOf(model, change);
  if (vapour === undefined) throw noVapour(model);
  return {
    ...slope,
    subject: `coexistence term of ${change} of ${model.record.name}`,
    method: '(∂h/∂p) of the vapour at constant temperature · dp/dT; 0 for an ideal gas of one species',
    at: (t) => {
      const { species } = formAt(t);
      const { heatCapacity } = vapour.over(t, nasa9Gibbs(species, t));
      return slope.at(t) - (heatCapacity - nasa9Cp(species, t));
    },
  };
}
