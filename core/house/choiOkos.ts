import type { AreaShape } from './shape';

/** What a food or an extract is made of, as mass fractions. */
export type Constituent = 'protein' | 'fat' | 'carbohydrate' | 'fibre' | 'ash' | 'water' | 'ice';

export const CONSTITUENTS: readonly Constituent[] = [
  ...(['water', 'protein', 'fat', 'carbohydrate', 'fibre', 'ash', 'ice'] as const),
];

export const CHOI_OKOS =
  'Y. Choi and M. R. Okos, Effects of temperature and composition on the thermal properties of foods, in Food Engineering and Process Applications 1 (1986) 93';

/** Where the equations hold, K: −40 to 150 °C. */
export const COMPOSITION_FROM_K = 233.15;
export const COMPOSITION_TO_K = 423.15;

type Cubic = readonly [number, number, number];

/**
 * Heat capacities a + b t + c t², J/(kg K), t in °C. Fat: its linear term is also printed as 1.4373. Supercooled water:
 * later tables print 4128.9 in place of 4081.7.
 */
const SOLIDS: Readonly<Record<Exclude<Constituent, 'water'>, Cubic>> = {
  protein: [2008.2, 1.2089, -0.0013129],
  fat: [1984.2, 1.4733, -0.0048008],
  carbohydrate: [1548.8, 1.9625, -0.0059399],
  fibre: [1845.9, 1.8306, -0.0046509],
  ash: [1092.6, 1.8896, -0.0036817],
  ice: [2062.3, 6.0769, 0],
};
const COLD_WATER: Cubic = [4081.7, -5.3062, 0.99516];
const WARM_WATER: Cubic = [4176.2, -0.0909, 0.0054731];

/** Constituents whose constants were not read in a document: from memory, or (fat) its linear term. */
export const FROM_MEMORY: readonly Constituent[] = ['fat', 'fibre', 'ash', 'ice'];

/**
 * Heat capacity of a material from its composition: cp = Σ xᵢ cpᵢ(t), J/(kg K).
 *
 * Water counts as liquid also below 0 °C; what is frozen is given as ice. Its two ranges meet at 0 °C with a step of
 * 2 %, as published.
 *
 * @param fractions mass fractions; those left out are zero
 * @returns J/(kg K) against K, for −40 to 150 °C
 * @source Choi and Okos 1986, as reproduced in ASHRAE Refrigeration, thermal properties of foods
 * @example
 * choiOkos({ protein: 1 }).at(273.15) // => 2008.2
 */
export function choiOkos(fractions: Readonly<Partial<Record<Constituent, number>>>): AreaShape {
  const solids: [number, number, number] = [0, 0, 0];
  for (const name of Object.keys(SOLIDS) as (keyof typeof SOLIDS)[]) add(solids, SOLIDS[name], fractions[name] ?? 0);
  const water = fractions.water ?? 0;
  const cold: [number, number, number] = [...solids];
  const warm: [number, number, number] = [...solids];
  add(cold, COLD_WATER, water);
  add(warm, WARM_WATER, water);
  const areaFromZero = (t: number): number => {
    const [a, b, c] = t < 0 ? cold : warm;
    return t * (a + t * (b / 2 + (t * c) / 3));
  };
  return {
    at: (kelvin) => {
      const t = kelvin - 273.15;
      const [a, b, c] = t < 0 ? cold : warm;
      return a + t * (b + t * c);
    },
    slope: (kelvin) => {
      const t = kelvin - 273.15;
      const [, b, c] = t < 0 ? cold : warm;
      return b + 2 * t * c;
    },
    area: (from, to) => areaFromZero(to - 273.15) - areaFromZero(from - 273.15),
  };
}

function add(sum: [number, number, number], terms: Cubic, share: number): void {
  for (const i of [0, 1, 2] as const) sum[i] += share * terms[i];
}
