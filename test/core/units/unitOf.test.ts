import { describe, expect, it } from 'vitest';
import { differenceUnit } from '../../../core/units/differenceUnit';
import { FACTORS } from '../../../core/units/factors.generated';
import { siUnit } from '../../../core/units/siUnit';
import type { UnitKind } from '../../../core/units/unit';
import { unitOf } from '../../../core/units/unitOf';
import { problemOf } from './problemOf';

describe('unitOf reads every usual spelling as one unit', () => {
  it.each([
    [
      'kJ/kg',
      [
        'kJ kg⁻¹',
        'kJ·kg⁻¹',
        'kJ·kg^-1',
        'kJ kg-1',
        'kJ kg^(-1)',
        'kJ.kg-1',
        'kJ per kg',
        'kJ / kg',
        'kj/KG',
        'kJ∕kg',
        ' kJ/kg ',
      ],
    ],
    [
      'J/(mol K)',
      [
        'J mol⁻¹ K⁻¹',
        'J mol−1 K−1',
        'J/mol/K',
        'J/mol K',
        'J/(mol·K)',
        'J/(K mol)',
        'J/(mol °C)',
        'J mol⁻¹ ℃⁻¹',
        'J/mol-K',
        'J/(mol-K)',
      ],
    ],
    [
      'kJ/(kg K)',
      [
        'kJ/(kg·K)',
        'kJ/(kg*K)',
        'kJ/kg·K',
        'kJ/kg/degC',
        'kJ/(kg °C)',
        'kJ kg⁻¹ K⁻¹',
        'kJ⋅kg⁻¹⋅K⁻¹',
        'kJ/kg°C',
        'kJ/kg-K',
      ],
    ],
    ['Btu_IT/(lb degF)', ['Btu_IT/(lb °F)', 'BTU_IT/lb/°F', 'Btu(IT)/(lbm degF)', 'Btu_{IT}/(lb °F)']],
    ['cal_th/g', ['cal(th)/g', 'CAL_TH/g', 'cal_th g⁻¹', 'cal th/g']],
    ['kcal_IT/kg', ['kcal(IT)/kg', 'Kcal_it/kg', 'kcalIT/kg']],
    ['degC', ['°C', '℃', 'deg C', '° C', 'ºC', 'DEGC', 'celsius', 'degrees C']],
    ['degF', ['°F', '℉', 'deg F', 'Fahrenheit']],
    ['K', ['kelvin', 'K', 'k', 'degK']],
    ['mmHg', ['mm Hg', 'mmhg', 'MMHG', 'mm\u00a0Hg']],
    ['inH2O', ['in H2O', 'inH₂O', 'in h2o']],
    ['psi', ['psia', 'psi(a)', 'PSI', 'psi abs', 'psi absolute']],
    ['psi gauge', ['psig', 'psi(g)', 'PSIG', 'psi gauge', 'psi gage']],
    ['bar gauge', ['barg', 'bar(g)', 'bar g', 'bar_g', 'BAR GAUGE']],
    ['bar', ['bara', 'bar(a)', 'bar abs', 'BAR']],
    ['kPa gauge', ['kPag', 'kPa(g)', 'kPa(gauge)', 'kpa gauge']],
    ['kWh/t', ['kW h/t', 'kWh/tonne', 'kWh t⁻¹', 'kW·h/t']],
    ['ft lbf/lb', ['ft*lbf/lb', 'ft·lbf/lb']],
    ['m3/h', ['m³/h', 'm^3/h', 'm3/hr', 'm³ h⁻¹', 'm**3/h']],
    ['lbmol/h', ['lb-mol/h', 'lbmole/hr']],
    ['ton_refrigeration', ['tons of refrigeration', 'ton of refrigeration']],
    ['ug', ['µg', 'μg']],
    ['degF difference', ['Δ°F', 'delta degF', '∆degF', 'degF diff']],
  ] as [string, string[]][])('%s', (symbol, spellings) => {
    for (const spelling of spellings) expect(unitOf(spelling).symbol, spelling).toBe(symbol);
    // One unit is one object, whatever the spelling.
    for (const spelling of spellings) expect(unitOf(spelling)).toBe(unitOf(spellings[0] ?? symbol));
  });

  it('writes symbols that it reads again', () => {
    const symbols = Object.values(FACTORS).flatMap((group) => Object.keys(group));
    const compounds = [
      'kJ/(kg K)',
      'Btu_IT/(lb degF)',
      'kPa gauge',
      'g/cm3',
      'ft3/lb',
      'W/(m2 K)',
      'K/min',
      'W/g',
      '%',
      '1',
    ];
    for (const symbol of [...symbols, ...compounds]) expect(unitOf(symbol).symbol).toBe(symbol);
  });
});

