import type { Decimal } from '../../core/units/parseNumber';
import type { Unit } from '../../core/units/unit';
import type { UnitSetting } from './schema';

/** The settings that a cell function works under: the workbook's units and what the formula says beside them. */
export interface Settings {
  readonly units: Readonly<Record<UnitSetting, Unit>>;
  /** Absolute pressure that gauge pressures are counted from, Pa. */
  readonly barometerPa: number;
  readonly outOfRange: 'refuse' | 'extend';
  readonly decimal: Decimal;
  /** Keys that are no unit settings, as the function spells them: `kind`, `at_pressure`. */
  readonly options: Readonly<Record<string, string>>;
}
