import { catalogue } from '../../../core/catalogue/find';
import { Problem } from '../../../core/problem';
import type { Change, Curve, Phase, Substance } from '../../../core/substance';

/** Every built-in substance, made. */
export const substances: readonly Substance[] = catalogue.entries.map((entry) => entry.make());

export const ATMOSPHERE = 101325;
export const KINDS = ['coexistence', 'isobaric', 'standard'] as const;
const PHASES: readonly Phase[] = ['solid', 'liquid', 'gas'];

/** What a substance answers, or the problem that it answers with. Anything else that is thrown fails the test. */
export function ask<T>(run: () => T): T | Problem {
  try {
    return run();
  } catch (thrown) {
    if (thrown instanceof Problem) return thrown;
    throw thrown;
  }
}

export interface NamedCurve {
  readonly what: string;
  readonly curve: Curve;
}

export interface LatentPair {
  readonly what: string;
  readonly latent: Curve;
  readonly slope: Curve;
}

/** Everything that a substance can be asked for, by what was asked. */
export interface Tour {
  readonly substance: Substance;
  readonly curves: readonly NamedCurve[];
  /** A latent heat and its slope, of the same change and kind. */
  readonly pairs: readonly LatentPair[];
  readonly problems: readonly { readonly what: string; readonly problem: Problem }[];
}

/** Asks a substance for every curve it could have. */
export function tourOf(substance: Substance): Tour {
  const curves: NamedCurve[] = [];
  const pairs: LatentPair[] = [];
  const problems: { what: string; problem: Problem }[] = [];
  const take = (what: string, run: () => Curve): Curve | undefined => {
    const curve = ask(run);
    if (curve instanceof Problem) {
      problems.push({ what, problem: curve });
      return undefined;
    }
    curves.push({ what, curve });
    return curve;
  };
  for (const change of changesToAsk(substance)) {
    for (const kind of KINDS) {
      const what = `${substance.name} ${change} ${kind}`;
      const latent = take(what, () => substance.latent(change, kind));
      const slope = take(`${what} slope`, () => substance.latentSlope(change, kind));
      if (latent !== undefined && slope !== undefined) pairs.push({ what, latent, slope });
    }
    take(`${substance.name} ${change} coexistence term`, () => substance.coexistenceTerm(change));
  }
  for (const phase of PHASES) {
    for (const form of phase === 'solid' ? [undefined, ...(substance.forms ?? [])] : [undefined]) {
      const name = `${substance.name} ${form ?? ''} ${phase}`;
      for (const at of [ATMOSPHERE, 'saturated', 'standard'] as const) {
        take(`${name} cp ${at}`, () => substance.heatCapacity(phase, at, form));
      }
      take(`${name} enthalpy`, () => substance.enthalpy(phase, ATMOSPHERE, form));
    }
  }
  for (const surface of ['stable', 'ice', 'liquid'] as const) {
    take(`${substance.name} saturation pressure ${surface}`, () => substance.saturationPressure(surface));
    take(`${substance.name} saturation temperature ${surface}`, () => substance.saturationTemperature(surface));
  }
  return { substance, curves, pairs, problems };
}

function changesToAsk({ changes }: Substance): readonly Change[] {
  return [...new Set([...changes, 'fusion', 'vaporization', 'sublimation'])];
}

/** Tours of all substances, made once for all tests of a file. */
export const tours: readonly Tour[] = substances.map(tourOf);

/** A number that the same test always draws at the same place: seeded, uniform in [0, 1). */
export function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}

/** `count` places on a curve's range with both ends; on a pressure axis evenly in its logarithm. */
export function placesOn({ axis, from, to }: Curve, count: number, draw: () => number): number[] {
  const even = axis === 'temperature' || !(from > 0);
  const place = (share: number): number => (even ? from + (to - from) * share : from * (to / from) ** share);
  const inside = Array.from({ length: count }, () => Math.min(Math.max(place(draw()), from), to));
  return [from, to, ...inside];
}
