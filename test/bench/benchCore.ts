import { all, create } from 'mathjs';
import { water } from '../../core/water/water';
import { emptySaturationState, solveSaturation } from '../../core/water/saturationState';
import { race, report } from './measure';

const COUNT = 20_000;

/** A bare degree-14 Chebyshev series by Clenshaw's recurrence: what any fast property costs at least. */
function bareChebyshev(coefficients: Float64Array, x: number): number {
  let later = 0;
  let now = 0;
  for (let i = 14; i > 0; i--) {
    const next = 2 * x * now - later + (coefficients[i] as number);
    later = now;
    now = next;
  }
  return x * now - later + (coefficients[0] as number);
}

/** Core properties of water against the bare series, the full solution, and a general expression evaluator. */
export function benchCore(): void {
  const coefficients = Float64Array.from({ length: 15 }, (_, i) => 1 / (i + 1));
  const temperatures = Float64Array.from({ length: COUNT }, (_, i) => 274 + (370 * i) / COUNT);
  const sum = (f: (t: number) => number) => (): number => {
    let total = 0;
    for (let i = 0; i < COUNT; i++) total += f(temperatures[i] as number);
    return total;
  };
  const latent = water.latent('vaporization', 'coexistence');
  const slope = water.latentSlope('vaporization', 'coexistence');
  const pressure = water.saturationPressure('stable');
  report(
    `Core, per value (${COUNT} temperatures from 274 to 644 K)`,
    race([
      {
        name: 'bare degree-14 Chebyshev',
        operations: COUNT,
        run: sum((t) => bareChebyshev(coefficients, t / 322 - 1)),
      },
      { name: 'latent heat of vaporization', operations: COUNT, run: sum((t) => latent.at(t)) },
      { name: 'its slope', operations: COUNT, run: sum((t) => slope.at(t)) },
      { name: 'saturation pressure', operations: COUNT, run: sum((t) => pressure.at(t)) },
    ]),
  );

  const math = create(all ?? {});
  const compiled = math.compile('((((a*x+b)*x+c)*x+d)*x+e)');
  const scope = { a: 1e-9, b: -2e-6, c: 1e-3, d: -2.4, e: 3100, x: 0 };
  const few = temperatures.filter((_, i) => i % 100 === 0);
  const state = emptySaturationState();
  report(
    'For scale, per value',
    race(
      [
        {
          name: 'latent heat, fast path',
          operations: 200,
          run: () => few.reduce((total, t) => total + latent.at(t), 0),
        },
        {
          name: 'full solution of R6-95 saturation',
          operations: 200,
          run: () => few.reduce((total, t) => total + solveSaturation(t, state).pressure, 0),
        },
        {
          name: 'mathjs evaluate of a compiled polynomial',
          operations: 200,
          run: () =>
            few.reduce((total, t) => {
              scope.x = t;
              return total + (compiled.evaluate(scope) as number);
            }, 0),
        },
      ],
      9,
    ),
  );
}
