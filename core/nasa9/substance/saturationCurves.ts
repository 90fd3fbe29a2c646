import type { Mark } from '../../answer';
import type { Curve, Surface } from '../../substance';
import { IDEAL_GAS, METASTABLE } from './marks';
import { missing, noVapour, type CondensedModel } from './model';
import type { SaturationLine } from './saturation';
import { BOILING_WORDS, vapourPart } from './uncertainty';

const METHOD = 'equal Gibbs energies of the condensed phase and its ideal-gas vapour';

/** The line asked for, and the one that follows the stable phase. */
interface Line {
  readonly fromK: number;
  readonly toK: number;
  readonly fromPa: number;
  readonly toPa: number;
  readonly at: (temperatureK: number) => SaturationLine;
  readonly of: (pressurePa: number) => SaturationLine;
  /** Lower end of each part, so that a temperature found on one part does not leave it. */
  readonly meltingK: number;
  readonly words: string;
}

function lineOf(model: CondensedModel, surface: Surface): Line {
  const { overSolid, overLiquid, meltingK = -Infinity, record } = model;
  if (overSolid === undefined && overLiquid === undefined) throw noVapour(model);
  if (surface === 'stable' && overSolid !== undefined && overLiquid !== undefined) {
    const triplePa = overLiquid.pressurePa(meltingK);
    return {
      fromK: overSolid.fromK,
      toK: overLiquid.toK,
      fromPa: overSolid.fromPa,
      toPa: overLiquid.toPa,
      at: (t) => (t > meltingK ? overLiquid : overSolid),
      of: (p) => (p > triplePa ? overLiquid : overSolid),
      meltingK,
      words: record.name,
    };
  }
  const line = surface === 'ice' ? overSolid : surface === 'liquid' ? overLiquid : (overLiquid ?? overSolid);
  if (line === undefined) {
    throw missing(
      `vapour pressure of ${surface === 'ice' ? 'solid' : surface} ${record.name}`,
      'no data in the catalogue',
    );
  }
  const words = surface === 'stable' ? record.name : `${surface === 'ice' ? 'solid' : 'liquid'} ${record.name}`;
  return { ...line, at: () => line, of: () => line, meltingK: -Infinity, words };
}

function marksOf(model: CondensedModel, surface: Surface): (t: number) => readonly Mark[] {
  const plain: readonly Mark[] = [IDEAL_GAS];
  const cold: readonly Mark[] = [IDEAL_GAS, METASTABLE('supercooled liquid: the solid is the stable phase here')];
  const { meltingK = -Infinity } = model;
  return (t) => (surface === 'liquid' && t < meltingK ? cold : plain);
}

/** Pressure of the two-phase line against temperature. */
export function saturationPressureCurve(model: CondensedModel, surface: Surface): Curve {
  const line = lineOf(model, surface);
  const part = vapourPart(model);
  const at = (t: number): number => line.at(t).pressurePa(t);
  return {
    axis: 'temperature',
    from: line.fromK,
    to: line.toK,
    subject: `vapour pressure of ${line.words}`,
    unit: 'Pa',
    method: part === undefined ? METHOD : `${METHOD}; ${BOILING_WORDS}`,
    sources: model.sources,
    at,
    ...(part === undefined ? {} : { uncertaintyAt: (t: number) => part * line.at(t).steepness(t) * at(t) }),
    marksAt: marksOf(model, surface),
  };
}

/** Temperature of the two-phase line against pressure. */
export function saturationTemperatureCurve(model: CondensedModel, surface: Surface): Curve {
  const line = lineOf(model, surface);
  const part = vapourPart(model);
  const marks = marksOf(model, surface);
  const at = (p: number): number => {
    const one = line.of(p);
    const t = one.temperatureK(p);
    return one === model.overLiquid && t < line.meltingK ? line.meltingK : t;
  };
  return {
    axis: 'pressure',
    from: line.fromPa,
    to: line.toPa,
    subject: `boiling temperature of ${line.words}`,
    unit: 'K',
    method: part === undefined ? METHOD : `${METHOD}; ${BOILING_WORDS}`,
    sources: model.sources,
    at,
    ...(part === undefined ? {} : { uncertaintyAt: (p: number) => part * at(p) }),
    marksAt: (p) => marks(at(p)),
  };
}
