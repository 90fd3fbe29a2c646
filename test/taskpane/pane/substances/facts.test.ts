import { describe, expect, it } from 'vitest';
import { plainWords, type ProblemData } from '../../../../core/problem';
import { catalogue } from '../../../../core/catalogue/find';
import { water } from '../../../../core/water/water';
import { parseSettingsText } from '../../../../functions/settings/parseSettingsText';
import { DEFAULT_SETTINGS } from '../../../../functions/settings/settings';
import { formulaText } from '../../../../taskpane/plan/formulaText';
import { factOf } from '../../../../taskpane/pane/substances/facts/fact';
import { latentFacts, type FactsAt } from '../../../../taskpane/pane/substances/facts/latentFacts';
import { lineFacts } from '../../../../taskpane/pane/substances/facts/lineFacts';
import { heatCapacityFacts } from '../../../../taskpane/pane/substances/facts/phaseFacts';
import { problemWords } from '../../../../taskpane/pane/substances/facts/problemWords';
import { stateWords } from '../../../../taskpane/pane/substances/facts/stateWords';
import { roundTemperature, unitWriter, writeValue } from '../../../../taskpane/pane/substances/facts/unitWriter';
import { typedQuantity } from '../../../../taskpane/pane/substances/QuantityField';
import { firstTemperature } from '../../../../taskpane/pane/substances/useCard';
import { temperatureWindow } from '../../../../taskpane/pane/substances/diagram/temperatureWindow';
import { madeUp } from './madeUp';

const ATMOSPHERE = 101_325;
const wax = madeUp();
const at = (celsius: number, more: Partial<FactsAt> = {}): FactsAt => ({
  temperatureK: celsius + 273.15,
  pressurePa: ATMOSPHERE,
  pressureText: '101.325 kPa',
  outOfRange: 'refuse',
  ...more,
});
const formulaAt = {
  temperature: 25,
  pressure: { value: 101.325, text: '101.325 kPa', usual: true },
};

describe('latentFacts', () => {
  it('leads with the usual kind and never calls the slope along saturation ΔCp', () => {
    const vaporization = latentFacts(water, at(25)).find(({ change }) => change === 'vaporization');
    expect(vaporization?.kinds.map(({ kind }) => kind)).toEqual(['coexistence', 'isobaric', 'standard']);
    const [usual, isobaric, standard] = vaporization?.kinds ?? [];
    expect(usual?.slope.label).toBe('slope along saturation');
    expect(isobaric?.slope.label).toBe('ΔCp at 101.325 kPa');
    expect(standard?.slope.label).toBe('ΔCp° of the standard states');
    // J/(mol K) at 298.15 K of IAPWS R6-95(2018): coexistence −42.70, half a unit of the last digit.
    expect(Math.abs((usual?.slope.fact.answer?.value ?? 0) + 42.7)).toBeLessThanOrEqual(0.0051);
    expect(Math.abs((standard?.slope.fact.answer?.value ?? 0) + 41.74)).toBeLessThanOrEqual(0.0051);
  });

  it('calls the coexistence slope of melting the slope along the two-phase line', () => {
    const fusion = latentFacts(water, at(0)).find(({ change }) => change === 'fusion');
    const coexistence = fusion?.kinds.find(({ kind }) => kind === 'coexistence');
    expect(coexistence?.slope.label).toBe('slope along the two-phase line');
  });

  it('keeps the words of what the core refuses', () => {
    const fusion = latentFacts(water, at(25)).find(({ change }) => change === 'fusion');
    const problem = fusion?.kinds[0]?.latent.fact.problem;
    const { words } = unitWriter(DEFAULT_SETTINGS, water.molarMass);
    expect(problem && plainWords(problem, words)).toMatch(
      /^temperature 25 °C is outside \[−38\.15 °C, 0\.01 °C\] for fusion/,
    );
  });

  it('writes formulas that ask for the same: the usual kind unsaid, others said', () => {
    const [usual, isobaric] = latentFacts(water, at(25)).find(({ change }) => change === 'vaporization')?.kinds ?? [];
    expect(usual && formulaText(usual.latent.ask, formulaAt)).toBe(
      '=LATENTRY.LATENT("water","vaporization",25,Latentry_units)',
    );
    const high = { ...formulaAt, pressure: { value: 200, text: '200 kPa', usual: false } };
    expect(isobaric && formulaText(isobaric.slope.ask, high)).toBe(
      '=LATENTRY.DELTACP("water","vaporization",25,Latentry_units,"kind=isobaric; at_pressure=200 kPa")',
    );
  });
});

