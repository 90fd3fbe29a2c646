import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { watsonLatent } from '../../../core/estimate/watsonLatent';
import { majerSvobodaShape } from '../../../core/house/majerSvobodaShape';
import { monotoneTable } from '../../../core/house/monotoneTable';
import { polynomialShape } from '../../../core/house/polynomialShape';
import { antoineShape, pressureTable } from '../../../core/house/pressureShape';
import type { Shape } from '../../../core/house/shape';
import { watsonShape } from '../../../core/house/watsonShape';

const SEED = { seed: 20260101, numRuns: 200 };

/** Central difference over 2h; its own error is h²/6 times the third derivative, which the caller's tolerance covers. */
function difference(shape: Shape, at: number, h: number): number {
  return (shape.at(at + h) - shape.at(at - h)) / (2 * h);
}

const tables = fc
  .array(fc.tuple(fc.double({ min: 0.5, max: 40, noNaN: true }), fc.double({ min: -5, max: 5, noNaN: true })), {
    minLength: 2,
    maxLength: 9,
  })
  .map((steps) => {
    let x = 0;
    let y = 0;
    return steps.map(([dx, dy]) => [(x += dx), (y += dy)] as const);
  });

describe('monotone table', () => {
  // Fritsch and Carlson (1980), data set RPN 14 (from memory): rises steeply once and is flat at both ends.
  const x = [7.99, 8.09, 8.19, 8.7, 9.2, 10, 12, 15, 20];
  const y = [0, 2.76429e-5, 4.37498e-2, 0.169183, 0.469428, 0.94374, 0.998636, 0.999919, 0.999994];

  it('rises all along the data set RPN 14 and stays within [0, 1]', () => {
    const table = monotoneTable(x, y);
    let before = 0;
    for (let t = 7.99; t <= 20; t += 0.001) {
      const value = table.at(t);
      expect(value).toBeGreaterThanOrEqual(before);
      before = value;
    }
    expect(before).toBeLessThanOrEqual(0.999994);
  });

  it('passes through its points and stays between neighbours', () => {
    fc.assert(
      fc.property(tables, fc.double({ min: 0, max: 1, noNaN: true }), (points, share) => {
        const table = monotoneTable(
          points.map(([a]) => a),
          points.map(([, b]) => b),
        );
        points.forEach(([a, b], i) => {
          // Rounding of a handful of operations on values up to 45.
          expect(Math.abs(table.at(a) - b)).toBeLessThanOrEqual(1e-13 * 45);
          const next = points[i + 1];
          if (next === undefined) return;
          const value = table.at(a + share * (next[0] - a));
          expect(value).toBeGreaterThanOrEqual(Math.min(b, next[1]) - 1e-12);
          expect(value).toBeLessThanOrEqual(Math.max(b, next[1]) + 1e-12);
        });
      }),
      SEED,
    );
  });

  it('has the slope and the integral of its own values', () => {
    fc.assert(
      fc.property(tables, fc.double({ min: 0.05, max: 0.95, noNaN: true }), (points, share) => {
        const table = monotoneTable(
          points.map(([a]) => a),
          points.map(([, b]) => b),
        );
        const last = points.at(-1)?.[0] ?? 0;
        const first = points[0]?.[0] ?? 0;
        const at = first + share * (last - first);
        // A cubic a piece: the difference is right but for the jump of its second derivative, at most 60 per unit², over h.
        const h = 1e-6;
        expect(Math.abs(difference(table, at, h) - table.slope(at))).toBeLessThanOrEqual(2e-4);
        const middle = (first + at) / 2;
        const sum = table.area(first, middle) + table.area(middle, at);
        expect(Math.abs(sum - table.area(first, at))).toBeLessThanOrEqual(1e-12 * (1 + Math.abs(sum)) * 100);
        const areaSlope = (table.area(first, at + h) - table.area(first, at - h)) / (2 * h);
        // Cancellation of areas up to 16000 leaves n·ε·16000/h.
        expect(Math.abs(areaSlope - table.at(at))).toBeLessThanOrEqual(1e-4);
      }),
      SEED,
    );
  });

  it('goes on straight beyond its ends', () => {
    const table = monotoneTable([0, 1, 2], [0, 1, 4]);
    expect(table.slope(3)).toBe(table.slope(2));
    expect(table.at(3)).toBeCloseTo(table.at(2) + table.slope(2), 12);
    expect(table.area(2, 3)).toBeCloseTo(table.at(2) + table.slope(2) / 2, 12);
    expect(table.at(-1)).toBeCloseTo(-table.slope(0), 12);
  });

  it('is the straight line between two points', () => {
    const table = monotoneTable([1, 3], [2, 6]);
    expect([table.at(2), table.slope(2), table.area(1, 3)]).toEqual([4, 2, 8]);
  });
});

