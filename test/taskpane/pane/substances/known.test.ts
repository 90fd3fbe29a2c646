import { describe, expect, it } from 'vitest';
import { water } from '../../../../core/water/water';
import { disagreements } from '../../../../taskpane/pane/substances/known/disagreements';
import { knownOf } from '../../../../taskpane/pane/substances/known/knownOf';
import { percent } from '../../../../taskpane/pane/substances/known/percent';
import { madeUp } from './madeUp';

const ATMOSPHERE = 101_325;

describe('knownOf', () => {
  it('lists changes by kind with their slopes, then properties, each with its range', () => {
    const { known, unknown } = knownOf(water, ATMOSPHERE);
    const items = known.map(({ item }) => item);
    expect(items.slice(0, 2)).toEqual(['fusion, isobaric', 'slope of fusion, isobaric']);
    expect(items).toContain('vaporization, coexistence');
    expect(items).toContain('saturation pressure');
    const vaporization = known.find(({ item }) => item === 'vaporization, coexistence');
    expect(vaporization?.curve.sources.join()).toContain('IAPWS');
    for (const { problem } of unknown) expect(['missing', 'argument', 'range']).toContain(problem.code);
  });

  it('says what is missing, and marks what nobody has confirmed', () => {
    const { known, unknown } = knownOf(madeUp(), ATMOSPHERE);
    expect(unknown.map(({ item }) => item)).toContain('saturation pressure');
    const flagged = known.filter(({ unconfirmed }) => unconfirmed);
    for (const { marks } of flagged) expect(marks.length).toBeGreaterThan(0);
    expect(known.find(({ item }) => item === 'heat capacity, solid (alpha)')?.curve.to).toBeCloseTo(333.15, 9);
  });
});

describe('disagreements', () => {
  it('compares between 25 °C and the boiling point, where there is one', () => {
    const [one] = disagreements(water);
    expect(one?.fromK).toBe(298.15);
    // IAPWS R6-95(2018): boils at 373.1243 K at 101.325 kPa.
    expect(Math.abs((one?.toK ?? 0) - 373.1243)).toBeLessThanOrEqual(5e-5);
    expect(one?.fact.answer?.value).toBe(0);
    expect(disagreements(madeUp())).toEqual([]);
  });
});

describe('percent', () => {
  it('keeps two digits', () => {
    expect([percent(0.00412), percent(0.1), percent(-0.0256, ',')]).toEqual(['0.41 %', '10 %', '−2,6 %']);
  });
});
