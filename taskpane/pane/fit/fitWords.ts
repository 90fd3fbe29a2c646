import type { LatentKind } from '../../../core/answer';
import type { Curvature } from '../../../core/fit/fitTypes';

/** Below this probability of chance alone, a bend is said to be there: the usual 5 %. */
const SEEN = 0.05;

/** A probability for reading: two digits, and no zero that is none. */
export function probability(p: number): string {
  if (p < 0.001) return 'below 0.001';
  return p > 0.999 ? 'above 0.999' : Number(p.toPrecision(2)).toString();
}

/** What the test for curvature says. */
export function curvatureWords(curvature: Curvature | undefined): string {
  if (curvature === undefined) return 'Not tested: that takes four points at three different temperatures.';
  const p = `p = ${probability(curvature.probability)}`.replace('= below', 'below').replace('= above', 'above');
  return curvature.probability < SEEN
    ? `The data bend away from a straight line (${p}): one constant slope does not describe them over the whole range.`
    : `No bend beyond the scatter (${p}): a constant slope is supported.`;
}

/** Short names of the three kinds. */
export const KIND_NAMES: Readonly<Record<LatentKind, string>> = {
  coexistence: 'coexistence, two-phase line',
  isobaric: 'isobaric, one pressure',
  standard: 'standard, 1 bar, ideal gas',
};

/** What the slope of data of a kind is. */
export function slopeWords(kind: LatentKind): string {
  switch (kind) {
    case 'coexistence':
      return 'The data were taken where both phases meet, so the slope is d(ΔH)/dT along that line. It is not ΔCp: part of it comes from volume and pressure changing along the line.';
    case 'isobaric':
      return 'The data belong to one pressure, so the slope is ΔCp of the real phases at that pressure.';
    case 'standard':
      return 'The data refer to 1 bar and the ideal gas, so the slope is ΔCp° between the standard states.';
  }
}
