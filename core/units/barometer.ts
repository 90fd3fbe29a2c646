import { Problem } from '../problem';
import type { Unit } from './unit';

/** What a unit adds on top of its own offset: the barometer for gauge pressures, in Pa. */
export function barometerOf(unit: Unit, barometerPa: number | undefined): number {
  if (!unit.gauge) return 0;
  if (barometerPa !== undefined) return barometerPa;
  throw new Problem({
    code: 'argument',
    argument: 'barometer',
    allowed: `an absolute pressure, since ${unit.symbol} is counted from it`,
    received: 'nothing',
  });
}
