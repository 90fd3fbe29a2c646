import type { Check } from './check';
import { FLUID_CHECK_ROWS, FLUID_CHECK_SOURCES, type Printed } from './fluidCheckRows';

const BECAUSE =
  'the expanded uncertainty stated there and 1 % of the printed value (2 % from memory) in quadrature, or the spread of prints';
const BECAUSE_K = 'the expanded uncertainty stated there, or the spread of prints';

const molar = (name: string, change: string, temperatureK: number | undefined, printed: Printed): Check[] =>
  printed === 0
    ? []
    : [
        {
          call: 'LATENT',
          args: [name, change, ...(temperatureK === undefined ? [] : [temperatureK])],
          settings: 'temperature=K; heat=kJ/mol',
          expected: printed[0],
          within: printed[1],
          because: BECAUSE,
          source: sourceAt(printed[2]),
        },
      ];

const boils = (name: string, printed: Printed): Check[] =>
  printed === 0
    ? []
    : [
        {
          call: 'SATTEMPERATURE',
          args: [name, 101.325],
          settings: 'temperature=K; pressure=kPa',
          expected: printed[0],
          within: printed[1],
          because: BECAUSE_K,
          source: sourceAt(printed[2]),
        },
      ];

function sourceAt(index: number): string {
  return FLUID_CHECK_SOURCES[index] ?? '';
}

/** Printed values for the fluids: boiling point, heats of vaporization there and at 298.15 K, heat of fusion. */
export const fluidChecks: readonly Check[] = FLUID_CHECK_ROWS.flatMap(([name, boiling, atBoiling, at298, fusion]) => [
  ...boils(name, boiling),
  ...(boiling === 0 ? [] : molar(name, 'vaporization', boiling[0], atBoiling)),
  ...molar(name, 'vaporization', 298.15, at298),
  ...molar(name, 'fusion', undefined, fusion),
]);
