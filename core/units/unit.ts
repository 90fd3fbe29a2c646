/** Kinds of quantity that a cell can hold. A temperature and a temperature difference are different kinds. */
export type QuantityKind =
  | 'temperature'
  | 'difference'
  | 'pressure'
  | 'heat' // energy per amount: J/kg or J/mol
  | 'heatCapacity' // energy per amount and kelvin: J/(kg K) or J/(mol K)
  | 'amount' // kg or mol
  | 'energy'
  | 'flow' // kg/s or mol/s
  | 'power'
  | 'molarMass'
  | 'length'
  | 'volume'
  | 'volumeFlow'
  | 'time'
  | 'share'; // 1, %

/** Further kinds that a unit can measure: conversions take them, cells of other functions do not. */
export type UnitKind =
  | QuantityKind
  | 'area'
  | 'density'
  | 'specificVolume'
  | 'bodyHeatCapacity' // J/K
  | 'heatFlux' // W/m2
  | 'heatTransfer' // W/(m2 K)
  | 'heatingRate' // K/s
  | 'specificPower' // W/kg
  | 'force';

export type Basis = 'mass' | 'mole' | null;

/** SI value = factor · x + offset. The offset is non-zero only for temperature scales and gauge pressures. */
export interface Unit {
  /** The one spelling this project writes: `kJ/kg`, `degC`, `kPa`, `kPa gauge`. */
  readonly symbol: string;
  readonly kind: UnitKind;
  readonly factor: number;
  readonly offset: number;
  /** Which amount the unit is per (or of), for heat, heat capacity, amount and flow. */
  readonly basis: Basis;
  /** Gauge pressures: the barometer is added on top. */
  readonly gauge: boolean;
}