describe('polynomial', () => {
  it('has its derivative and its integral', () => {
    const shape = polynomialShape([1, -2, 0.5, 0.01], 273.15);
    const x = 27;
    expect(shape.at(300.15)).toBeCloseTo(1 - 2 * x + 0.5 * x * x + 0.01 * x ** 3, 9);
    expect(shape.slope(300.15)).toBeCloseTo(-2 + x + 0.03 * x * x, 9);
    expect(shape.area(273.15, 300.15)).toBeCloseTo(x - x * x + (0.5 * x ** 3) / 3 + (0.01 * x ** 4) / 4, 7);
  });
});

describe('equations of the heat of vaporization', () => {
  // NIST Chemistry WebBook, ethanol: A, alpha, beta, Tc of Majer and Svoboda (1985); values evaluated there: 38.56 at the
  // boiling temperature (Poling et al., 5th ed., Appendix A, Section B), 42.46 ± 0.13 at 298.15 K (Majer, Svoboda et al. 1985).
  const ethanol = majerSvobodaShape(50.43, -0.4475, 0.4989, 513.9);

  it('Majer and Svoboda give the printed heats of ethanol', () => {
    expect(Math.abs(ethanol.at(351.44) - 38.56)).toBeLessThanOrEqual(0.01);
    expect(Math.abs(ethanol.at(298.15) - 42.46)).toBeLessThanOrEqual(0.13);
  });

  it('Watson agrees with the estimate of the same name', () => {
    const shape = watsonShape(38.56, 351.44, 513.9);
    for (const toK of [200, 298.15, 400, 480]) {
      const { value } = watsonLatent({ latent: 38.56, atK: 351.44, toK, criticalK: 513.9 });
      // The two write the same power in different ways: rounding only.
      expect(Math.abs(shape.at(toK) - value)).toBeLessThanOrEqual(1e-12 * value);
    }
  });

  it.each([
    ['Majer and Svoboda', ethanol],
    ['Watson', watsonShape(38.56, 351.44, 513.9)],
  ])('%s: the slope is the derivative, zero from the critical temperature on', (_name, shape) => {
    for (const t of [200, 298.15, 400, 500]) {
      // h = 1e-3 K: third derivative below 1e-4 there, rounding 1e-14·40/1e-3.
      expect(Math.abs(difference(shape, t, 1e-3) - shape.slope(t))).toBeLessThanOrEqual(1e-8);
    }
    expect(shape.at(513.9)).toBe(0);
    expect(shape.at(600)).toBe(0);
  });
});

describe('vapour pressure', () => {
  // NIST Chemistry WebBook, ethanol, Ambrose, Sprake et al. (1975): bar and K; the boiling temperature is 351.5 ± 0.2 K there.
  const antoine = antoineShape(5.37229, 1670.409, -40.191, 1e5, { factor: 1, offset: 0 });

  it('Antoine of ethanol is one atmosphere where ethanol boils', () => {
    expect(Math.abs(antoine.inverse(101325) - 351.5)).toBeLessThanOrEqual(0.2);
  });

  it('takes constants on the Celsius scale', () => {
    const celsius = antoineShape(5.37229, 1670.409, 273.15 - 40.191, 1e5, { factor: 1, offset: 273.15 });
    expect(celsius.at(330)).toBeCloseTo(antoine.at(330), 6);
  });

  it('goes back and forth', () => {
    const temperatures = [280, 300, 320, 340, 360];
    const table = pressureTable(
      temperatures,
      temperatures.map((t) => antoine.at(t)),
    );
    for (let t = 270; t <= 370; t += 0.7) {
      // Both inverses stop at rounding: 1 K of 300 K is 300 ε ≈ 1e-13, times the steps in between.
      expect(Math.abs(antoine.inverse(antoine.at(t)) - t)).toBeLessThanOrEqual(1e-10);
      expect(Math.abs(table.inverse(table.at(t)) - t)).toBeLessThanOrEqual(1e-9);
      // Five points 20 K apart leave 0.1 % of the pressure inside, as ln p is nearly straight in 1/T.
      if (t >= 280 && t <= 360) expect(Math.abs(table.at(t) / antoine.at(t) - 1)).toBeLessThanOrEqual(1e-3);
    }
  });
});
