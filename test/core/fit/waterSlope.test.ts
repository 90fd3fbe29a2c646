import { describe, expect, it } from 'vitest';
import { fitDeltaCp } from '../../../core/fit/fitDeltaCp';
import { kirchhoff } from '../../../core/kirchhoff/kirchhoff';
import { water } from '../../../core/water/water';
import { within } from './reference';

const T25 = 298.15;

/** ΔH of vaporization along the saturation line, J/mol, every 10 °C from 0.01 to 100 °C. */
const temperatures = Array.from({ length: 11 }, (_, i) => (i === 0 ? 273.16 : 273.15 + 10 * i));
const along = water.latent('vaporization', 'coexistence');
const latents = temperatures.map((t) => along.at(t));

describe("water's ΔCp of vaporization near 25 °C", () => {
  // Common practice, no source: about −42 J/(mol K). It is the standard kind, cp°(gas) − cp(liquid).
  it('is −42 J/(mol K) in its standard kind', () => {
    within(water.latentSlope('vaporization', 'standard').at(T25), -42, 0.5);
  });

  it('a line through 0–100 °C saturation data gives −44, and two terms say why', () => {
    const fit = fitDeltaCp(temperatures, latents, { reference: T25 });
    // Common practice, no source: about −44 J/(mol K); the sheet's own R line is −2.434 kJ/(kg K) = −43.85 J/(mol K).
    within(fit.slope, -44, 0.5);
    expect(fit.curvature()?.probability).toBeLessThan(1e-4);

    // First: the coexistence slope itself bends, and the line takes a mean that leans to the hot end.
    const slopeAt25 = water.latentSlope('vaporization', 'coexistence').at(T25);
    const bending = fit.slope - slopeAt25;
    // Second: along the line the pressure rises too; the rest is the non-ideality of vapour between p_sat and 1 bar.
    const term = water.coexistenceTerm('vaporization').at(T25);
    const deltaCp = slopeAt25 - term;
    const nonIdeal = deltaCp - water.latentSlope('vaporization', 'standard').at(T25);
    within(slopeAt25, -42.7, 0.05); // IAPWS R6-95: −2.37045551 kJ/(kg K)
    within(term, -1.81, 0.005); // −0.1006793 kJ/(kg K)
    within(deltaCp, -40.89, 0.005); // −2.26977622 kJ/(kg K)
    within(bending, -1.2, 0.3);
    within(nonIdeal, 0.85, 0.05); // −40.89 + 41.74, both from R6-95 and its ideal-gas part
    within(water.latentSlope('vaporization', 'standard').at(T25) + nonIdeal + term + bending, fit.slope, 1e-9);
  });

  it('the line carries the data, the standard slope does not', () => {
    const fit = fitDeltaCp(temperatures, latents, { reference: 373.15 });
    const carry = (deltaCp: number): number =>
      kirchhoff({ latent: along.at(373.15), atK: 373.15, toK: T25, deltaCp }).value / along.at(T25) - 1;
    const standard = water.latentSlope('vaporization', 'standard').at(T25);
    // Mixing kinds costs 0.4 % over 75 K; the line's own misfit is a tenth of a per cent (scatter 1.35 of 2400 kJ/kg).
    expect(Math.abs(carry(standard))).toBeGreaterThan(0.003);
    expect(Math.abs(carry(fit.slope))).toBeLessThan(0.002);
  });
});
