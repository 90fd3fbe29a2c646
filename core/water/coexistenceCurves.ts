import type { Mark } from '../answer';
import { Problem } from '../problem';
import type { Change, Curve } from '../substance';
import { CRITICAL_TEMPERATURE_K } from './fluidCoefficients';
import {
  fastMeltingHeat,
  fastMeltingSlope,
  fastSublimationHeat,
  fastSublimationSlope,
  fastVaporizationHeat,
  fastVaporizationSlope,
} from './fastLines';
import { meltingTerm, sublimationTerm } from './iceEquilibriumLines';
import {
  COLDEST_LIQUID_K,
  COLDEST_MELTING_K,
  COLDEST_VAPOUR_K,
  MOLAR_MASS,
  NEAREST_TO_CRITICAL_K,
  NEAR_CRITICAL_K,
  TRIPLE_K,
} from './ranges';
import { vaporizationTerm } from './saturationLine';
import { R10_06, R6_95 } from './sources';

export type Answered = 'latent' | 'slope' | 'term';

/** The three lines, each with its range and its three functions per mole. */
interface Line {
  readonly from: number;
  readonly to: number;
  /** Where the slope ends, if earlier. */
  readonly slopeTo?: number;
  readonly sources: readonly string[];
  readonly method: string;
  readonly marksAt?: (temperatureK: number) => readonly Mark[];
  readonly functions: Readonly<Record<Answered, (temperatureK: number) => number>>;
}

const NO_MARKS: readonly Mark[] = [];
const BELOW_TRIPLE: readonly Mark[] = [
  { code: 'metastable', text: 'vaporization below the triple point: of supercooled liquid' },
];
export const NEAR_CRITICAL: readonly Mark[] = [
  {
    code: 'near-critical',
    text: 'within 0.1 K of the critical point, where the equation of state is least certain',
  },
];

const lines: Readonly<Record<string, Line>> = {
  vaporization: {
    from: COLDEST_LIQUID_K,
    to: CRITICAL_TEMPERATURE_K,
    slopeTo: NEAREST_TO_CRITICAL_K,
    sources: [R6_95],
    method: 'equal pressure and Gibbs energy of liquid and vapour',
    marksAt: (t) => (t < TRIPLE_K ? BELOW_TRIPLE : t > NEAR_CRITICAL_K ? NEAR_CRITICAL : NO_MARKS),
    functions: {
      latent: fastVaporizationHeat,
      slope: fastVaporizationSlope,
      term: (t) => MOLAR_MASS * vaporizationTerm(t),
    },
  },
  sublimation: {
    from: COLDEST_VAPOUR_K,
    to: TRIPLE_K,
    sources: [R6_95, R10_06],
    method: 'equal Gibbs energy of ice and vapour',
    functions: {
      latent: fastSublimationHeat,
      slope: fastSublimationSlope,
      term: (t) => MOLAR_MASS * sublimationTerm(t),
    },
  },
  fusion: {
    from: COLDEST_MELTING_K,
    to: TRIPLE_K,
    sources: [R6_95, R10_06],
    method: 'equal Gibbs energy of ice and liquid',
    functions: { latent: fastMeltingHeat, slope: fastMeltingSlope, term: (t) => MOLAR_MASS * meltingTerm(t) },
  },
};

const WORDS: Readonly<Record<Answered, string>> = {
  latent: 'of water along its coexistence line',
  slope: 'slope of water along its coexistence line',
  term: 'pressure term of water along its coexistence line',
};

function make(change: Change, line: Line, answered: Answered): Curve {
  const { from, method, sources, marksAt } = line;
  const to = answered === 'latent' ? line.to : (line.slopeTo ?? line.to);
  const value = line.functions[answered];
  return {
    axis: 'temperature',
    from,
    to,
    subject: `${change} ${WORDS[answered]}`,
    unit: answered === 'latent' ? 'J/mol' : 'J/(mol K)',
    kind: 'coexistence',
    method,
    sources,
    at: (t) => (t >= from && t <= to ? value(t) : Number.NaN),
    ...(marksAt === undefined ? {} : { marksAt }),
  };
}

const curves = new Map<string, Curve>();
for (const [change, line] of Object.entries(lines)) {
  for (const answered of ['latent', 'slope', 'term'] as const) {
    curves.set(`${change} ${answered}`, make(change, line, answered));
  }
}

/** Latent heat, its slope, or the part of the slope that is not a heat-capacity difference, along a two-phase line. */
export function coexistenceCurve(change: Change, answered: Answered): Curve {
  const curve = curves.get(`${change} ${answered}`);
  if (curve !== undefined) return curve;
  throw noSuchChange(change);
}

export function noSuchChange(change: Change): Problem {
  return new Problem({
    code: 'missing',
    subject: `${change} of water`,
    reason: 'no such transition in the catalogue; it has fusion, vaporization, sublimation',
  });
}