describe('heatCapacityFacts', () => {
  it('names every crystal form, and what is missing', () => {
    const facts = heatCapacityFacts(wax, at(40));
    expect(facts.map(({ label }) => label)).toEqual(['solid (alpha)', 'solid (beta)', 'liquid', 'gas', 'ideal gas']);
    expect(facts[0]?.fact.answer?.value).toBeCloseTo(1000, 9);
    expect(facts[1]?.fact.answer?.value).toBeCloseTo(1500, 9);
    expect(facts[3]?.fact.problem?.code).toBe('missing');
    expect(facts[1] && formulaText(facts[1].ask, formulaAt)).toBe(
      '=LATENTRY.HEATCAP("wax two","beta",25,,,Latentry_units)',
    );
    expect(facts[4] && formulaText(facts[4].ask, formulaAt)).toBe(
      '=LATENTRY.HEATCAP("wax two","gas",25,,,Latentry_units,"kind=standard")',
    );
  });
});

describe('lineFacts', () => {
  it('gives saturation both ways and the enthalpy of the stable state', () => {
    const [pressure, temperature, enthalpy] = lineFacts(water, at(60));
    // IAPWS SR1-86(1992): 19.946 kPa at 333.15 K, half a unit of the last digit.
    expect(Math.abs((pressure?.fact.answer?.value ?? 0) - 19_946)).toBeLessThanOrEqual(0.55);
    // IAPWS R6-95(2018): boils at 373.1243 K at 101.325 kPa.
    expect(Math.abs((temperature?.fact.answer?.value ?? 0) - 373.1243)).toBeLessThanOrEqual(5e-5);
    const liquid = water.enthalpy('liquid', ATMOSPHERE).at(333.15);
    expect(Math.abs((enthalpy?.fact.answer?.value ?? 0) - liquid)).toBeLessThanOrEqual(1e-9);
    expect(temperature && formulaText(temperature.ask, formulaAt)).toBe(
      '=LATENTRY.SATTEMPERATURE("water",101.325,Latentry_units)',
    );
  });

  it('says what lacks for a substance without a vapour', () => {
    const [pressure] = lineFacts(wax, at(40));
    expect(pressure?.fact.problem?.code).toBe('missing');
  });
});

describe('stateWords', () => {
  const writer = unitWriter(DEFAULT_SETTINGS, wax.molarMass);
  const ladder = wax.ladder(ATMOSPHERE);
  it.each([
    [313.15, 'At 40 °C: solid (beta)'],
    [353.15, 'At 80 °C: fusion, solid (beta) and liquid together'],
    [180, 'At −93.15 °C: beyond the solid alpha heat capacity of wax two'],
  ])('at %s K', (kelvin, words) => {
    expect(stateWords(ladder, kelvin, writer)).toBe(words);
  });

  it('knows supercritical fluid, and says only where it is without a ladder', () => {
    const hot = water.ladder(30e6);
    expect(stateWords(hot, 700, unitWriter(DEFAULT_SETTINGS, water.molarMass))).toBe(
      'At 426.85 °C: supercritical fluid',
    );
    expect(stateWords(undefined, 300, writer)).toBe('At 26.85 °C');
  });
});

