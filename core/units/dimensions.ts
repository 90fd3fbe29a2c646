import type { Basis, UnitKind } from './unit';

/** Powers of mass, length, time, temperature and amount of substance. */
export type Dimensions = readonly [mass: number, length: number, time: number, temperature: number, amount: number];

/** What the groups of the factor table measure. */
export const GROUP_DIMENSIONS = {
  temperature: [0, 0, 0, 1, 0],
  length: [0, 1, 0, 0, 0],
  mass: [1, 0, 0, 0, 0],
  amount: [0, 0, 0, 0, 1],
  time: [0, 0, 1, 0, 0],
  volume: [0, 3, 0, 0, 0],
  force: [1, 1, -2, 0, 0],
  pressure: [1, -1, -2, 0, 0],
  energy: [1, 2, -2, 0, 0],
  power: [1, 2, -3, 0, 0],
} as const satisfies Record<string, Dimensions>;

interface Measure {
  readonly kind: UnitKind;
  readonly basis: Basis;
}

const MEASURES: readonly (readonly [Dimensions, UnitKind, Basis?])[] = [
  [[0, 0, 0, 1, 0], 'temperature'],
  [[1, -1, -2, 0, 0], 'pressure'],
  [[0, 2, -2, 0, 0], 'heat', 'mass'],
  [[1, 2, -2, 0, -1], 'heat', 'mole'],
  [[0, 2, -2, -1, 0], 'heatCapacity', 'mass'],
  [[1, 2, -2, -1, -1], 'heatCapacity', 'mole'],
  [[1, 0, 0, 0, 0], 'amount', 'mass'],
  [[0, 0, 0, 0, 1], 'amount', 'mole'],
  [[1, 2, -2, 0, 0], 'energy'],
  [[1, 0, -1, 0, 0], 'flow', 'mass'],
  [[0, 0, -1, 0, 1], 'flow', 'mole'],
  [[1, 2, -3, 0, 0], 'power'],
  [[1, 0, 0, 0, -1], 'molarMass'],
  [[0, 1, 0, 0, 0], 'length'],
  [[0, 2, 0, 0, 0], 'area'],
  [[0, 3, 0, 0, 0], 'volume'],
  [[0, 3, -1, 0, 0], 'volumeFlow'],
  [[0, 0, 1, 0, 0], 'time'],
  [[0, 0, 0, 0, 0], 'share'],
  [[1, -3, 0, 0, 0], 'density'],
  [[-1, 3, 0, 0, 0], 'specificVolume'],
  [[1, 2, -2, -1, 0], 'bodyHeatCapacity'],
  [[1, 0, -3, 0, 0], 'heatFlux'],
  [[1, 0, -3, -1, 0], 'heatTransfer'],
  [[0, 0, -1, 1, 0], 'heatingRate'],
  [[0, 2, -3, 0, 0], 'specificPower'],
  [[1, 1, -2, 0, 0], 'force'],
];

const byDimensions = new Map<string, Measure>(
  MEASURES.map(([dimensions, kind, basis = null]) => [dimensions.join(), { kind, basis }]),
);

/** What a product of these dimensions measures, and per or of which amount. */
export function measureOf(dimensions: readonly number[]): Measure | undefined {
  return byDimensions.get(dimensions.join());
}
