import type { LatentKind } from '../../../../core/answer';
import { Problem, type ProblemData } from '../../../../core/problem';
import type { Curve, Substance } from '../../../../core/substance';
import { phasesOf } from '../facts/phaseFacts';

/** The standard uncertainty at one place of a range, in the curve's unit and as a share of the value. */
export interface UncertaintyAt {
  readonly x: number;
  readonly uncertainty: number;
  readonly share?: number;
}

/** A change or property with the range over which it is known and what stands behind it. */
export interface KnownCurve {
  readonly item: string;
  readonly curve: Curve;
  readonly kind?: LatentKind;
  /** At both ends and in the middle, where it is stated. */
  readonly uncertainties: readonly UncertaintyAt[];
  /** Marks of both ends and the middle, each once. */
  readonly marks: readonly string[];
  readonly unconfirmed: boolean;
}

/** A change or property that the catalogue does not have, and why. */
export interface UnknownCurve {
  readonly item: string;
  readonly problem: ProblemData;
}

export interface Knowledge {
  readonly known: readonly KnownCurve[];
  readonly unknown: readonly UnknownCurve[];
}

const KINDS: readonly LatentKind[] = ['coexistence', 'isobaric', 'standard'];

/** Every change, each kind with its latent heat and slope, and every property, at one pressure where it needs one. */
export function knownOf(substance: Substance, pressurePa: number): Knowledge {
  const known: KnownCurve[] = [];
  const unknown: UnknownCurve[] = [];
  for (const [item, make] of asked(substance, pressurePa)) {
    try {
      known.push(knownCurve(item, make()));
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      unknown.push({ item, problem: error.data });
    }
  }
  return { known, unknown };
}

function asked(substance: Substance, pressurePa: number): (readonly [string, () => Curve])[] {
  const changes = substance.changes.flatMap((change) => {
    const usual = substance.defaultKind(change);
    return [usual, ...KINDS.filter((kind) => kind !== usual)].flatMap((kind) => [
      [`${change}, ${kind}`, () => substance.latent(change, kind)] as const,
      [`slope of ${change}, ${kind}`, () => substance.latentSlope(change, kind)] as const,
    ]);
  });
  const capacities = phasesOf(substance).map(
    ({ phase, form }) =>
      [
        `heat capacity, ${form === undefined ? phase : `${phase} (${form})`}`,
        () => substance.heatCapacity(phase, pressurePa, form),
      ] as const,
  );
  return [
    ...changes,
    ...capacities,
    ['heat capacity, ideal gas', () => substance.heatCapacity('gas', 'standard')],
    ['saturation pressure', () => substance.saturationPressure('stable')],
    ['saturation temperature', () => substance.saturationTemperature('stable')],
  ];
}

function knownCurve(item: string, curve: Curve): KnownCurve {
  const places = [...new Set([curve.from, (curve.from + curve.to) / 2, curve.to])];
  const marks = new Map(
    places.flatMap((x) => (curve.marksAt?.(x) ?? []).map(({ code, text }) => [text, code] as const)),
  );
  return {
    item,
    curve,
    ...(curve.kind === undefined ? {} : { kind: curve.kind }),
    uncertainties: places.flatMap((x) => uncertaintyAt(curve, x)),
    marks: [...marks.keys()],
    unconfirmed: [...marks.values()].includes('unconfirmed'),
  };
}

function uncertaintyAt(curve: Curve, x: number): UncertaintyAt[] {
  const uncertainty = curve.uncertaintyAt?.(x);
  if (uncertainty === undefined || !Number.isFinite(uncertainty)) return [];
  const value = curve.at(x);
  const share = Math.abs(uncertainty / value);
  return [{ x, uncertainty, ...(value !== 0 && Number.isFinite(share) ? { share } : {}) }];
}
