import { valueAt, type OutOfRange } from './evaluate';
import { Problem } from './problem';
import type { Curve } from './substance';

/** Abscissae and weights of the 10-point Gauss–Legendre rule on [−1, 1], positive half (Abramowitz & Stegun, Table 25.4). */
const NODES = [0.1488743389816312, 0.4333953941292472, 0.6794095682990244, 0.8650633666889845, 0.9739065285171717];
const WEIGHTS = [0.2955242247147529, 0.2692667193099964, 0.219086362515982, 0.1494513491505806, 0.0666713443086881];

/** Panels no wider than this keep the rule at rounding level for the heat capacities of one phase, K. */
const WIDEST_PANEL_K = 25;

/**
 * Mean of a curve over an interval of its axis.
 *
 * mean = 1/(b − a) ∫ₐᵇ f(x) dx by composite Gauss–Legendre quadrature; f(a) where a = b.
 *
 * @param curve the curve, in SI
 * @param a one end of the interval
 * @param b the other end; the order does not matter
 * @param policy what to do outside the curve's range
 * @returns the mean in the unit of the curve
 * @throws Problem of code `range` when an end is off the curve's range and the policy refuses
 */
export function meanOver(curve: Curve, a: number, b: number, policy: OutOfRange = 'refuse'): number {
  const first = valueAt(curve, a, policy);
  valueAt(curve, b, policy, 'mean_to');
  if (a === b) return first;
  const panels = Math.max(1, Math.ceil(Math.abs(b - a) / WIDEST_PANEL_K));
  const half = (b - a) / (2 * panels);
  let sum = 0;
  for (let panel = 0; panel < panels; panel++) {
    const middle = a + (2 * panel + 1) * half;
    for (let i = 0; i < NODES.length; i++) {
      const reach = half * (NODES[i] as number);
      sum += (WEIGHTS[i] as number) * (curve.at(middle - reach) + curve.at(middle + reach));
    }
  }
  const mean = sum / (2 * panels);
  if (Number.isFinite(mean)) return mean;
  const received = b > curve.to || b < curve.from ? b : a;
  const { axis, from, to, subject } = curve;
  throw new Problem({ code: 'range', argument: 'mean_to', quantity: axis, received, from, to, subject });
}
