import { CRITICAL_DENSITY, CRITICAL_TEMPERATURE_K, GAS_CONSTANT } from './fluidCoefficients';
import { emptyFluidState, fluidState, type FluidState } from './fluidState';
import { auxiliaryLiquidDensity } from './saturationAuxiliary';

export type FluidPhase = 'liquid' | 'gas';

const MOST_STEPS = 100;
/** Denser than the fluid at 235 K and 1000 MPa. */
const HIGHEST_DENSITY = 1700;
const probe = emptyFluidState();

/**
 * Density of fluid water on the liquid or the gas branch, stable or metastable; above Tc there is one branch.
 *
 * Newton's method on p(rho) = p, kept inside a bracket; at temperatures below Tc the gas branch lies below the
 * critical density and the liquid branch above it, and neither is followed past its spinodal.
 *
 * @param temperatureK 130 K (gas) or 235 K (liquid) to 1273 K
 * @param pressurePa above 0 to 1000 MPa
 * @param phase which branch
 * @param state filled with the state found
 * @returns kg/m3; NaN where the branch has no such pressure
 */
export function fluidDensity(
  temperatureK: number,
  pressurePa: number,
  phase: FluidPhase,
  state: FluidState = probe,
): number {
  const subcritical = temperatureK < CRITICAL_TEMPERATURE_K;
  let low = subcritical && phase === 'liquid' ? CRITICAL_DENSITY : 0;
  let high = subcritical && phase === 'gas' ? CRITICAL_DENSITY : HIGHEST_DENSITY;
  let density =
    subcritical && phase === 'liquid'
      ? auxiliaryLiquidDensity(temperatureK)
      : Math.min(pressurePa / (GAS_CONSTANT * temperatureK), subcritical ? high : CRITICAL_DENSITY);
  let lastStep = Infinity;
  for (let i = 0; i < MOST_STEPS; i++) {
    fluidState(temperatureK, density, state);
    const gap = state.pressure - pressurePa;
    const unstable = state.pressureByDensity <= 0;
    // past a spinodal the branch lies on the other side, whatever the pressure says
    const tooDense = unstable ? phase === 'gas' : gap > 0;
    if (tooDense) high = density;
    else low = density;
    let next = density - gap / state.pressureByDensity;
    const step = Math.abs(next - density);
    if (!unstable) {
      if (step <= 1e-15 * density || (step < 1e-10 * density && step >= lastStep)) return density;
      if (step < 1e-8 * density && step < 1e-3 * lastStep) {
        // converging quadratically: the next step would be below rounding
        fluidState(temperatureK, next, state);
        return next;
      }
    }
    lastStep = step;
    if (unstable || !(next > low && next < high)) next = 0.5 * (low + high);
    if (high - low <= 1e-15 * high) return settled(state, pressurePa) ? density : Number.NaN;
    density = next;
  }
  return settled(state, pressurePa) ? density : Number.NaN;
}

/** A bracket can also close on a spinodal, where the pressure is another one. */
function settled(state: FluidState, pressurePa: number): boolean {
  const stiffness = state.pressureByDensity * state.density;
  return stiffness > 0 && Math.abs(state.pressure - pressurePa) <= 1e-9 * (pressurePa + stiffness);
}

/** Fills `state` at a temperature and pressure on one branch; false where the branch has no such state. */
export function fluidStateAt(temperatureK: number, pressurePa: number, phase: FluidPhase, state: FluidState): boolean {
  return fluidDensity(temperatureK, pressurePa, phase, state) > 0;
}
