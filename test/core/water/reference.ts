import { readFileSync } from 'node:fs';
import { expect } from 'vitest';

/** One expected number of a reference file. */
export interface Expected {
  readonly value: number;
  readonly unit: string;
  /** Half a unit of the last printed digit. */
  readonly within: number;
  /** Relative deviation of the printed figure from R6-95 (with R10-06), two digits. */
  readonly deviation?: number;
  /** Relative deviation of R6-95 from the printed figure, two digits. */
  readonly deviationOfR695?: number;
  /** Relative deviation of the R14-08 fit from phase equilibrium, two digits. */
  readonly deviationOfFit?: number;
}

export interface Check {
  readonly id: string;
  readonly table: string;
  readonly model: string;
  readonly status: string;
  readonly source: string;
  readonly at: Readonly<Record<string, number>>;
  readonly expected: Readonly<Record<string, Expected>>;
}

/** The checks of one file of test/reference. */
export function checksOf(file: string): Check[] {
  const text = readFileSync(new URL(`../../reference/${file}`, import.meta.url), 'utf8');
  return (JSON.parse(text) as { checks: Check[] }).checks;
}

export const MOLAR_MASS = 0.018015268;

/** SI value of one unit of the reference files; molar figures per kilogram. */
const FACTORS: Readonly<Record<string, number>> = {
  1: 1,
  Pa: 1,
  MPa: 1e6,
  K: 1,
  'Pa/K': 1,
  'MPa/K': 1e6,
  'kg/m3': 1,
  'm3/kg': 1,
  'J/kg': 1,
  'J/g': 1e3,
  'kJ/kg': 1e3,
  'MJ/kg': 1e6,
  'J/mol': 1 / MOLAR_MASS,
  'kJ/mol': 1e3 / MOLAR_MASS,
  'cal/mol': 4.184 / MOLAR_MASS,
  'J/(kg K)': 1,
  'J/(g K)': 1e3,
  'kJ/(kg K)': 1e3,
  'J/(mol K)': 1 / MOLAR_MASS,
  'J/(kg K2)': 1,
  'm/s': 1,
  '1/K': 1,
  '1/Pa': 1,
  'Pa/K ': 1,
  'm3/(kg Pa)': 1,
  'm3/(kg K)': 1,
};

export function inSi(expected: Expected): number {
  return expected.value * factor(expected);
}

function factor({ unit }: Expected): number {
  const known = FACTORS[unit];
  if (known === undefined) throw new Error(`no factor for the unit ${unit}`);
  return known;
}

/** Asserts |actual - expected| <= tolerance and shows all four numbers when it fails. */
export function expectWithin(actual: number, expected: number, tolerance: number, what: string): void {
  const difference = actual - expected;
  const words = `${what}: value ${actual}, expected ${expected}, difference ${difference}, tolerance ${tolerance}`;
  expect(Math.abs(difference) <= tolerance, words).toBe(true);
}

/**
 * All printed digits are reproduced: half a unit of the last one, and 1e-12 of the value for rounding in double
 * precision of a sum whose terms are up to a thousand times larger.
 */
export function expectPrinted(actual: number, expected: Expected, what: string): void {
  const value = inSi(expected);
  expectWithin(actual, value, expected.within * factor(expected) + 1e-12 * Math.abs(value), what);
}

/** A deviation is stated with two digits; a figure with few digits of its own adds half a unit of its last one. */
export function expectDeviation(actual: number, stated: number, own: number, what: string): void {
  const unit = 10 ** (Math.floor(Math.log10(Math.abs(stated))) - 1);
  expectWithin(actual, stated, 0.5 * unit + own, what);
}
