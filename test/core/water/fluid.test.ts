import { describe, it } from 'vitest';
import { CRITICAL_DENSITY, CRITICAL_TEMPERATURE_K } from '../../../core/water/fluidCoefficients';
import { emptyFluidState, fluidState } from '../../../core/water/fluidState';
import { emptyParts } from '../../../core/water/helmholtzParts';
import { idealPart } from '../../../core/water/idealPart';
import { residualPart } from '../../../core/water/residualPart';
import { saturationAt } from '../../../core/water/saturationLine';
import { checksOf, expectPrinted, type Check } from './reference';

const checks = checksOf('water-fluid.json');
const of = (model: string): Check[] => checks.filter((check) => check.model === model);

describe('Helmholtz energy and its derivatives (IAPWS R6-95(2018) Table 6)', () => {
  for (const { id, at, expected } of of('R6-95 phi')) {
    it(id, () => {
      const delta = at['rho']! / CRITICAL_DENSITY;
      const tau = CRITICAL_TEMPERATURE_K / at['T']!;
      const ideal = idealPart(tau, { phi: 0, t: 0, tt: 0 });
      const residual = residualPart(delta, tau, emptyParts());
      const actual: Record<string, number> = {
        phi0: Math.log(delta) + ideal.phi,
        phi0_d: 1 / delta,
        phi0_dd: -1 / delta ** 2,
        phi0_t: ideal.t / tau,
        phi0_tt: ideal.tt / tau ** 2,
        phi0_dt: 0,
        phir: residual.phi,
        phir_d: residual.d / delta,
        phir_dd: residual.dd / delta ** 2,
        phir_t: residual.t / tau,
        phir_tt: residual.tt / tau ** 2,
        phir_dt: residual.dt / (delta * tau),
      };
      for (const [name, value] of Object.entries(expected)) expectPrinted(actual[name]!, value, name);
    });
  }
});

describe('single-phase properties (R6-95 Table 7; Wright et al. 2010)', () => {
  for (const { id, at, expected } of of('R6-95 single phase')) {
    it(id, () => {
      const state = fluidState(at['T']!, at['rho']!, emptyFluidState());
      const actual: Record<string, number> = {
        p: state.pressure,
        cv: state.cv,
        cp: state.cp,
        w: state.soundSpeed,
        s: state.entropy,
        h: state.enthalpy,
        g: state.gibbs,
      };
      for (const [name, value] of Object.entries(expected)) expectPrinted(actual[name]!, value, name);
    });
  }
});

describe('saturation by equal pressure and Gibbs energy (R6-95 Table 8; Wright et al. 2010)', () => {
  for (const { id, at, expected } of of('R6-95 saturation')) {
    it(id, () => {
      const { liquid, vapour, pressure } = saturationAt(at['T']!);
      const actual: Record<string, number> = {
        p: pressure,
        rho_l: liquid.density,
        rho_v: vapour.density,
        h_l: liquid.enthalpy,
        h_v: vapour.enthalpy,
        s_l: liquid.entropy,
        s_v: vapour.entropy,
      };
      for (const [name, value] of Object.entries(expected)) expectPrinted(actual[name]!, value, name);
    });
  }
});
