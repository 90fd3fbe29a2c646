import { nasa9Cp } from '../nasa9Cp';
import { nasa9Enthalpy } from '../nasa9Enthalpy';
import { nasa9Gibbs } from '../nasa9Gibbs';
import { NASA9_R, NASA9_STANDARD_PRESSURE_PA } from '../nasa9Source';
import { nasa9Species } from '../nasa9Species';
import type { Nasa9Species } from '../nasa9Types';
import type { VapourRecord } from './record';

/** State of the vapour; amounts are per mole of formula units. One object is used again and again. */
export interface VapourState {
  pressurePa: number;
  /** J/mol */
  enthalpy: number;
  /** At constant pressure, the equilibrium of the species included, J/(mol K). */
  heatCapacity: number;
  /** (∂h/∂p) at constant temperature, from the equilibrium of the species; 0 for one species. J/(mol Pa). */
  enthalpyPerPascal: number;
  /** Formula units in a molecule, on average. */
  unitsPerMolecule: number;
}

const LN_STANDARD = Math.log(NASA9_STANDARD_PRESSURE_PA);

/**
 * An ideal gas of the species of a vapour in equilibrium with one another.
 *
 * ln(pᵢ/p°) = (νᵢ·μ − Gᵢ)/(R·T), νᵢ formula units in a molecule of species i, μ the chemical potential of the formula
 * unit: that of the condensed phase on the two-phase line, else the one that makes Σpᵢ the pressure.
 *
 * h = Σpᵢ·Hᵢ / Σpᵢ·νᵢ, cp = [Σpᵢ·cpᵢ + Σpᵢ·(Hᵢ − νᵢ·h)²/(R·T²)] / Σpᵢ·νᵢ
 */
export class Vapour {
  readonly species: readonly Nasa9Species[];
  readonly units: readonly number[];
  readonly fromK: number;
  readonly toK: number;
  readonly state: VapourState = {
    pressurePa: NaN,
    enthalpy: NaN,
    heatCapacity: NaN,
    enthalpyPerPascal: NaN,
    unitsPerMolecule: NaN,
  };
  private readonly lnP: Float64Array;
  private readonly lnK: Float64Array;

  constructor(record: VapourRecord) {
    this.species = record.species.map(([name]) => nasa9Species(name));
    this.units = record.species.map(([, units]) => units);
    this.fromK = Math.max(...this.species.map(({ fromK }) => fromK));
    this.toK = Math.min(...this.species.map(({ toK }) => toK));
    this.lnP = new Float64Array(this.species.length);
    this.lnK = new Float64Array(this.species.length);
  }

  /** Pressure over a condensed phase whose Gibbs energy per formula unit is given, Pa. */
  pressureOver(temperatureK: number, gibbs: number): number {
    let sum = 0;
    for (let i = 0; i < this.species.length; i++) sum += Math.exp(this.lnPressure(i, temperatureK, gibbs));
    return sum;
  }

  /** State in equilibrium with a condensed phase. */
  over(temperatureK: number, gibbs: number): VapourState {
    for (let i = 0; i < this.species.length; i++) this.lnP[i] = this.lnPressure(i, temperatureK, gibbs);
    return this.filled(temperatureK);
  }

  /** State at a temperature and a pressure. */
  at(temperatureK: number, pressurePa: number): VapourState {
    const { lnK, lnP, units } = this;
    const lnPressure = Math.log(pressurePa);
    let potential = Infinity;
    for (let i = 0; i < lnK.length; i++) {
      const k = this.lnPressure(i, temperatureK, 0);
      lnK[i] = k;
      potential = Math.min(potential, (lnPressure - k) / (units[i] ?? 1));
    }
    // ln Σ exp is convex and the start lies above the root: Newton's steps fall onto it from one side
    for (let step = 0; step < 30; step++) {
      let sum = 0;
      let weighted = 0;
      for (let i = 0; i < lnK.length; i++) {
        const part = Math.exp((lnK[i] ?? 0) + (units[i] ?? 1) * potential - lnPressure);
        sum += part;
        weighted += part * (units[i] ?? 1);
      }
      const change = (Math.log(sum) * sum) / weighted;
      potential -= change;
      if (Math.abs(change) < 1e-13 * Math.abs(potential)) break;
    }
    for (let i = 0; i < lnP.length; i++) lnP[i] = (lnK[i] ?? 0) + (units[i] ?? 1) * potential;
    return this.filled(temperatureK);
  }

  private lnPressure(i: number, temperatureK: number, gibbs: number): number {
    const species = this.species[i];
    if (species === undefined) return -Infinity;
    return LN_STANDARD + ((this.units[i] ?? 1) * gibbs - nasa9Gibbs(species, temperatureK)) / (NASA9_R * temperatureK);
  }

  private filled(temperatureK: number): VapourState {
    const { species, units, lnP, state } = this;
    let pressure = 0;
    let perUnit = 0;
    let enthalpy = 0;
    for (let i = 0; i < species.length; i++) {
      const one = species[i];
      if (one === undefined) continue;
      const p = Math.exp(lnP[i] ?? 0);
      pressure += p;
      perUnit += p * (units[i] ?? 1);
      enthalpy += p * nasa9Enthalpy(one, temperatureK);
    }
    enthalpy /= perUnit;
    let heatCapacity = 0;
    let perPascal = 0;
    for (let i = 0; i < species.length; i++) {
      const one = species[i];
      if (one === undefined) continue;
      const p = Math.exp(lnP[i] ?? 0);
      const nu = units[i] ?? 1;
      const off = nasa9Enthalpy(one, temperatureK) - nu * enthalpy;
      heatCapacity += p * (nasa9Cp(one, temperatureK) + (off * off) / (NASA9_R * temperatureK * temperatureK));
      perPascal += p * nu * off;
    }
    state.pressurePa = pressure;
    state.enthalpy = enthalpy;
    state.heatCapacity = heatCapacity / perUnit;
    state.enthalpyPerPascal = species.length === 1 ? 0 : perPascal / (perUnit * perUnit);
    state.unitsPerMolecule = perUnit / pressure;
    return state;
  }
}
