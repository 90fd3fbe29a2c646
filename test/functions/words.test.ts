import { beforeAll, describe, expect, it } from 'vitest';
import { constant } from '../../functions/constant';
import { disagreement } from '../../functions/disagreement';
import { enthalpy } from '../../functions/enthalpy';
import { heat } from '../../functions/heat';
import { heatSteps } from '../../functions/heatSteps';
import { houseStore } from '../../functions/house/store';
import { latent } from '../../functions/latent';
import { satTemperature } from '../../functions/satTemperature';
import { settingsStore } from '../../functions/settings/store';
import { source } from '../../functions/source';
import { call, cellOf, faultOf } from './host';

beforeAll(() => {
  settingsStore.publish({ state: 'absent' });
  houseStore.publish({ state: 'absent' });
});

type Fn = (...args: never[]) => unknown;
const cell = (fn: Fn, args: readonly unknown[], ...settings: string[]): unknown => cellOf(call(fn, args, settings));
const fault = (fn: Fn, args: readonly unknown[], ...settings: string[]): string => {
  const { code, message } = faultOf(() => call(fn, args, settings));
  return `${code} ${message}`;
};

describe('paths beyond what is known', () => {
  it('that are extended above the last phase say so', () => {
    expect(cell(heat, ['ethanol', 20, 1500], 'out_of_range=extend; answer=status')).toBe(
      'extended: outside the published range of gas ethanol',
    );
    expect(cell(enthalpy, ['ethanol', 1500], 'out_of_range=extend; answer=status')).toMatch(/^extended: /);
    expect(cell(heat, ['ethanol', 20, 500], 'out_of_range=extend; answer=status')).toBe('ok');
    const table = call(heatSteps, ['ethanol', 20, 1500], ['out_of_range=extend']) as unknown[][];
    expect(table.at(-1)?.[0]).toBe('extended: outside the published range of gas ethanol');
  });

  it('say once what holds for both ends', () => {
    expect(cell(heat, ['water', 99.97, 99.95], 'answer=status')).toMatch(/K from vaporization.*; near-transition: /);
    expect(cell(heat, ['water', 99.97, 99.97], 'answer=status')).toBe(
      'near-transition: 0.00429585 K from vaporization: taken as liquid; name the phase to be sure',
    );
  });

  it('name the missing piece and the place in the workbook’s own unit, once', () => {
    expect(fault(heat, ['ethanol', -150, 20])).toBe(
      '#N/A heat capacity of solid ethanol: not in the catalogue, so no path leads below -114.1 degC',
    );
    expect(fault(heat, ['ethanol', '-150 degC', 20], 'temperature=K')).toMatch(/below 159\.05 K$/);
    expect(fault(heat, ['sodium nitrate', 25, 700])).toBe(
      '#N/A vapour of sodium nitrate (it decomposes the faster the hotter it is; use as a melt ends near there, from memory): not in the catalogue, so no path leads above 599.85 degC',
    );
    expect(fault(enthalpy, ['water', 'saturated liquid', '300 bar'], 'pressure=bar')).toBe(
      '#N/A vaporization of water: only fusion at 300 bar',
    );
    expect(fault(disagreement, ['erythritol', 'fusion', 110, 118])).toBe(
      '#N/A heat of fusion at a second temperature of erythritol: not in the catalogue',
    );
  });
});

describe('ranges', () => {
  it('of one temperature are named once', () => {
    expect(fault(latent, ['1-dodecanol', 'fusion', 20])).toBe(
      '#N/A temperature 20 degC: fusion of 1-dodecanol is known at 23.8 degC only',
    );
  });

  it('of a constant are none', () => {
    for (const item of ['molar mass', 'critical pressure', 'melting point']) {
      expect(cell(constant, ['water', item], 'answer=range')).toBe('no range: one value');
    }
  });

  it('include the end that they name', () => {
    expect(cell(satTemperature, ['aluminium', '1000 kPa'], 'temperature=K')).toBeGreaterThan(3400);
  });
});

