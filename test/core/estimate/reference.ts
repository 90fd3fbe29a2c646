import { readFileSync } from 'node:fs';
import { expect } from 'vitest';

export interface Fluid {
  readonly name: string;
  readonly associating: boolean;
  readonly boilingK: number;
  readonly criticalK: number;
  readonly criticalBar: number;
  readonly acentricFactor: number;
  /** kJ/mol, printed. */
  readonly latentAtBoiling: number;
  readonly cold?: { readonly temperatureK: number; readonly latent: number };
}

interface Reference {
  readonly workedExamples: readonly {
    readonly id: string;
    readonly result: { readonly value: number; readonly intermediate?: number };
    readonly recomputed?: number;
  }[];
  readonly computedBenchmarks: readonly (Omit<Fluid, 'associating' | 'latentAtBoiling'> & {
    readonly listed: number;
    readonly computed: Readonly<Record<string, number>>;
  })[];
  readonly fluids: readonly Fluid[];
  readonly liquids: readonly { readonly name: string; readonly liquid: number; readonly gas: number }[];
  readonly crystals: readonly { readonly name: string; readonly solid: number; readonly gas: number }[];
  readonly solids: readonly { readonly species: string; readonly formula: string; readonly heatCapacity: number }[];
}

export const reference = JSON.parse(
  readFileSync(new URL('../../reference/estimate-methods.json', import.meta.url), 'utf8'),
) as Reference;

export const nonAssociating = reference.fluids.filter(({ associating }) => !associating);

export function exampleOf(id: string): Reference['workedExamples'][number] {
  const found = reference.workedExamples.find((example) => example.id === id);
  if (found === undefined) throw new Error(`no worked example ${id}`);
  return found;
}

export function rootMeanSquare(values: readonly number[]): number {
  return Math.sqrt(values.reduce((sum, value) => sum + value * value, 0) / values.length);
}

export function near(value: number, expected: number, within: number, of = ''): void {
  expect(Math.abs(value - expected), `${of} ${value} against ${expected}, allowed ${within}`).toBeLessThanOrEqual(
    within,
  );
}

/** The stated typical error is the scatter that was found: not smaller, and not padded by more than a third. */
export function statesScatter(stated: number, found: readonly number[]): void {
  const scatter = rootMeanSquare(found);
  expect(scatter, `scatter ${scatter}, stated ${stated}`).toBeLessThanOrEqual(stated);
  expect(stated, `scatter ${scatter}, stated ${stated}`).toBeLessThanOrEqual(1.34 * scatter);
}
