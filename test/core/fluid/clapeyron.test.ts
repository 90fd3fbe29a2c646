import { describe, expect, it } from 'vitest';
import { fluidSources, packedFluids } from '../../../core/catalogue/fluids/fluids.generated';
import { MOLAR_GAS_CONSTANT } from '../../../core/fluid/constants';
import { fluidParts, requireGas } from '../../../core/fluid/fluidParts';
import { emptyLiquidVolume, liquidVolume } from '../../../core/fluid/liquidVolume';
import { unpackFluid } from '../../../core/fluid/unpackFluid';

const fluids = packedFluids
  .map((packed) => fluidParts(unpackFluid(packed, fluidSources)))
  .filter(({ numbers }) => numbers.ideal !== undefined);

/** How far the fit may leave Clapeyron's equation: to 0.7 Tc the vapour's equation is good, at 0.9 Tc less so. */
const LIMITS = [
  { to: 0.7, most: 0.005 },
  { to: 0.85, most: 0.01 },
] as const;

/** The vapour of the acids is half in pairs, whose share is known to a few percent only. */
const PAIRED = 8;

describe("Clapeyron's equation: ΔHvap = T·Δv·dp/dT, with the volume of the real vapour and Rackett's liquid", () => {
  it.each(fluids.map((parts) => [parts.numbers.name, parts] as const))('%s', (name, parts) => {
    const { numbers, line } = parts;
    const { criticalK, criticalPa, acentric, meltingK, dimer } = numbers;
    for (const { to, most } of LIMITS) {
      for (let i = 0; i <= 10; i++) {
        const k = meltingK + ((to * criticalK - meltingK) * i) / 10;
        const p = line.pressure(k);
        const gas = requireGas(parts).compressibility(k, p);
        const { volume } = liquidVolume(acentric, k / criticalK, emptyLiquidVolume());
        const liquid = (volume * criticalK * p) / (criticalPa * k);
        const latent = MOLAR_GAS_CONSTANT * k * k * (gas - liquid) * line.lnSlope(k);
        const off = latent / line.latent(k) - 1;
        expect(Math.abs(off), `${name} at ${k} K: ${off}`).toBeLessThan(dimer === undefined ? most : PAIRED * most);
      }
    }
  });
});
