import type { Curve, Gap, Ladder, Phase, Rung, Substance } from '../../../core/substance';

/** A made-up substance whose enthalpies are straight lines, so that every heat on a path is known exactly. */
const MELTING_K = 300;
const BOILING_K = 400;
const SUBLIMING_K = 250;
const TRIPLE_PA = 1000;
const CRITICAL_PA = 1e7;

/** J/mol: heat capacities 30, 50, 40 J/(mol K); heats of fusion 4000 and vaporization 20000 J/mol at 300 and 400 K. */
const LINES: Readonly<Record<Phase, (t: number) => number>> = {
  solid: (t) => 30 * (t - MELTING_K),
  liquid: (t) => 4000 + 50 * (t - MELTING_K),
  gas: (t) => 29000 + 40 * (t - BOILING_K),
};

function rung(phase: Rung['phase'], fromK: number, toK: number): Rung {
  return { phase, fromK, toK, enthalpy: LINES[phase === 'supercritical' ? 'liquid' : phase] };
}

function gap(change: string, temperatureK: number, below: Phase, above: Phase): Gap {
  return { change, temperatureK, below: LINES[below](temperatureK), above: LINES[above](temperatureK) };
}

function ladder(pressurePa: number): Ladder {
  const sources = ['made up'];
  if (pressurePa < TRIPLE_PA) {
    const rungs = [rung('solid', 100, SUBLIMING_K), rung('gas', SUBLIMING_K, 600)];
    return { pressurePa, sources, rungs, gaps: [gap('sublimation', SUBLIMING_K, 'solid', 'gas')] };
  }
  const melting = gap('fusion', MELTING_K, 'solid', 'liquid');
  if (pressurePa > CRITICAL_PA) {
    const rungs = [rung('solid', 100, MELTING_K), rung('supercritical', MELTING_K, 600)];
    return { pressurePa, sources, rungs, gaps: [melting] };
  }
  const rungs = [rung('solid', 100, MELTING_K), rung('liquid', MELTING_K, BOILING_K), rung('gas', BOILING_K, 600)];
  return { pressurePa, sources, rungs, gaps: [melting, gap('vaporization', BOILING_K, 'liquid', 'gas')] };
}

function curve(phase: Phase): Curve {
  return {
    axis: 'temperature',
    from: 200,
    to: 600,
    subject: `enthalpy of ${phase}`,
    unit: 'J/mol',
    method: 'straight line',
    sources: ['made up'],
    at: LINES[phase],
  };
}

const notNeeded = (): never => {
  throw new Error('a path does not ask for this');
};

export const straightSubstance: Substance = {
  name: 'straight substance',
  formula: 'X',
  cas: '0-00-0',
  synonyms: [],
  group: 'house',
  notes: [],
  molarMass: 0.05,
  constants: [],
  changes: ['fusion', 'vaporization'],
  transitionTemperature: notNeeded,
  defaultKind: notNeeded,
  latent: notNeeded,
  latentSlope: notNeeded,
  coexistenceTerm: notNeeded,
  heatCapacity: notNeeded,
  saturationPressure: notNeeded,
  saturationTemperature: notNeeded,
  enthalpy: curve,
  enthalpyReference: 'solid at 300 K',
  ladder,
  disagreement: notNeeded,
};
