import type { Unit } from '../../core/units/unit';
import type { Settings } from '../settings/settings';
import type { CellScale } from './curvePlan';

/** Cell scale of a quantity per amount (J/mol, J/(mol K) in the core), per mass or mole as the unit says. */
export function perAmount(unit: Unit, molarMass: number): CellScale {
  return { scale: unit.basis === 'mass' ? 1 / (molarMass * unit.factor) : 1 / unit.factor, shift: 0 };
}

/** Cell scale of a temperature or a pressure; gauge pressures have the barometer taken off. */
export function onScale(unit: Unit, settings: Settings): CellScale {
  const offset = unit.offset + (unit.gauge ? settings.barometerPa : 0);
  return { scale: 1 / unit.factor, shift: -offset / unit.factor };
}

/** The same scale with the sign turned, for words of opposite direction. */
export function signed(cell: CellScale, sign: 1 | -1): CellScale {
  return sign === 1 ? cell : { scale: -cell.scale, shift: -cell.shift };
}
