import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  COMPOSITION_PARTS,
  compositionHeatCapacity,
  compositionPolynomial,
  type Composition,
} from '../../../core/estimate/compositionHeatCapacity';
import { atomsOf } from '../../../core/estimate/atomsOf';
import { koppHeatCapacity } from '../../../core/estimate/koppHeatCapacity';
import { neumannHeatCapacity } from '../../../core/estimate/neumannHeatCapacity';
import { water } from '../../../core/water/water';
import { exampleOf, near, reference, statesScatter } from './reference';

const FOOD: Composition = { protein: 0.15, carbohydrate: 0.2, fibre: 0.01, ash: 0.005, fat: 0.2, water: 0.435 };

describe('heat capacity from composition (Choi & Okos 1986)', () => {
  it('a formulated food at 25 °C (composition of an example by Toledo)', () => {
    near(compositionHeatCapacity(FOOD, 298.15).value, exampleOf('choi-okos-formulated-food').result.value, 0.05); // half of the last digit
  });

  it.each([
    ['water', 'liquid', [273.16, 283.15, 298.15, 333.15, 373.15, 423.15], 0.0105],
    ['ice', 'solid', [233.15, 243.15, 253.15, 263.15, 272.15], 0.02],
  ] as const)('%s alone is near IAPWS', (part, phase, temperatures, share) => {
    for (const t of temperatures) {
      const iapws = water.heatCapacity(phase, phase === 'solid' ? 101325 : 'saturated').at(t) / water.molarMass;
      // largest deviation of the published quadratic over its range, found here and stated (0.4 % root mean square for water)
      near(compositionHeatCapacity({ [part]: 1 }, t).value, iapws, share * iapws, `${part} at ${t} K:`);
    }
  });

  it('whole milk, 3.85 kJ/(kg K) measured (Geankoplis, Appendix A.4), within the uncertainty', () => {
    const milk = { water: 0.875, protein: 0.033, fat: 0.037, carbohydrate: 0.048, ash: 0.007 }; // usual composition, from memory
    const { value, uncertainty = NaN } = compositionHeatCapacity(milk, 293.15);
    near(value, 3850, uncertainty);
  });

  it('is one quadratic below 0 °C and one above, linear in the fractions', () => {
    const share = fc.double({ min: 0, max: 1, noNaN: true });
    fc.assert(
      fc.property(share, fc.double({ min: 233.15, max: 423.15, noNaN: true }), (wet, t) => {
        const mixed = compositionHeatCapacity({ water: wet, protein: 1 - wet }, t).value;
        const parts =
          wet * compositionHeatCapacity({ water: 1 }, t).value +
          (1 - wet) * compositionHeatCapacity({ protein: 1 }, t).value;
        near(mixed, parts, 1e-12 * parts); // rounding of two sums
        const { cold, warm } = compositionPolynomial({ water: wet, protein: 1 - wet });
        const [c0, c1, c2] = t < 273.15 ? cold : warm;
        const celsius = t - 273.15;
        near(mixed, c0 + celsius * (c1 + celsius * c2), 0);
      }),
      { seed: 4 },
    );
  });

  it('refuses fractions that are none, sums that are not 1, ice above 0 °C and temperatures outside', () => {
    expect(() => compositionHeatCapacity({ water: 0.9 }, 300)).toThrow(
      'mass fractions: allowed a sum of 1 (within 0.005); received a sum of 0.9',
    );
    expect(() => compositionHeatCapacity({ water: 1.2, fat: -0.2 }, 300)).toThrow(
      'mass fraction of fat: allowed a share in [0, 1]; received -0.2',
    );
    expect(() => compositionHeatCapacity({ ice: 1 }, 280)).toThrow(
      /^temperature 280 K is outside \[233\.15 K, 273\.15 K\]/,
    );
    expect(() => compositionHeatCapacity({ water: 1 }, 430)).toThrow(/is outside \[233\.15 K, 423\.15 K\]/);
    expect(compositionHeatCapacity({ water: 1 }, 430, 'extend').marks.map(({ code }) => code)).toEqual(['extended']);
    expect(compositionHeatCapacity(FOOD, 300).marks.map(({ code }) => code)).toEqual(['unconfirmed']); // fibre
    expect(COMPOSITION_PARTS).toHaveLength(7);
  });
});

describe("Kopp's rule", () => {
  it('calcium hydroxide (Felder & Rousseau, Sec. 8.3c, from memory): 79 J/(mol K)', () => {
    near(koppHeatCapacity('Ca(OH)2').value, 79, 0.5); // half of the last printed digit
  });

  it.each(['kopp', 'hurst-harrison'] as const)('%s has the scatter it states, 36 solid compounds (NASA-9)', (set) => {
    expect(reference.solids).toHaveLength(36);
    const deviations = reference.solids.map(
      ({ formula, heatCapacity }) => koppHeatCapacity(formula, set).value / heatCapacity - 1,
    );
    const one = koppHeatCapacity('NaCl', set);
    statesScatter((one.uncertainty ?? NaN) / one.value, deviations);
  });
});

describe('formulas', () => {
  it.each([
    ['NaCl', { Na: 1, Cl: 1 }],
    ['Ca(OH)2', { Ca: 1, O: 2, H: 2 }],
    ['Na2SO4·10H2O', { Na: 2, S: 1, O: 14, H: 20 }],
    ['CaCl2.6H2O', { Ca: 1, Cl: 2, H: 12, O: 6 }],
    ['K4[Fe(CN)6]', { K: 4, Fe: 1, C: 6, N: 6 }],
    ['Fe0.95O', { Fe: 0.95, O: 1 }],
    ['Al₂O₃', { Al: 2, O: 3 }],
    ['(NH4)2HPO4', { N: 2, H: 9, P: 1, O: 4 }],
  ])('%s', (formula, atoms) => {
    expect(Object.fromEntries(atomsOf(formula))).toEqual(atoms);
  });

  it.each(['', 'salt', 'Xy2', 'NaCl)', 'Ca(OH', '2', '0H2O', 'nacl', '()2', 'H2O··'])('refuses "%s"', (text) => {
    expect(() => atomsOf(text)).toThrow(
      `formula: allowed a chemical formula, as Ca(OH)2 or Na2SO4·10H2O; received "${text}"`,
    );
  });
});

describe('rule of Neumann and Kopp', () => {
  it('magnetite from wustite and hematite, within its typical error twice', () => {
    // J/(mol K) at 298.15 K: FeO 48.0 (from memory), Fe2O3 and Fe3O4 of NASA-9
    const solid = (species: string): number => reference.solids.find((s) => s.species === species)?.heatCapacity ?? NaN;
    const { value, uncertainty = NaN } = neumannHeatCapacity([
      { amount: 1, heatCapacity: 48.0 },
      { amount: 1, heatCapacity: solid('Fe2O3(cr)') },
    ]);
    near(value, solid('Fe3O4(cr)'), 2 * uncertainty);
  });

  it('sums amounts times heat capacities, and refuses none of them', () => {
    const alloy = [
      { amount: 0.64, heatCapacity: 25.1 },
      { amount: 0.36, heatCapacity: 26.1 },
    ];
    near(neumannHeatCapacity(alloy).value, 25.46, 1e-13); // rounding
    expect(() => neumannHeatCapacity([])).toThrow('constituents: allowed at least one, with its amount; received none');
    expect(() => neumannHeatCapacity([{ amount: 0, heatCapacity: 25 }])).toThrow(/^amount: allowed a number above 0/);
  });
});
