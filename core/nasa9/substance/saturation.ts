import { NASA9_R } from '../nasa9Source';
import { emptyNasa9State, nasa9State } from '../nasa9State';
import type { Nasa9Species } from '../nasa9Types';
import type { Vapour, VapourState } from './vapour';

/** How many pressures a line keeps to start its inverse from. */
const NODES = 24;

/** Pressures below this are no longer asked for, Pa. */
export const LEAST_PRESSURE_PA = 1e-9;

/** The line between a condensed phase and its vapour. */
export interface SaturationLine {
  readonly fromK: number;
  readonly toK: number;
  readonly fromPa: number;
  readonly toPa: number;
  pressurePa(temperatureK: number): number;
  /** d ln p / d ln T, the vapour's molecules as they are there. */
  steepness(temperatureK: number): number;
  temperatureK(pressurePa: number): number;
}

/**
 * The two-phase line of a condensed phase: equal Gibbs energies of it and its vapour.
 *
 * Σ exp[(νᵢ·G − Gᵢ)/(R·T)] = p/p°, d ln p/dT = ν·(h(vapour) − h)/(R·T²), ν formula units in a molecule on average
 *
 * @param vapour its species
 * @param condensed the species of the condensed phase at a temperature
 * @param range temperatures, K
 * @param highestPa where the ideal gas is given up
 */
export function saturationLine(
  vapour: Vapour,
  condensed: (temperatureK: number) => Nasa9Species,
  range: readonly [fromK: number, toK: number],
  highestPa: number,
): SaturationLine {
  const phase = emptyNasa9State();
  /** Fills the state of the condensed phase and gives that of its vapour. */
  const vapourOver = (t: number): VapourState => {
    nasa9State(condensed(t), t, phase);
    return vapour.over(t, phase.gibbs);
  };
  const steep = ({ unitsPerMolecule, enthalpy }: VapourState, t: number): number =>
    (unitsPerMolecule * (enthalpy - phase.enthalpy)) / (NASA9_R * t);
  const pressurePa = (t: number): number => vapourOver(t).pressurePa;
  const steepness = (t: number): number => steep(vapourOver(t), t);
  const fromK = reaching(pressurePa, LEAST_PRESSURE_PA, range);
  const toK = reaching(pressurePa, highestPa, [fromK, range[1]]);
  const inverse = new Float64Array(NODES);
  const lnP = new Float64Array(NODES);
  for (let i = 0; i < NODES; i++) {
    inverse[i] = 1 / fromK + (i / (NODES - 1)) * (1 / toK - 1 / fromK);
    lnP[i] = Math.log(pressurePa(1 / (inverse[i] ?? NaN)));
  }
  const temperatureK = (p: number): number => {
    const wanted = Math.log(p);
    let i = 1;
    while (i < NODES - 1 && (lnP[i] ?? 0) < wanted) i++;
    const [x0 = 0, x1 = 0, y0 = 0, y1 = 0] = [inverse[i - 1], inverse[i], lnP[i - 1], lnP[i]];
    let t = 1 / (x0 + ((wanted - y0) / (y1 - y0)) * (x1 - x0));
    for (let step = 0; step < 12; step++) {
      const state = vapourOver(t);
      const change = (wanted - Math.log(state.pressurePa)) / steep(state, t);
      t /= 1 - change;
      // the next step would change the last digits only
      if (!(Math.abs(change) > 1e-8)) break;
    }
    return t;
  };
  return { fromK, toK, fromPa: pressurePa(fromK), toPa: pressurePa(toK), pressurePa, steepness, temperatureK };
}

/** The temperature within a range where the pressure reaches a value; the nearer end where it does not. */
function reaching(pressurePa: (t: number) => number, wanted: number, [low, high]: readonly [number, number]): number {
  if (!(pressurePa(low) < wanted)) return low;
  if (!(pressurePa(high) > wanted)) return high;
  let [cold, hot] = [low, high];
  for (let i = 0; i < 50; i++) {
    const middle = (cold + hot) / 2;
    if (pressurePa(middle) < wanted) cold = middle;
    else hot = middle;
  }
  return cold;
}
