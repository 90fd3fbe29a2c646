import { differenceUnit } from '../../core/units/differenceUnit';
import { unitOf } from '../../core/units/unitOf';
import type { QuantityKind, Unit } from '../../core/units/unit';
import type { Settings } from '../settings/settings';

/** The unit in which a bare number of this kind is read and written. */
export function unitFor(kind: QuantityKind, settings: Settings): Unit {
  switch (kind) {
    case 'temperature':
    case 'pressure':
    case 'heat':
    case 'heatCapacity':
    case 'amount':
    case 'energy':
    case 'flow':
    case 'power':
      return settings.units[kind];
    case 'difference':
      return differenceUnit(settings.units.temperature);
    default:
      return unitOf(SI_SYMBOL[kind], kind);
  }
}

const SI_SYMBOL: Record<'molarMass' | 'length' | 'volume' | 'volumeFlow' | 'time' | 'share', string> = {
  molarMass: 'kg/mol',
  length: 'm',
  volume: 'm3',
  volumeFlow: 'm3/s',
  time: 's',
  share: '1',
};