describe('unitOf tells kinds apart', () => {
  it.each([
    ['K', 'temperature'],
    ['K difference', 'difference'],
    ['kPa', 'pressure'],
    ['J/kg', 'heat'],
    ['J/mol', 'heat'],
    ['J/(kg K)', 'heatCapacity'],
    ['kg', 'amount'],
    ['mol', 'amount'],
    ['kWh', 'energy'],
    ['kg/s', 'flow'],
    ['mol/s', 'flow'],
    ['W', 'power'],
    ['g/mol', 'molarMass'],
    ['mm', 'length'],
    ['cm2', 'area'],
    ['L', 'volume'],
    ['L/min', 'volumeFlow'],
    ['h', 'time'],
    ['%', 'share'],
    ['lb/ft3', 'density'],
    ['m3/kg', 'specificVolume'],
    ['kJ/K', 'bodyHeatCapacity'],
    ['W/m2', 'heatFlux'],
    ['W/(m2 K)', 'heatTransfer'],
    ['K/min', 'heatingRate'],
    ['W/g', 'specificPower'],
    ['lbf', 'force'],
  ] as [string, UnitKind][])('%s is %s', (text, kind) => {
    expect(unitOf(text).kind).toBe(kind);
    expect(unitOf(text, kind).kind).toBe(kind);
    expect(siUnit(kind, unitOf(text).basis)).toMatchObject({ kind, factor: 1, offset: 0, basis: unitOf(text).basis });
  });

  it('a temperature scale serves as a difference, never the other way', () => {
    expect(unitOf('degC', 'difference')).toMatchObject({ symbol: 'K', kind: 'difference', factor: 1, offset: 0 });
    expect(unitOf('degF', 'difference')).toMatchObject({ symbol: 'degF difference', factor: 5 / 9, offset: 0 });
    expect(differenceUnit(unitOf('degF'))).toBe(unitOf('degF difference'));
    expect(problemOf(() => unitOf('degF difference', 'temperature')).received).toBe(
      '"degF difference", a unit of temperature difference',
    );
  });

  it('names what is expected and what came', () => {
    expect(problemOf(() => unitOf('kJ', 'heat', 'heat'))).toEqual({
      code: 'argument',
      argument: 'heat',
      allowed: 'a unit of heat per amount, as kJ/kg, kJ/mol, kcal_th/mol, Btu_IT/lb',
      received: '"kJ", a unit of energy',
    });
  });
});

describe('unitOf refuses what has more than one reading, with the likely spellings', () => {
  it.each([
    ['F', 'degF'],
    ['C', 'degC'],
    ['cal', 'cal_th or cal_IT'],
    ['kcal/mol', 'kcal_th/mol or kcal_IT/mol'],
    ['Btu', 'Btu_IT or Btu_th'],
    ['BTU/lb', 'Btu_IT/lb or Btu_th/lb'],
    ['Btu/(lb F)', 'Btu_IT/(lb degF) or Btu_th/(lb degF)'],
    ['MBtu/h', 'kBtu_IT/h or MMBtu_IT/h'],
    ['ton/h', 't/h or ton_short/h or ton_long/h'],
    ['hp', 'hp_mechanical or hp_metric or hp_electric or hp_boiler'],
    ['gal/min', 'gal_US/min or gal_UK/min'],
    ['therm', 'therm_EC or therm_US'],
    ['mpa', 'mPa or MPa'],
    ['mw', 'mW or MW'],
    ['MG', 'mg or Mg'],
    ['T', 't or K'],
  ])('%s', (text, allowed) => {
    expect(problemOf(() => unitOf(text))).toMatchObject({ allowed, received: `"${text}", which is ambiguous` });
  });

  it('keeps to the expected kind', () => {
    expect(problemOf(() => unitOf('ton', 'power')).allowed).toBe('ton_refrigeration');
    expect(problemOf(() => unitOf('ton', 'amount')).allowed).toBe('t or ton_short or ton_long');
    expect(problemOf(() => unitOf('cal', 'pressure')).allowed).toMatch(/^a unit of pressure, as kPa/);
  });

  it('names the nearest of a slip of the pen', () => {
    expect(problemOf(() => unitOf('kJ/kgg')).nearest).toBe('kJ/kg');
    expect(problemOf(() => unitOf('mmHgg', 'pressure')).nearest).toBe('mmHg');
  });

  it.each([
    '',
    ' ',
    'constructor',
    '__proto__',
    'J/',
    '/kg',
    'J/(kg',
    'J/kg)',
    '()',
    'J//kg',
    'm99999999',
    'kg^',
    '12',
    'J(kg',
    'bar bar',
    '🙂',
  ])('no unit: "%s"', (text) => {
    expect(problemOf(() => unitOf(text)).allowed).toBe('a unit, as kJ/kg, degC, kPa');
  });
});
