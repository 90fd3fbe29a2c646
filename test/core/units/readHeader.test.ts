import { describe, expect, it } from 'vitest';
import { readHeader } from '../../../core/units/readHeader';

describe('readHeader', () => {
  it.each([
    ['T / °C', 'T', 'degC', 'temperature'],
    ['T (K)', 'T', 'K', 'temperature'],
    ['T/K', 'T', 'K', 'temperature'],
    ['t / °F', 't', 'degF', 'temperature'],
    ['Temperature, degF', 'Temperature', 'degF', 'temperature'],
    ['Temperature (°C)', 'Temperature', 'degC', 'temperature'],
    ['Temperature degC', 'Temperature', 'degC', 'temperature'],
    ['T₉₀ / K', 'T90', 'K', 'temperature'],
    ['K', '', 'K', 'temperature'],
    ['°C', '', 'degC', 'temperature'],
    ['ΔH (kJ mol⁻¹)', 'ΔH', 'kJ/mol', 'latent'],
    ['dH [kJ/kg]', 'dH', 'kJ/kg', 'latent'],
    ['ΔvapH / kJ·mol−1', 'ΔvapH', 'kJ/mol', 'latent'],
    ['ΔvapH / kJ\u2009mol\u207b\u00b9', 'ΔvapH', 'kJ/mol', 'latent'],
    ['Δ_vap H_m / (kJ/mol)', 'Δ_vap H_m', 'kJ/mol', 'latent'],
    ['∆H°vap / kJ mol⁻¹', 'ΔH°vap', 'kJ/mol', 'latent'],
    ['Δl→gH / kJ/mol', 'Δl→gH', 'kJ/mol', 'latent'],
    ['Latent heat [kJ/kg]', 'Latent heat', 'kJ/kg', 'latent'],
    ['Enthalpy of vaporization in kJ/mol', 'Enthalpy of vaporization', 'kJ/mol', 'latent'],
    ['heat kJ/kg', 'heat', 'kJ/kg', 'latent'],
    ['hfg (Btu_IT/lb)', 'hfg', 'Btu_IT/lb', 'latent'],
    ['ΔH / kJ mol⁻¹ (this work)', 'ΔH', 'kJ/mol', 'latent'],
    ['kJ/mol', '', 'kJ/mol', 'latent'],
    ['p/kPa', 'p', 'kPa', 'pressure'],
    ['psat [mm Hg]', 'psat', 'mmHg', 'pressure'],
    ['Pressure (bar gauge)', 'Pressure', 'bar gauge', 'pressure'],
    ['Vapor pressure, psia', 'Vapor pressure', 'psi', 'pressure'],
    ['ΔCp / J/(mol K)', 'ΔCp', 'J/(mol K)', 'heatCapacity'],
    ['Cp,m / J mol⁻¹ K⁻¹', 'Cp,m', 'J/(mol K)', 'heatCapacity'],
    ['Heat capacity (kJ/(kg·K))', 'Heat capacity', 'kJ/(kg K)', 'heatCapacity'],
    ['t (min)', 't', 'min', 'unknown'],
    ['Mass / g', 'Mass', 'g', 'unknown'],
  ])('%s', (text, name, symbol, role) => {
    const header = readHeader(text);
    expect(header).toMatchObject({ name, role, unread: undefined, of: undefined, coverage: undefined });
    expect(header.unit?.symbol).toBe(symbol);
  });

  it.each([
    ['ΔH', 'latent'],
    ['L', 'latent'],
    ['T', 'temperature'],
    ['Temp.', 'temperature'],
    ['p', 'pressure'],
    ['cp', 'heatCapacity'],
    ['Sample', 'unknown'],
    ['Run', 'unknown'],
    ['Date', 'unknown'],
    ['h', 'latent'],
    ['', 'unknown'],
  ])('without a unit: %s', (text, role) => {
    expect(readHeader(text)).toMatchObject({ name: text, unit: undefined, unread: undefined, role });
  });

  it.each([
    ['u(ΔH) / kJ/mol', 'latent', 1, 'kJ/mol', 'heat'],
    ['u(T)/K', 'temperature', 1, 'K', 'difference'],
    ['u(T) (°F)', 'temperature', 1, 'degF difference', 'difference'],
    ['U (k=2) [J/g]', 'latent', 2, 'J/g', 'heat'],
    ['U(ΔvapH) (k = 2.05) / kJ mol-1', 'latent', 2.05, 'kJ/mol', 'heat'],
    ['U(ΔvapH) (k = 2,05) / kJ mol-1', 'latent', 2.05, 'kJ/mol', 'heat'],
    ['U(T) / K', 'temperature', undefined, 'K', 'difference'],
    ['σ_T / K', 'temperature', 1, 'K', 'difference'],
    ['u_r(ΔH) / %', 'latent', 1, '%', 'share'],
    ['standard uncertainty of ΔH (kJ/mol)', 'latent', 1, 'kJ/mol', 'heat'],
    ['expanded uncertainty, k=2 (kJ/mol)', 'latent', 2, 'kJ/mol', 'heat'],
    ['u / kPa', 'pressure', 1, 'kPa', 'pressure'],
  ])('an uncertainty: %s', (text, of, coverage, symbol, kind) => {
    const header = readHeader(text);
    expect(header).toMatchObject({ role: 'uncertainty', of, coverage, unread: undefined });
    expect(header.unit).toMatchObject({ symbol, kind });
  });

  it('u(ΔH) without a unit takes its brackets for the quantity', () => {
    expect(readHeader('u(ΔH)')).toMatchObject({ name: 'u(ΔH)', role: 'uncertainty', of: 'latent', unit: undefined });
  });

  it.each([
    ['ΔH (cal/mol)', 'cal_th/mol or cal_IT/mol', '"cal/mol"'],
    ['ΔH / kcal mol⁻¹', 'kcal_th/mol or kcal_IT/mol', '"kcal mol^-1"'],
    ['T [F]', 'degF', '"F"'],
    ['T, C', 'degC', '"C"'],
    ['ΔH [kJ/mole-ish]', 'a unit, as kJ/kg, degC, kPa', '"kJ/mole-ish"'],
  ])('says what is wrong with the unit of %s', (text, allowed, received) => {
    const header = readHeader(text);
    expect(header.unit).toBeUndefined();
    expect(header.unread?.data).toMatchObject({ code: 'argument', allowed, received });
  });
});
