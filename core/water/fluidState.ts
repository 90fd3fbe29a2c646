import { CRITICAL_DENSITY, CRITICAL_TEMPERATURE_K, GAS_CONSTANT } from './fluidCoefficients';
import { emptyParts } from './helmholtzParts';
import { idealPart, type IdealParts } from './idealPart';
import { residualPart } from './residualPart';

/** Properties of fluid water at one temperature and density, per kilogram, in SI. */
export interface FluidState {
  temperatureK: number;
  /** kg/m3 */
  density: number;
  /** Pa */
  pressure: number;
  /** J/kg */
  internalEnergy: number;
  enthalpy: number;
  gibbs: number;
  /** J/(kg K) */
  entropy: number;
  cv: number;
  cp: number;
  /** m/s; 0 where the state is mechanically unstable */
  soundSpeed: number;
  /** (dp/drho)_T, Pa m3/kg */
  pressureByDensity: number;
  /** (dp/dT)_rho, Pa/K */
  pressureByTemperature: number;
  /** m3/kg */
  volume: number;
  /** (dv/dT)_p, m3/(kg K) */
  volumeByTemperature: number;
}

/** A state to be filled. */
export function emptyFluidState(): FluidState {
  return {
    temperatureK: 0,
    density: 0,
    pressure: 0,
    internalEnergy: 0,
    enthalpy: 0,
    gibbs: 0,
    entropy: 0,
    cv: 0,
    cp: 0,
    soundSpeed: 0,
    pressureByDensity: 0,
    pressureByTemperature: 0,
    volume: 0,
    volumeByTemperature: 0,
  };
}

const parts = emptyParts();
const ideal: IdealParts = { phi: 0, t: 0, tt: 0 };

/**
 * All properties of fluid water at a temperature and density.
 *
 * f/(R T) = phi0(delta, tau) + phir(delta, tau); delta = rho/rhoc, tau = Tc/T
 *
 * @param temperatureK 130 K to 1273 K for vapour, from the melting curve for liquid (supercooled: from 235 K)
 * @param density kg/m3, above 0
 * @param out filled and given back
 * @source IAPWS R6-95(2018), Table 3
 */
export function fluidState(temperatureK: number, density: number, out: FluidState): FluidState {
  const tau = CRITICAL_TEMPERATURE_K / temperatureK;
  const delta = density / CRITICAL_DENSITY;
  idealPart(tau, ideal);
  residualPart(delta, tau, parts);
  const rt = GAS_CONSTANT * temperatureK;
  const phi = Math.log(delta) + ideal.phi + parts.phi;
  const tauPhiTau = ideal.t + parts.t;
  const z = 1 + parts.d;
  const zByTemperature = z - parts.dt;
  const zByDensity = 1 + 2 * parts.d + parts.dd;
  const cvReduced = -(ideal.tt + parts.tt);
  const cpReduced = cvReduced + (zByTemperature * zByTemperature) / zByDensity;
  out.temperatureK = temperatureK;
  out.density = density;
  out.volume = 1 / density;
  out.pressure = density * rt * z;
  out.internalEnergy = rt * tauPhiTau;
  out.enthalpy = rt * (tauPhiTau + z);
  out.entropy = GAS_CONSTANT * (tauPhiTau - phi);
  out.gibbs = rt * (phi + z);
  out.cv = GAS_CONSTANT * cvReduced;
  out.cp = GAS_CONSTANT * cpReduced;
  out.pressureByDensity = rt * zByDensity;
  out.pressureByTemperature = density * GAS_CONSTANT * zByTemperature;
  out.volumeByTemperature = zByTemperature / (density * temperatureK * zByDensity);
  const square = rt * (zByDensity + (zByTemperature * zByTemperature) / cvReduced);
  out.soundSpeed = square > 0 ? Math.sqrt(square) : 0;
  return out;
}
