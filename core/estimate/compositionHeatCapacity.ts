import type { Answer } from '../answer';
import type { OutOfRange } from '../evaluate';
import { Problem, shortNumber } from '../problem';
import {
  COLD_WATER,
  COMPOSITION_SOURCE,
  PARTS,
  WARM_WATER,
  type CompositionPart,
  type PartConstants,
  type Quadratic,
} from './compositionConstants';
import { estimated } from './estimated';

/** Mass fractions by part; a part that is left out is not there. */
export type Composition = Readonly<Partial<Record<CompositionPart, number>>>;

/** Every part, in the order in which labels list them. */
export const COMPOSITION_PARTS = [
  'protein',
  'fat',
  'carbohydrate',
  'fibre',
  'ash',
  'water',
  'ice',
] as const satisfies readonly CompositionPart[];

const ZERO_CELSIUS_K = 273.15;
const COLDEST_K = ZERO_CELSIUS_K - 40;
const HOTTEST_K = ZERO_CELSIUS_K + 150;

/** Fractions as tables print them, to 0.1 % each, may miss 1 by this much. */
const SUM_TOLERANCE = 0.005;

/** What the additive rule itself adds, as a share of the value: common practice, no source. */
const MIXING_ERROR = 0.02;

/**
 * A material's heat capacity as one quadratic below 0 °C and one above, for integrals and many temperatures.
 *
 * @returns J/(kg K) against the Celsius temperature; `toK` is 273.15 K where the material holds ice
 * @throws Problem `argument` as `compositionHeatCapacity`
 */
export function compositionPolynomial(composition: Composition): {
  readonly cold: Quadratic;
  readonly warm: Quadratic;
  readonly fromK: number;
  readonly toK: number;
} {
  checked(composition);
  return {
    cold: summed(composition, COLD_WATER),
    warm: summed(composition, WARM_WATER),
    fromK: COLDEST_K,
    toK: (composition.ice ?? 0) > 0 ? ZERO_CELSIUS_K : HOTTEST_K,
  };
}

/**
 * Heat capacity of a moist or composed material from its mass fractions.
 *
 * cp = Σ x_i (a_i + b_i t + c_i t²), t in °C; water has one set below 0 °C and one from 0 °C. Ice and water are told apart by
 * their fractions: nothing melts or freezes here, so this is no apparent heat capacity through a freezing range.
 *
 * @param composition mass fractions (1) of protein, fat, carbohydrate, fibre, ash, water and ice, which sum to 1
 * @param temperatureK temperature, [233.15, 423.15] K; to 273.15 K where there is ice
 * @param policy whether a temperature outside is refused or extended
 * @returns J/(kg K); standard uncertainty: the standard errors of the parts and 2 % for the additive rule
 * @throws Problem `argument` for a fraction outside [0, 1] or a sum that is not 1, `range` outside the temperatures
 * @source Choi & Okos (1986), in Food Engineering and Process Applications 1, 93
 * @example
 * const feed = { protein: 0.15, carbohydrate: 0.2, fibre: 0.01, ash: 0.005, fat: 0.2, water: 0.435 };
 * compositionHeatCapacity(feed, 298.15).value // => 2869.8
 */
export function compositionHeatCapacity(
  composition: Composition,
  temperatureK: number,
  policy: OutOfRange = 'refuse',
): Answer {
  const { cold, warm, fromK, toK } = compositionPolynomial(composition);
  const t = temperatureK - ZERO_CELSIUS_K;
  const water = t < 0 ? COLD_WATER : WARM_WATER;
  const value = valueOf(t < 0 ? cold : warm, t);
  let variance = (MIXING_ERROR * value) ** 2;
  for (const part of COMPOSITION_PARTS) {
    const { coefficients, relativeError } = constantsOf(part, water);
    variance += ((composition[part] ?? 0) * relativeError * valueOf(coefficients, t)) ** 2;
  }
  return estimated(
    {
      subject: 'the heat capacity from composition',
      unit: 'J/(kg K)',
      method:
        'sum over mass fractions (Choi & Okos); uncertainty k = 1: standard errors of the parts and 2 % for the additive rule',
      sources: [COMPOSITION_SOURCE],
      marks:
        (composition.fibre ?? 0) > 0
          ? [{ code: 'unconfirmed', text: 'the coefficients of fibre are from memory' }]
          : [],
    },
    { argument: 'temperature', temperatureK, fromK, toK },
    value,
    Math.sqrt(variance),
    policy,
  );
}

function valueOf([c0, c1, c2]: Quadratic, t: number): number {
  return c0 + t * (c1 + t * c2);
}

function constantsOf(part: CompositionPart, water: PartConstants): PartConstants {
  return part === 'water' ? water : PARTS[part];
}

function summed(composition: Composition, water: PartConstants): Quadratic {
  const sum: [number, number, number] = [0, 0, 0];
  for (const part of COMPOSITION_PARTS) {
    const fraction = composition[part] ?? 0;
    const [c0, c1, c2] = constantsOf(part, water).coefficients;
    sum[0] += fraction * c0;
    sum[1] += fraction * c1;
    sum[2] += fraction * c2;
  }
  return sum;
}

function checked(composition: Composition): void {
  let sum = 0;
  for (const part of COMPOSITION_PARTS) {
    const fraction = composition[part] ?? 0;
    if (!(fraction >= 0 && fraction <= 1)) {
      throw refused(`mass fraction of ${part}`, 'a share in [0, 1]', shortNumber(fraction));
    }
    sum += fraction;
  }
  if (Math.abs(sum - 1) > SUM_TOLERANCE) {
    throw refused('mass fractions', 'a sum of 1 (within 0.005)', `a sum of ${shortNumber(sum)}`);
  }
}

function refused(argument: string, allowed: string, received: string): Problem {
  return new Problem({ code: 'argument', argument, allowed, received });
}
