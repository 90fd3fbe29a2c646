import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { enthalpy } from '../../../core/path/enthalpy';
import { heat } from '../../../core/path/heat';
import { heatSteps } from '../../../core/path/heatSteps';
import { placeState } from '../../../core/path/placeState';
import type { State } from '../../../core/path/state';
import { Problem } from '../../../core/problem';
import type { Phase } from '../../../core/substance';
import { straightSubstance as substance } from './straightSubstance';

const ATMOSPHERE = 101325;
const at = (temperatureK: number, phase?: Phase): State => ({
  form: 'temperature',
  temperatureK,
  ...(phase === undefined ? {} : { phase }),
});
const legs = (from: State, to: State, pressurePa = ATMOSPHERE): [string, number, number, number][] =>
  heatSteps(substance, from, to, pressurePa).steps.map((s) => [s.label, s.fromK, s.toK, s.heat]);

// Every number below follows from cp = 30, 50, 40 J/(mol K) and heats of 4000 and 20000 J/mol at 300 and 400 K: exact in binary.
describe('paths of a substance with straight enthalpy lines', () => {
  it('through all phases, up and down', () => {
    expect(legs(at(280), at(420))).toEqual([
      ['solid', 280, 300, 600],
      ['fusion', 300, 300, 4000],
      ['liquid', 300, 400, 5000],
      ['vaporization', 400, 400, 20000],
      ['gas', 400, 420, 800],
    ]);
    expect(legs(at(420), at(280))).toEqual([
      ['gas', 420, 400, -800],
      ['condensation', 400, 400, -20000],
      ['liquid', 400, 300, -5000],
      ['freezing', 300, 300, -4000],
      ['solid', 300, 280, -600],
    ]);
    expect(heat(substance, at(280), at(420), ATMOSPHERE)).toBe(30400);
  });

  it('between states on and beside the transitions', () => {
    const melt: State = { form: 'melting', phase: 'liquid' };
    expect(legs(melt, { form: 'fraction', vapor: 0.25 })).toEqual([
      ['liquid', 300, 400, 5000],
      ['vaporization', 400, 400, 5000],
    ]);
    expect(legs({ form: 'fraction', vapor: 0.75 }, { form: 'fraction', vapor: 0.25 })).toEqual([
      ['condensation', 400, 400, -10000],
    ]);
    expect(legs({ form: 'subcooled', deltaK: 10 }, { form: 'superheated', deltaK: 10 })).toEqual([
      ['liquid', 390, 400, 500],
      ['vaporization', 400, 400, 20000],
      ['gas', 400, 410, 400],
    ]);
    expect(legs(melt, melt)).toEqual([]);
  });

  it('sublimes below the triple point and meets no boiling above the critical point', () => {
    expect(legs(at(240), { form: 'saturated', phase: 'gas' }, 100)).toEqual([
      ['solid', 240, 250, 300],
      ['sublimation', 250, 250, 24500],
    ]);
    expect(legs(at(310), at(500), 2e7)).toEqual([['supercritical', 310, 500, 9500]]);
    expect(legs(at(310, 'liquid'), at(500, 'gas'), 2e7)).toEqual([['supercritical', 310, 500, 9500]]);
  });

  it('a metastable end is followed along its own phase where the path leads through it', () => {
    expect(legs(at(290, 'liquid'), at(420))).toEqual([
      ['metastable liquid', 290, 300, 500],
      ['liquid', 300, 400, 5000],
      ['vaporization', 400, 400, 20000],
      ['gas', 400, 420, 800],
    ]);
    expect(legs(at(280), at(410, 'liquid'))).toEqual([
      ['solid', 280, 300, 600],
      ['fusion', 300, 300, 4000],
      ['liquid', 300, 400, 5000],
      ['metastable liquid', 400, 410, 500],
    ]);
    expect(legs(at(420), at(290, 'liquid'))).toEqual([
      ['gas', 420, 400, -800],
      ['condensation', 400, 400, -20000],
      ['liquid', 400, 300, -5000],
      ['metastable liquid', 300, 290, -500],
    ]);
  });

  it('and changes at its own temperature where it does not', () => {
    expect(legs(at(290, 'liquid'), at(280))).toEqual([
      ['liquid to solid', 290, 290, -3800],
      ['solid', 290, 280, -300],
    ]);
    expect(legs(at(280), at(290, 'liquid'))).toEqual([
      ['solid', 280, 290, 300],
      ['solid to liquid', 290, 290, 3800],
    ]);
    expect(legs(at(390, 'gas'), at(380))).toEqual([
      ['gas to liquid', 390, 390, -20100],
      ['liquid', 390, 380, -500],
    ]);
    expect(legs(at(230, 'liquid'), at(260), 100)).toEqual([
      ['liquid to solid', 230, 230, -2600],
      ['solid', 230, 250, 600],
      ['sublimation', 250, 250, 24500],
      ['gas', 250, 260, 400],
    ]);
    expect(heatSteps(substance, at(290, 'liquid'), at(280), ATMOSPHERE).marks.map((mark) => mark.code)).toEqual([
      'metastable',
    ]);
  });

  it('a temperature that rounding leaves beside a transition is the transition', () => {
    const beside = [400 - 1e-7, 400, 400 + 1e-7];
    for (const t of beside) {
      expect(legs(at(390), at(t))).toEqual([['liquid', 390, 400, 500]]);
      expect(legs(at(410), at(t))).toEqual([['gas', 410, 400, -400]]);
      expect(legs(at(t, 'liquid'), at(t, 'gas'))).toEqual([['vaporization', 400, 400, 20000]]);
      expect(placeState(substance, at(t, 'gas'), ATMOSPHERE).marks).toEqual([]);
      expect(heatSteps(substance, at(390), at(t), ATMOSPHERE).marks.map((mark) => mark.code)).toEqual([
        'near-transition',
      ]);
      for (const other of beside) {
        expect(() => heat(substance, at(t), at(other), ATMOSPHERE)).toThrow(Problem);
      }
    }
  });

  it('a bare temperature within 0.1 K is marked, one beyond is not', () => {
    const codes = (t: number): string[] => placeState(substance, at(t), ATMOSPHERE).marks.map((mark) => mark.code);
    expect(codes(299.91)).toEqual(['near-transition']);
    expect(codes(300.09)).toEqual(['near-transition']);
    expect(codes(299.89)).toEqual([]);
    expect(codes(300.11)).toEqual([]);
  });
});

