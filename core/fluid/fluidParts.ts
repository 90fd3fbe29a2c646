import { Problem } from '../problem';
import { fluidLine, type FluidLine } from './fluidLine';
import type { FluidNumbers } from './fluidNumbers';
import { gasPhase, type GasPhase } from './gasPhase';
import { liquidPhase, type LiquidPhase } from './liquidPhase';
import { solidPhase, type SolidPhase } from './solidPhase';
import { sublimationLine, type SublimationLine } from './sublimationLine';

/** A fluid, taken apart into its phases, which share one enthalpy. */
export interface FluidParts {
  readonly numbers: FluidNumbers;
  readonly line: FluidLine;
  readonly liquid: LiquidPhase;
  /** Absent where no heat capacity of the ideal gas is known. */
  readonly gas?: GasPhase;
  readonly solid?: SolidPhase;
  /** Where both solid and vapour are known. */
  readonly sublimation?: SublimationLine;
  /** Highest pressure of vapour and of heating paths: the end of the line where vapour is described. */
  readonly highestVapourPa: number;
  readonly highestLiquidPa: number;
}

/** Liquid is followed to this multiple of the critical pressure. */
const LIQUID_REACH = 2;

export function fluidParts(numbers: FluidNumbers): FluidParts {
  const line = fluidLine(numbers);
  const { ideal } = numbers;
  const solid = solidPhase(numbers, line);
  const gas = ideal === undefined ? undefined : gasPhase(numbers, ideal, line);
  const both = solid !== undefined && gas !== undefined;
  return {
    numbers,
    line,
    liquid: liquidPhase(numbers, line),
    ...(gas === undefined ? {} : { gas }),
    ...(solid === undefined ? {} : { solid }),
    ...(both ? { sublimation: sublimationLine(numbers, line, solid, gas) } : {}),
    highestVapourPa: line.pressure(numbers.vapourToK),
    highestLiquidPa: LIQUID_REACH * numbers.criticalPa,
  };
}

/** The ideal-gas heat capacity that a question needs and this fluid lacks. */
export function requireGas({ gas, numbers }: FluidParts): GasPhase {
  if (gas !== undefined) return gas;
  throw lacking(`heat capacity of ${numbers.name} vapour`);
}

export function lacking(subject: string): Problem {
  return new Problem({ code: 'missing', subject, reason: 'not in the catalogue' });
}