describe('unitWriter', () => {
  it('writes values in the workbook’s units, with two digits of their uncertainty', () => {
    const settings = parseSettingsText('heat=kJ/mol; decimal=,; temperature=K', DEFAULT_SETTINGS);
    const writer = unitWriter(settings, water.molarMass);
    expect(writeValue({ value: 44_000, unit: 'J/mol', uncertainty: 120 }, writer)).toMatchObject({
      text: '44,00 ± 0,12',
      unit: 'kJ/mol',
    });
    expect(writeValue({ value: 0.344292, unit: '1' }, writer)).toMatchObject({ text: '0,344292', unit: '' });
    expect(roundTemperature(273.152519, writer.temperature, ',')).toBe('273,15 K');
  });

  it('counts a material without a molar mass per kilogram, and tells formulas to do so', () => {
    const molar = parseSettingsText('heat=kJ/mol; heat_capacity=J/(mol K)', DEFAULT_SETTINGS);
    const writer = unitWriter(molar, NaN);
    expect([writer.heat.unit, writer.heatCapacity.unit]).toEqual(['kJ/kg', 'kJ/(kg K)']);
    expect(writeValue({ value: 100_000, unit: 'J/mol' }, writer).text).toBe('100');
    expect(writeValue({ value: 180_000, unit: 'J/kg' }, writer)).toMatchObject({ text: '180', unit: 'kJ/kg' });
    expect(writeValue({ value: 3455, unit: 'J/(kg K)' }, writer)).toMatchObject({ text: '3.455', unit: 'kJ/(kg K)' });
    const fusion = latentFacts(wax, at(80)).find(({ change }) => change === 'fusion')?.kinds[0];
    expect(fusion && formulaText(fusion.latent.ask, { ...formulaAt, units: writer.ownUnits })).toBe(
      '=LATENTRY.LATENT("wax two","fusion",25,Latentry_units,"heat=kJ/kg")',
    );
  });

  it('keeps the zero of gauge pressures at the barometer', () => {
    const settings = parseSettingsText('pressure=kPa gauge', DEFAULT_SETTINGS);
    const writer = unitWriter(settings, water.molarMass);
    expect(writeValue({ value: 201_325, unit: 'Pa' }, writer).text).toBe('100');
  });
});

describe('typedQuantity', () => {
  it.each([
    ['60', 'temperature', 333.15],
    ['−20', 'temperature', 253.15],
    ['140 degF', 'temperature', 333.15],
    ['300 K', 'temperature', 300],
    ['200', 'pressure', 200_000],
    ['1e2', 'pressure', 100_000],
    ['2 bar', 'pressure', 200_000],
  ] as const)('reads %j as a %s', (text, kind, si) => {
    // One rounding of a number up to 2e5.
    expect(Math.abs(typedQuantity(text, kind, DEFAULT_SETTINGS) - si)).toBeLessThanOrEqual(6e-11);
  });

  it('refuses what is none', () => {
    expect(() => typedQuantity('warm', 'temperature', DEFAULT_SETTINGS)).toThrow('temperature: allowed');
  });
});

describe('problemWords', () => {
  it('says where the one value stands that is known', () => {
    const fusion = latentFacts(wax, at(25)).find(({ change }) => change === 'fusion')?.kinds[0]?.latent.fact.problem;
    expect(fusion && problemWords(fusion, unitWriter(DEFAULT_SETTINGS, wax.molarMass))).toMatch(
      /^(known at 80 °C only|temperature 25 °C is outside)/,
    );
    const point = {
      code: 'range',
      argument: 't',
      quantity: 'temperature',
      received: 1,
      from: 300,
      to: 300,
      subject: 's',
    };
    expect(problemWords(point as ProblemData, unitWriter(DEFAULT_SETTINGS, 1))).toBe('known at 26.85 °C only');
  });
});

describe('firstTemperature', () => {
  const first = (substance: typeof wax) => {
    const ladder = substance.ladder(ATMOSPHERE);
    return firstTemperature(substance, ladder, temperatureWindow(ladder));
  };

  it('is 25 °C where a latent heat is known there, else the first transition', () => {
    expect(first(water)).toBe(298.15);
    // Between 0 and 60 °C both forms of the made-up wax are known, so that their change is.
    expect(first(wax)).toBe(298.15);
    expect(first(catalogue.find('iron'))).toBe(catalogue.find('iron').ladder(ATMOSPHERE).gaps[0]?.temperatureK);
    expect(firstTemperature(water, undefined, { fromK: 400, toK: 500 })).toBe(450);
  });
});

describe('factOf', () => {
  it('throws a defect on', () => {
    expect(() =>
      factOf(() => {
        throw new TypeError('a defect');
      }),
    ).toThrow(TypeError);
  });
});
