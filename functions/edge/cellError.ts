import { plainWords, Problem, shortNumber, type QuantityWriter } from '../../core/problem';
import type { Settings } from '../settings/settings';
import { CellFault } from './cell';

/** The part of the host's `CustomFunctions` object used here; looked up when throwing, never at load. */
interface HostErrors {
  Error: new (code: string, message?: string) => Error;
}

declare const CustomFunctions: HostErrors;

/** A cell error of the host's own class: only `#VALUE!` and `#N/A` carry words. */
export function cellError(code: string, message: string): Error {
  return message === '' ? new CustomFunctions.Error(code) : new CustomFunctions.Error(code, message);
}

/** Writes temperatures and pressures of a message in the workbook's own units. */
export function writerFor(settings: Settings): QuantityWriter {
  const { temperature, pressure } = settings.units;
  return {
    temperature: (kelvin) => `${shortNumber((kelvin - temperature.offset) / temperature.factor)} ${temperature.symbol}`,
    pressure: (pascal) => {
      const base = pressure.gauge ? pascal - settings.barometerPa : pascal;
      return `${shortNumber((base - pressure.offset) / pressure.factor)} ${pressure.symbol}`;
    },
  };
}

/** Maps what was thrown to a fault; anything that is no `Problem` and no fault is a defect and is rethrown. */
export function faultOf(thrown: unknown, settings?: Settings): CellFault {
  if (thrown instanceof CellFault) return thrown;
  if (!(thrown instanceof Problem)) throw thrown;
  const words = settings === undefined ? thrown.message : plainWords(thrown.data, writerFor(settings));
  return new CellFault(thrown.data.code === 'argument' ? '#VALUE!' : '#N/A', words);
}

/** The host's error for a fault. */
export function errorOf(fault: CellFault): Error {
  return cellError(fault.code, fault.message);
}
