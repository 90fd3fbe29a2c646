import type { LatentKind, Mark } from '../answer';
import { Problem, shortNumber } from '../problem';
import type { Change, Curve, Phase } from '../substance';
import { noSuchChange } from './coexistenceCurves';
import { fastFusionHeat, fastFusionSlope } from './fastLines';
import { idealGasBranch, phaseBranch, type PhaseBranch } from './phaseBranch';
import { LOWEST_PRESSURE_PA, NORMAL_PRESSURE_PA, STANDARD_PRESSURE_PA } from './ranges';
import { CRITICAL_PRESSURE_PA } from './saturationAuxiliary';
import { waterCurve } from './waterCurve';

const ENDS: Readonly<Record<string, readonly [cold: Phase, hot: Phase]>> = {
  fusion: ['solid', 'liquid'],
  vaporization: ['liquid', 'gas'],
  sublimation: ['solid', 'gas'],
};

function pair(change: Change, kind: LatentKind, pressurePa: number): readonly [PhaseBranch, PhaseBranch] {
  const ends = ENDS[change];
  if (ends === undefined) throw noSuchChange(change);
  const [cold, hot] = ends;
  if (change === 'vaporization' && pressurePa >= CRITICAL_PRESSURE_PA) {
    throw new Problem({
      code: 'range',
      argument: 'pressure',
      quantity: 'pressure',
      received: pressurePa,
      from: LOWEST_PRESSURE_PA,
      to: CRITICAL_PRESSURE_PA,
      subject: 'vaporization of water',
    });
  }
  return [
    phaseBranch(cold, pressurePa),
    kind === 'standard' && hot === 'gas' ? idealGasBranch : phaseBranch(hot, pressurePa),
  ];
}

function make(change: Change, kind: LatentKind, pressurePa: number, answered: 'latent' | 'slope'): Curve {
  const [cold, hot] = pair(change, kind, pressurePa);
  const from = Math.max(cold.fromK, hot.fromK);
  const to = Math.min(cold.toK, hot.toK);
  const where = kind === 'standard' ? 'in its standard states (1 bar)' : `at ${shortNumber(pressurePa)} Pa`;
  const subject = `${change} ${answered === 'latent' ? '' : 'slope '}of water ${where}`;
  if (!(from <= to)) {
    throw new Problem({
      code: 'missing',
      subject,
      reason: `the colder phase ends at ${shortNumber(cold.toK)} K and the warmer one begins at ${shortNumber(hot.fromK)} K`,
    });
  }
  const curve = waterCurve({
    from,
    to,
    subject,
    unit: answered === 'latent' ? 'J/mol' : 'J/(mol K)',
    kind,
    method: `difference of ${answered === 'latent' ? 'enthalpy' : 'isobaric heat capacity'} of two phases at one pressure`,
    sources: [...new Set([...cold.sources, ...hot.sources])],
    perKilogram:
      answered === 'latent'
        ? (t) => hot.enthalpy(t) - cold.enthalpy(t)
        : (t) => hot.heatCapacity(t) - cold.heatCapacity(t),
    marksAt: (t) => marksOf(cold, hot, t),
  });
  if (change !== 'fusion' || pressurePa !== NORMAL_PRESSURE_PA) return curve;
  const fast = answered === 'latent' ? fastFusionHeat : fastFusionSlope;
  return { ...curve, at: (t) => (t >= from && t <= to ? fast(t) : Number.NaN) };
}

function marksOf(cold: PhaseBranch, hot: PhaseBranch, t: number): readonly Mark[] {
  return [...cold.marks(t), ...(hot === idealGasBranch ? [] : hot.marks(t))];
}

const kept = new Map<string, Curve>();

/**
 * Latent heat or its slope between two phases at one pressure: `isobaric` of the real phases, `standard` at 1 bar with
 * vapour as an ideal gas.
 */
export function betweenBranches(
  change: Change,
  kind: 'isobaric' | 'standard',
  answered: 'latent' | 'slope',
  pressurePa = NORMAL_PRESSURE_PA,
): Curve {
  const pressure = kind === 'standard' ? STANDARD_PRESSURE_PA : pressurePa;
  const key = `${change} ${kind} ${answered} ${pressure}`;
  let curve = kept.get(key);
  if (curve === undefined) {
    curve = make(change, kind, pressure, answered);
    if (kept.size >= 64) kept.clear();
    kept.set(key, curve);
  }
  return curve;
}