describe('laws, with metastable ends', () => {
  const phase = fc.constantFrom<Phase | undefined>(undefined, 'solid', 'liquid', 'gas');
  const state = fc.tuple(fc.integer({ min: 1001, max: 2999 }), phase).map(([fifths, named]) => at(fifths / 5, named));
  const pressure = fc.constantFrom(100, ATMOSPHERE, 2e7);

  /** Not every phase reaches everywhere: a solid of a fluid that has none there is refused. */
  function pathOf(from: State, to: State, pressurePa: number): ReturnType<typeof heatSteps> | undefined {
    try {
      return heatSteps(substance, from, to, pressurePa);
    } catch (error) {
      if (error instanceof Problem) return undefined;
      throw error;
    }
  }

  it('legs join end to end, add up, and turn round', () => {
    let walked = 0;
    fc.assert(
      fc.property(state, state, pressure, (from, to, p) => {
        const path = pathOf(from, to, p);
        const back = pathOf(to, from, p);
        expect(path === undefined).toBe(back === undefined);
        if (path === undefined || back === undefined) return;
        walked += 1;
        const difference = enthalpy(substance, to, p) - enthalpy(substance, from, p);
        expect(path.heat).toBe(difference);
        // Enthalpies below 40000 J/mol: a few roundings of 7e-12.
        expect(Math.abs(path.steps.reduce((sum, s) => sum + s.heat, 0) - path.heat)).toBeLessThanOrEqual(1e-10);
        path.steps.forEach((step, i) =>
          expect(step.fromK).toBe(i === 0 ? path.from.temperatureK : path.steps[i - 1]?.toK),
        );
        expect(path.steps.at(-1)?.toK ?? path.to.temperatureK).toBe(path.to.temperatureK);
        expect(back.steps.map((s) => -s.heat).reverse()).toEqual(path.steps.map((s) => s.heat));
        expect(back.heat).toBe(0 - path.heat);
      }),
      { seed: 20260104, numRuns: 2000 },
    );
    expect(walked).toBeGreaterThan(1500);
  });
});
