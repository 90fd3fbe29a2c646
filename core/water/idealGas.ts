import { CRITICAL_TEMPERATURE_K, GAS_CONSTANT } from './fluidCoefficients';
import { idealPart, type IdealParts } from './idealPart';

const ideal: IdealParts = { phi: 0, t: 0, tt: 0 };

/** Enthalpy of ideal-gas water, h = R T (1 + tau phi0_tau), J/kg, from 130 K (IAPWS R6-95(2018)). */
export function idealGasEnthalpy(temperatureK: number): number {
  return GAS_CONSTANT * temperatureK * (1 + idealPart(CRITICAL_TEMPERATURE_K / temperatureK, ideal).t);
}

/** Isobaric heat capacity of ideal-gas water, cp = R (1 - tau^2 phi0_tautau), J/(kg K), from 130 K (IAPWS R6-95(2018)). */
export function idealGasHeatCapacity(temperatureK: number): number {
  return GAS_CONSTANT * (1 - idealPart(CRITICAL_TEMPERATURE_K / temperatureK, ideal).tt);
}
