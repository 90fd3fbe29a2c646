import { unitOf } from './unitOf';
import type { Basis, Unit, UnitKind } from './unit';

const SI_SYMBOLS: Record<UnitKind, string> = {
  temperature: 'K',
  difference: 'K',
  pressure: 'Pa',
  heat: 'J/kg',
  heatCapacity: 'J/(kg K)',
  amount: 'kg',
  energy: 'J',
  flow: 'kg/s',
  power: 'W',
  molarMass: 'kg/mol',
  length: 'm',
  area: 'm2',
  volume: 'm3',
  volumeFlow: 'm3/s',
  time: 's',
  share: '1',
  density: 'kg/m3',
  specificVolume: 'm3/kg',
  bodyHeatCapacity: 'J/K',
  heatFlux: 'W/m2',
  heatTransfer: 'W/(m2 K)',
  heatingRate: 'K/s',
  specificPower: 'W/kg',
  force: 'N',
};

const MOLAR_SYMBOLS: Partial<Record<UnitKind, string>> = {
  heat: 'J/mol',
  heatCapacity: 'J/(mol K)',
  amount: 'mol',
  flow: 'mol/s',
};

/** The SI unit of a kind; per mass where the kind is per amount, unless moles are asked for. */
export function siUnit(kind: UnitKind, basis: Basis = 'mass'): Unit {
  return unitOf((basis === 'mole' ? MOLAR_SYMBOLS[kind] : undefined) ?? SI_SYMBOLS[kind], kind);
}
