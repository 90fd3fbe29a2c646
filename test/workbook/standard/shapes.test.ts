import { describe, expect, it } from 'vitest';
import { fitDeltaCp } from '../../../core/fit/fitDeltaCp';
import { fitTable } from '../../../core/fit/fitTable';
import { selfCheck } from '../../../functions/selfCheck';
import { settingsStore } from '../../../functions/settings/store';
import { parseArea } from '../../../taskpane/hosts/address';
import { WATER_SR1_86 } from '../../../workbook/standard/latentHeatData';
import { standardBook } from '../../../workbook/standard/standardBook';
import { formulaCells } from './formulaCells';

const spillOf = (call: string) => {
  const found = formulaCells(standardBook()).find(({ formula }) => formula.startsWith(`=LATENTRY.${call}(`));
  const area = parseArea(found?.spill ?? '');
  return [area?.rows, area?.columns];
};

describe('spills of the standard workbook are as large as what fills them', () => {
  it('for the checks', () => {
    settingsStore.publish({ state: 'absent' });
    const table = selfCheck();
    expect(spillOf('SELFCHECK')).toEqual([table.length, table[0]?.length]);
  });

  it('for the fit, whose slope and intercept are those of R', () => {
    const fit = fitDeltaCp(
      WATER_SR1_86.map(([temperatureK]) => temperatureK),
      WATER_SR1_86.map(([, latentKjPerKg]) => latentKjPerKg),
      { reference: 298.15, coverage: 0.95 },
    );
    const table = fitTable(fit, { temperatureUnit: 'K', heatUnit: 'kJ/kg', heatCapacityUnit: 'kJ/(kg K)' });
    expect(spillOf('FITDELTACP')).toEqual([table.length, table[0]?.length]);
    // R, lm(y ~ x) on the same eleven rows, printed to 12 digits: half a unit of the last one.
    expect(Math.abs(fit.slope - -2.43416687935)).toBeLessThan(5e-12);
    expect(Math.abs(fit.intercept - 3167.31596721)).toBeLessThan(5e-9);
  });

  it('for the fitted values, two columns beside the data', () => {
    expect(spillOf('FITLATENT')).toEqual([WATER_SR1_86.length, 2]);
  });
});
