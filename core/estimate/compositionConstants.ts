/** Quadratic in the Celsius temperature, J/(kg K): c0 + c1 t + c2 t². */
export type Quadratic = readonly [number, number, number];

/** One part of a moist or composed material. */
export interface PartConstants {
  readonly coefficients: Quadratic;
  /** Standard error of the part's equation as a share of its value. */
  readonly relativeError: number;
  /** How the coefficients were confirmed. */
  readonly status: string;
}

/** What a composed material is made of, as its mass fractions name it. */
export type CompositionPart = 'protein' | 'fat' | 'carbohydrate' | 'fibre' | 'ash' | 'water' | 'ice';

export const COMPOSITION_SOURCE =
  'Y. Choi & M. R. Okos, in Food Engineering and Process Applications 1 (1986) 93, coefficients as course material and ASHRAE Refrigeration, Thermal Properties of Foods, print them';

const PAGE = 'read on a page that reproduces the table';

/**
 * Constants of Choi and Okos (1986) from −40 to 150 °C, ice to 0 °C. The standard errors of the dry parts are from memory;
 * those of water and ice are the deviation from IAPWS R6-95 and R10-06.
 */
export const PARTS: Readonly<Record<Exclude<CompositionPart, 'water'>, PartConstants>> = {
  protein: { coefficients: [2008.2, 1.2089, -0.0013129], relativeError: 0.056, status: PAGE },
  fat: { coefficients: [1984.2, 1.4733, -0.0048008], relativeError: 0.012, status: PAGE },
  carbohydrate: { coefficients: [1548.8, 1.9625, -0.0059399], relativeError: 0.06, status: PAGE },
  fibre: { coefficients: [1845.9, 1.8306, -0.0046509], relativeError: 0.017, status: 'from memory' },
  ash: { coefficients: [1092.6, 1.8896, -0.0036817], relativeError: 0.025, status: PAGE },
  ice: {
    coefficients: [2062.3, 6.0769, 0],
    relativeError: 0.02,
    status: 'from memory; within 2 % of IAPWS R10-06 over its range',
  },
};

/** Water has one equation below 0 °C, where it is supercooled or bound, and one above. */
export const COLD_WATER: PartConstants = {
  coefficients: [4081.7, -5.3062, 0.99516],
  relativeError: 0.04,
  status: PAGE,
};
export const WARM_WATER: PartConstants = {
  coefficients: [4176.2, -0.0909, 0.0054731],
  relativeError: 0.004,
  status: PAGE,
};
