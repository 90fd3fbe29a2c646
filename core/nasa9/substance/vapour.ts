import { NASA9_R, NASA9_STANDARD_PRESSURE_PA } from '../nasa9Source';
import { nasa9Species } from '../nasa9Species';
import { emptyNasa9State, nasa9State } from '../nasa9State';
import type { Nasa9Species } from '../nasa9Types';
import type { VapourRecord } from './record';

/** State of a vapour; amounts are per mole of formula units. */
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

/** A vapour, and what it knows of its last state: each call overwrites what the one before gave. */
export interface Vapour {
  readonly species: readonly Nasa9Species[];
  readonly units: readonly number[];
  readonly fromK: number;
  readonly toK: number;
  /** State in equilibrium with a condensed phase whose Gibbs energy per formula unit is given. */
  over(temperatureK: number, gibbs: number): VapourState;
  /** State at a temperature and a pressure. */
  at(temperatureK: number, pressurePa: number): VapourState;
}

const LN_STANDARD = Math.log(NASA9_STANDARD_PRESSURE_PA);

/** Newton's steps to the chemical potential; they converge from one side, so that few are ever taken. */
const MOST_STEPS = 40;

/**
 * An ideal gas of the species of a vapour in equilibrium with one another.
 *
 * ln(pᵢ/p°) = (νᵢ·μ − Gᵢ)/(R·T), νᵢ formula units in a molecule of species i, μ the chemical potential of the formula
 * unit: that of the condensed phase on the two-phase line, else the one that makes Σpᵢ the pressure.
 *
 * h = Σpᵢ·Hᵢ / Σpᵢ·νᵢ, cp = [Σpᵢ·cpᵢ + Σpᵢ·(Hᵢ − νᵢ·h)²/(R·T²)] / Σpᵢ·νᵢ, (∂h/∂p) = Σpᵢ·νᵢ·(Hᵢ − νᵢ·h) / (Σpᵢ·νᵢ)²
 */
export function makeVapour(record: VapourRecord): Vapour {
  const species = record.species.map(([name]) => nasa9Species(name));
  const units = record.species.map(([, one]) => one);
  const n = species.length;
  const one = emptyNasa9State();
  const state: VapourState = {
    pressurePa: NaN,
    enthalpy: NaN,
    heatCapacity: NaN,
    enthalpyPerPascal: NaN,
    unitsPerMolecule: NaN,
  };
  const heat = new Float64Array(n);
  const capacity = new Float64Array(n);
  /** ln pᵢ, then pᵢ */
  const partial = new Float64Array(n);
  const nu = Float64Array.from(units);

  /** Enthalpies, heat capacities, and ln pᵢ for a chemical potential of the formula unit, J/mol. */
  function fill(t: number, potential: number): void {
    const perRt = 1 / (NASA9_R * t);
    for (let i = 0; i < n; i++) {
      const kind = species[i];
      if (kind === undefined) return;
      nasa9State(kind, t, one);
      heat[i] = one.enthalpy;
      capacity[i] = one.heatCapacity;
      partial[i] = LN_STANDARD + ((nu[i] ?? 1) * potential - one.gibbs) * perRt;
    }
  }

  function finish(t: number): VapourState {
    let pressure = 0;
    let perUnit = 0;
    let enthalpy = 0;
    for (let i = 0; i < n; i++) {
      const p = Math.exp(partial[i] ?? 0);
      partial[i] = p;
      pressure += p;
      perUnit += p * (nu[i] ?? 1);
      enthalpy += p * (heat[i] ?? 0);
    }
    enthalpy /= perUnit;
    const perRtt = 1 / (NASA9_R * t * t);
    let heatCapacity = 0;
    let perPascal = 0;
    for (let i = 0; i < n; i++) {
      const p = partial[i] ?? 0;
      const off = (heat[i] ?? 0) - (nu[i] ?? 1) * enthalpy;
      heatCapacity += p * ((capacity[i] ?? 0) + off * off * perRtt);
      perPascal += p * (nu[i] ?? 1) * off;
    }
    state.pressurePa = pressure;
    state.enthalpy = enthalpy;
    state.heatCapacity = heatCapacity / perUnit;
    state.enthalpyPerPascal = n === 1 ? 0 : perPascal / (perUnit * perUnit);
    state.unitsPerMolecule = perUnit / pressure;
    return state;
  }

  function alone(t: number, lnPressure: (gibbs: number) => number): VapourState {
    const kind = species[0];
    const per = nu[0] ?? 1;
    if (kind !== undefined) nasa9State(kind, t, one);
    state.pressurePa = Math.exp(lnPressure(one.gibbs));
    state.enthalpy = one.enthalpy / per;
    state.heatCapacity = one.heatCapacity / per;
    state.enthalpyPerPascal = 0;
    state.unitsPerMolecule = per;
    return state;
  }

  /** Makes Σpᵢ the pressure by shifting the potential: ln Σ exp is convex, and the start lies above the root. */
  function shift(pressurePa: number): void {
    const wanted = Math.log(pressurePa);
    let potential = Infinity;
    for (let i = 0; i < n; i++) potential = Math.min(potential, (wanted - (partial[i] ?? 0)) / (nu[i] ?? 1));
    for (let step = 0; step < MOST_STEPS; step++) {
      let sum = 0;
      let weighted = 0;
      for (let i = 0; i < n; i++) {
        const part = Math.exp((partial[i] ?? 0) + (nu[i] ?? 1) * potential - wanted);
        sum += part;
        weighted += part * (nu[i] ?? 1);
      }
      potential -= (Math.log(sum) * sum) / weighted;
      if (!(sum - 1 > 1e-8)) break;
    }
    for (let i = 0; i < n; i++) partial[i] = (partial[i] ?? 0) + (nu[i] ?? 1) * potential;
  }

  return {
    species,
    units,
    fromK: Math.max(...species.map(({ fromK }) => fromK)),
    toK: Math.min(...species.map(({ toK }) => toK)),
    over(t, gibbs) {
      if (n === 1) return alone(t, (own) => LN_STANDARD + ((nu[0] ?? 1) * gibbs - own) / (NASA9_R * t));
      fill(t, gibbs);
      return finish(t);
    },
    at(t, pressurePa) {
      if (n === 1) return alone(t, () => Math.log(pressurePa));
      fill(t, 0);
      shift(pressurePa);
      return finish(t);
    },
  };
}
