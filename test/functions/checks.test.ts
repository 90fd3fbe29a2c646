import { describe, expect, it } from 'vitest';
import { formulaOf } from '../../functions/checks/check';
import { settingsStore } from '../../functions/settings/store';
import { selfCheck } from '../../functions/selfCheck';
import './host';
import { checks } from '../../functions/checks/checks';

settingsStore.publish({ state: 'absent' });

describe('published values, each with its source', () => {
  it.each(
    checks.map(
      (entry) => [`${entry.check.source}: ${formulaOf(entry.check)}${entry.check.pick?.label ?? ''}`, entry] as const,
    ),
  )('%s', (_, { check, run }) => {
    const value = run();
    const deviation = Math.abs(value - check.expected);
    expect(
      deviation,
      `${value} against ${check.expected}, allowed ${check.within}: ${check.because}`,
    ).toBeLessThanOrEqual(check.within);
  });

  it('SELFCHECK lists them all and counts what passes', () => {
    const [head, ...rows] = selfCheck() as unknown[][];
    expect(rows).toHaveLength(checks.length);
    expect(head?.[0]).toBe(`${checks.length} of ${checks.length} pass`);
    for (const row of rows) expect(row[0]).toBe('pass');
  });

  it('every check names its source and why its tolerance is what it is', () => {
    for (const { check } of checks) {
      expect(check.source.length).toBeGreaterThan(10);
      expect(check.because.length).toBeGreaterThan(5);
      expect(check.within).toBeGreaterThan(0);
    }
  });
});
