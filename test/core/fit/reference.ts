import { readFileSync } from 'node:fs';
import path from 'node:path';
import { expect } from 'vitest';

/** A file of published values. */
export function reference(name: string): unknown {
  return JSON.parse(readFileSync(path.join(import.meta.dirname, '../../reference', name), 'utf8'));
}

export function within(value: number | undefined, expected: number, tolerance: number, what = 'value'): void {
  const difference = Math.abs((value ?? NaN) - expected);
  expect(difference <= tolerance, `${what} ${value} against ${expected}: ${difference}, allowed ${tolerance}`).toBe(
    true,
  );
}

/** Digits that agree: −log₁₀ of the relative deviation. */
export function digits(value: number, expected: number): number {
  return value === expected ? 16 : -Math.log10(Math.abs(value - expected) / Math.abs(expected));
}
