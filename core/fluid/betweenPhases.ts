import type { Mark } from '../answer';
import { Problem, shortNumber } from '../problem';
import type { Change, Curve, Phase } from '../substance';
import { noSuchChange } from './coexistence';
import { STANDARD_ATMOSPHERE_PA } from '../atmosphere';
import { STANDARD_PRESSURE_PA } from './constants';
import { fluidBranch, idealBranch, type FluidBranch } from './fluidBranch';
import { fluidCurve } from './fluidCurve';
import { NO_MARKS, solidMarks, unconfirmedMark } from './fluidMarks';
import { lacking, type FluidParts } from './fluidParts';
import { spreadAt } from './spreadAt';

const ENDS: Readonly<Record<string, readonly [cold: Phase, hot: Phase]>> = {
  fusion: ['solid', 'liquid'],
  vaporization: ['liquid', 'gas'],
  sublimation: ['solid', 'gas'],
};

/** Where the heat to single molecules of a vapour in pairs is printed, K, and what each kelvin from there adds, J/(mol K). */
const SINGLE_MOLECULES_K = 298.15;
const HEAT_CAPACITY_DOUBT = 2.5;

/** Latent heat or its slope between two phases at one pressure: `isobaric` of the real phases, `standard` at 1 bar with ideal gas. */
export function betweenPhases(
  parts: FluidParts,
  change: Change,
  kind: 'isobaric' | 'standard',
  answered: 'latent' | 'slope',
  pressurePa?: number,
): Curve {
  const { numbers, line } = parts;
  const ends = ENDS[change];
  if (ends === undefined) throw noSuchChange(parts, change);
  const pressure = kind === 'standard' ? STANDARD_PRESSURE_PA : (pressurePa ?? usualPressure(parts, change));
  const where = kind === 'standard' ? 'in its standard states (1 bar)' : `at ${shortNumber(pressure)} Pa`;
  const subject = `${change} ${answered === 'latent' ? '' : 'slope '}of ${numbers.name} ${where}`;
  if (change === 'fusion' && (answered === 'latent' || parts.solid === undefined)) {
    return fusionAtPoint(parts, kind, answered, subject, pressure);
  }
  const cold = fluidBranch(parts, ends[0], pressure);
  const ideal = kind === 'standard' && ends[1] === 'gas';
  const hot = ideal ? idealBranch(parts) : fluidBranch(parts, ends[1], pressure);
  const from = Math.max(cold.fromK, hot.fromK);
  const to = Math.min(cold.toK, hot.toK);
  if (!(from <= to)) throw apart(subject, cold, hot);
  const { nodes, latent } = numbers.spread;
  const value =
    answered === 'latent'
      ? (k: number) => hot.enthalpy(k) - cold.enthalpy(k)
      : (k: number) => hot.heatCapacity(k) - cold.heatCapacity(k);
  const toSingle = ideal ? numbers.singleMoleculesSpread : undefined;
  const uncertaintyAt = (k: number): number | undefined => {
    if (k >= numbers.criticalK) return undefined;
    return toSingle === undefined
      ? spreadAt(nodes, latent, k / numbers.criticalK) * line.latent(k)
      : Math.hypot(toSingle * value(k), HEAT_CAPACITY_DOUBT * (k - SINGLE_MOLECULES_K));
  };
  return fluidCurve({
    from,
    to,
    subject,
    unit: answered === 'latent' ? 'J/mol' : 'J/(mol K)',
    kind,
    method: `${hot.method}, less ${cold.method}`,
    sources: [
      ...new Set([
        ...numbers.sources.latent,
        ...numbers.sources.heatCapacity,
        ...numbers.sources.gas,
        ...(ends[0] === 'solid' && numbers.solid !== undefined ? [numbers.solid.source] : []),
      ]),
    ],
    value,
    ...(answered === 'latent' && change === 'vaporization' ? { uncertaintyAt } : {}),
    marksAt: (k): readonly Mark[] => [...cold.marks(k), ...(ideal ? [] : hot.marks(k))],
  });
}

/** One atmosphere; for melting at least the pressure of the triple point, below which there is no liquid. */
function usualPressure({ numbers, line }: FluidParts, change: Change): number {
  return change === 'fusion'
    ? Math.max(STANDARD_ATMOSPHERE_PA, line.pressure(numbers.meltingK))
    : STANDARD_ATMOSPHERE_PA;
}

/** Melting at its own temperature: what the cited enthalpy of fusion says. */
function fusionAtPoint(
  parts: FluidParts,
  kind: 'isobaric' | 'standard',
  answered: 'latent' | 'slope',
  subject: string,
  pressurePa: number,
): Curve {
  const { numbers, solid, liquid } = parts;
  const { fusion, meltingK, name } = numbers;
  if (fusion === undefined) throw lacking(`enthalpy of fusion of ${name}`);
  if (answered === 'slope') throw lacking(`heat capacity of solid ${name}`);
  const { value, uncertainty, source, confirmed } = fusion;
  const at = solid === undefined ? () => value : (k: number) => liquid.enthalpy(k, pressurePa) - solid.enthalpy(k);
  const atMelting = confirmed ? NO_MARKS : unconfirmedMark('enthalpy of fusion');
  const below = [...atMelting, ...solidMarks(numbers)];
  return fluidCurve({
    from: solid === undefined ? meltingK : Math.max(numbers.lineFromK, solid.fromK),
    to: meltingK,
    subject,
    unit: 'J/mol',
    kind,
    method:
      solid === undefined ? 'cited enthalpy of fusion' : 'cited enthalpy of fusion and heat capacities of both phases',
    sources: [...new Set([source, ...(numbers.solid === undefined ? [] : [numbers.solid.source])])],
    value: at,
    ...(uncertainty === undefined ? {} : { uncertaintyAt: () => uncertainty }),
    ...(below.length === 0 ? {} : { marksAt: (k: number) => (k < meltingK ? below : atMelting) }),
  });
}

function apart(subject: string, cold: FluidBranch, hot: FluidBranch): Problem {
  return new Problem({
    code: 'missing',
    subject,
    reason: `the colder phase ends at ${shortNumber(cold.toK)} K and the warmer one begins at ${shortNumber(hot.fromK)} K`,
  });
}
