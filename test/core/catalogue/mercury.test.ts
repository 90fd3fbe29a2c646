import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { findSubstance } from '../../../core/catalogue/find';

const published = JSON.parse(
  readFileSync(new URL('../../reference/fitting-mercury.json', import.meta.url), 'utf8'),
) as { temperature: number[]; pressure: number[] };

const MMHG = 133.322387415;

describe('vapour pressure of mercury', () => {
  // R datasets::pressure (Handbook of Chemistry and Physics, CRC Press, 1973).
  it.each(published.temperature.map((celsius, i) => [celsius, published.pressure[i] ?? NaN] as const))(
    'at %d degC: %d mmHg',
    (celsius, mmHg) => {
      const curve = findSubstance('mercury').saturationPressure('stable');
      const value = curve.at(celsius + 273.15) / MMHG;
      // One or two printed digits below 80 degC; above, the table is scattered by 2 % about any smooth line (its own
      // straight line in 1/T leaves residuals of that size), and the tabulated gas and liquid carry 1 to 2 %.
      const lastDigit = 0.5 * 10 ** -(String(mmHg).split('.')[1]?.length ?? 0);
      expect(Math.abs(value - mmHg), `${value} against ${mmHg}`).toBeLessThanOrEqual(0.03 * mmHg + lastDigit);
    },
  );
});