describe('states in words', () => {
  it('that are none are answered with all that there are', () => {
    for (const text of ['sat liquid', 'steam 120 degC', 'quality 0.95', 'x=0.5', 'ice', 'dry saturated steam']) {
      expect(fault(enthalpy, ['water', text])).toBe(
        `#VALUE! state: allowed a temperature, or a text as "98 degC liquid", "saturated liquid", "saturated vapor", "vapor fraction 0.95", "subcooled 5 K", "superheated 10 K", "melting solid", "melting liquid"; received "${text}"`,
      );
    }
  });

  it('with a slip in the unit are answered with the units', () => {
    expect(fault(enthalpy, ['water', '98 degX liquid'])).toMatch(/^#VALUE! state: allowed .*unit of temperature/);
    expect(fault(enthalpy, ['water', '20 C'])).toBe('#VALUE! state: allowed 20 degC; received "20 C"');
  });
});

describe('changes in words', () => {
  it('may join the forms by an arrow, "to", a dash or Greek letters', () => {
    const value = cell(latent, ['iron', 'alpha-gamma']) as number;
    for (const text of ['alpha to gamma', 'alpha→gamma', 'alpha -> gamma', 'alpha – gamma', 'α-γ', 'α→γ']) {
      expect(cell(latent, ['iron', text]), text).toBe(value);
    }
    expect(cell(latent, ['iron', 'γ→α'])).toBe(-value);
  });

  it('may leave out what both forms of quartz have in common, but no part of a numeral', () => {
    expect(cell(latent, ['quartz', 'alpha-beta'])).toBe(cell(latent, ['quartz', 'alpha quartz-beta quartz']));
    expect(fault(latent, ['potassium sulfate', 'I-I'])).toMatch(/^#VALUE! change: allowed II-I, fusion/);
  });

  it('know condensing and the British spellings, and say what a beginning stands for', () => {
    expect(cell(latent, ['water', 'condensing', 60])).toBe(cell(latent, ['water', 'condensation', 60]));
    expect(cell(latent, ['water', 'vapourisation', 60])).toBe(cell(latent, ['water', 'vaporization', 60]));
    expect(fault(latent, ['water', 'evap', 60])).toMatch(/nearest: evaporation$/);
    expect(fault(latent, ['water', 'boil', 60])).toMatch(/nearest: boiling$/);
  });

  it('name the option that holds a bad pressure', () => {
    expect(fault(latent, ['water', 'vaporization', 60], 'kind=isobaric; at_pressure=-1 bar')).toMatch(
      /^#VALUE! at_pressure: /,
    );
  });
});

describe('SOURCE', () => {
  it('writes uncertainties in the workbook’s units', () => {
    // 1-dodecanol: 40.2 kJ/mol, 2 % of it, 186.34 g/mol.
    expect(cell(source, ['1-dodecanol', 'fusion'])).toContain(
      'standard uncertainty 4.31472 kJ/kg (k = 1) at 23.8 degC',
    );
    expect(cell(source, ['1-dodecanol', 'fusion'], 'heat=kJ/mol; temperature=K')).toContain(
      'standard uncertainty 0.804 kJ/mol (k = 1) at 296.95 K',
    );
    expect(cell(source, ['ethanol', 'saturation pressure'], 'pressure=kPa gauge')).toMatch(
      /standard uncertainty [\d.]+ kPa \(k = 1\)/,
    );
    expect(cell(source, ['ethanol', 'saturation temperature'], 'temperature=degF')).toMatch(
      /standard uncertainty [\d.]+ degF difference \(k = 1\)/,
    );
    expect(cell(source, ['ethanol', 'liquid heat capacity'])).toMatch(/standard uncertainty [\d.]+ kJ\/\(kg K\) \(k/);
  });

  it('of a salt reads without the abbreviations of the data set', () => {
    expect(cell(source, ['sodium chloride', 'fusion'])).toContain(
      'NaCl(L): Liquid. Gurvich 1982, part 1 p. 335, part 2 p. 374; ',
    );
  });
});
