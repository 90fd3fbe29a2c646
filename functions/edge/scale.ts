import type { Linear } from '../../core/units/linear';
import { unitOf } from '../../core/units/unitOf';
import { between } from '../../core/units/linear';
import type { Unit } from '../../core/units/unit';
import type { Settings } from '../settings/settings';

/** From kelvin or pascal to the workbook's unit; gauge pressures have the barometer taken off. */
export function onScale(unit: Unit, settings: Settings): Linear {
  const { scale, offset } = between(unitOf(unit.kind === 'pressure' ? 'Pa' : 'K'), unit);
  return { scale, offset: unit.gauge ? offset - settings.barometerPa / unit.factor : offset };
}

/** The same with the sign turned, for words of opposite direction. */
export function signed({ scale, offset }: Linear, sign: 1 | -1): Linear {
  return { scale: sign * scale, offset: sign * offset };
}
