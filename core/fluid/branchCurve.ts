import type { Curve } from '../substance';
import type { FluidBranch } from './fluidBranch';
import { fluidCurve, type FluidCurveParts } from './fluidCurve';

/** A curve over a branch, whose metastable ends are searched for only when asked for, or when a place lies beyond the stable part. */
export function branchCurve(branch: FluidBranch, parts: Omit<FluidCurveParts, 'from' | 'to' | 'reach'>): Curve {
  const { stableFromK, stableToK } = branch;
  const { value } = parts;
  const inside = (k: number): boolean => (k >= stableFromK && k <= stableToK) || (k >= branch.fromK && k <= branch.toK);
  return {
    ...fluidCurve({ ...parts, from: stableFromK, to: stableToK }),
    get from() {
      return branch.fromK;
    },
    get to() {
      return branch.toK;
    },
    at: (k) => (inside(k) ? value(k) : NaN),
  };
}
