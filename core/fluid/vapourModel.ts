import { nasa9Cp } from '../nasa9/nasa9Cp';
import { nasa9Enthalpy } from '../nasa9/nasa9Enthalpy';
import { nasa9Gibbs } from '../nasa9/nasa9Gibbs';
import { NASA9_R } from '../nasa9/nasa9Source';
import type { Nasa9Species } from '../nasa9/nasa9Types';
import { MOLAR_GAS_CONSTANT, STANDARD_PRESSURE_PA } from './constants';
import { emptyDeparture, vapourDeparture } from './leeKesler';

/** What the vapour of a substance is made of. */
export interface VapourModel {
  readonly criticalK: number;
  readonly criticalPa: number;
  readonly acentric: number;
  /** Polar term of the departure. */
  readonly polar: number;
  /** Hydrogen-bond term of the departure. */
  readonly bonding: number;
  readonly ideal: Nasa9Species;
  /** Pairs of molecules that the vapour forms, as a species of its own. */
  readonly dimer?: Nasa9Species;
  /** Fitted shifts of the heat of pairing, J/mol of pairs, and of the logarithm of its constant. */
  readonly pairing?: Pairing;
}

export interface Pairing {
  readonly heat: number;
  readonly lnConstant: number;
}

const UNSHIFTED: Pairing = { heat: 0, lnConstant: 0 };

/** Temperature at which the shift of the constant is stated, K. */
const PAIRING_K = 373.15;

/** A state of the vapour, per mole of single molecules. */
export interface VapourState {
  /** pv/(RT) */
  compressibility: number;
  /** J/mol */
  enthalpy: number;
  /** J/(mol K), at constant pressure */
  heatCapacity: number;
  /** Derivative of the enthalpy with pressure, J/(mol Pa). */
  byPressure: number;
}

export function emptyVapourState(): VapourState {
  return { compressibility: NaN, enthalpy: NaN, heatCapacity: NaN, byPressure: NaN };
}

const departure = emptyDeparture();

/**
 * Enthalpy and heat capacity of a real vapour: ideal gas, association in pairs where there is a dimer, and departure.
 *
 * Association: y·(1 − y)/(1 − 2y)² = K·p/p°, ln K = −ΔG°/(RT), where y is the amount of dimer per mole of molecules;
 * heat of pairing and constant carry fitted shifts.
 *
 * @param pressurePa above 0
 * @returns false where the equation has no vapour
 */
export function vapourState(model: VapourModel, temperatureK: number, pressurePa: number, out: VapourState): boolean {
  const { criticalK, criticalPa, acentric, polar, bonding, ideal, dimer } = model;
  const t = temperatureK / criticalK;
  if (!vapourDeparture(t, pressurePa / criticalPa, acentric, polar, bonding, departure)) return false;
  out.compressibility = departure.compressibility;
  out.enthalpy = nasa9Enthalpy(ideal, temperatureK) + MOLAR_GAS_CONSTANT * criticalK * departure.enthalpy;
  out.heatCapacity = nasa9Cp(ideal, temperatureK) + MOLAR_GAS_CONSTANT * departure.heatCapacity;
  out.byPressure = (MOLAR_GAS_CONSTANT * criticalK * departure.byPressure) / criticalPa;
  if (dimer !== undefined) associate(ideal, dimer, model.pairing ?? UNSHIFTED, temperatureK, pressurePa, out);
  return true;
}

function associate(
  monomer: Nasa9Species,
  dimer: Nasa9Species,
  shift: Pairing,
  t: number,
  p: number,
  out: VapourState,
): void {
  const heat = nasa9Enthalpy(dimer, t) - 2 * nasa9Enthalpy(monomer, t) + shift.heat;
  const free = nasa9Gibbs(dimer, t) - 2 * nasa9Gibbs(monomer, t);
  const ln = -free / (NASA9_R * t) + shift.lnConstant - (shift.heat / NASA9_R) * (1 / t - 1 / PAIRING_K);
  const q = (Math.exp(ln) * p) / STANDARD_PRESSURE_PA;
  const root = 1 / Math.sqrt(1 + 4 * q);
  const pairs = (1 - root) / 2;
  const byQ = root * root * root;
  out.compressibility *= 1 - pairs;
  out.enthalpy += pairs * heat;
  out.heatCapacity +=
    pairs * (nasa9Cp(dimer, t) - 2 * nasa9Cp(monomer, t)) + (byQ * q * heat * heat) / (NASA9_R * t * t);
  out.byPressure += (byQ * q * heat) / p;
}
