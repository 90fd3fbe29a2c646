import { describe, expect, it } from 'vitest';
import { phaseBranch } from '../../../core/water/phaseBranch';
import { water } from '../../../core/water/water';

describe('heat capacities at one atmosphere', () => {
  it.each(['liquid', 'gas'] as const)('of %s: the kept series is the equation of state itself', (phase) => {
    const curve = water.heatCapacity(phase, 101325);
    const branch = phaseBranch(phase, 101325);
    for (let i = 0; i <= 1000; i++) {
      const t = i === 1000 ? curve.to : curve.from + ((curve.to - curve.from) * i) / 1000;
      const exact = branch.heatCapacity(t) * water.molarMass;
      // 1e-10: the series' own end, far below the equation's printed digits; the density solver stops at 1e-12
      expect(Math.abs(curve.at(t) / exact - 1), `${t} K`).toBeLessThan(1e-10);
    }
  });
});
