import type { Check } from './check';

const SOURCES = [
  'VDI Heat Atlas, collated in Biswas et al. (2023), doi 10.1021/acs.jcim.3c00546',
  'Yaws 2009 (experimental), collated in Biswas et al. (2023), doi 10.1021/acs.jcim.3c00546',
  'Zalba, Marin, Cabeza and Mehling, Appl. Therm. Eng. 23 (2003) 251, another entry, from memory',
] as const;

/** Material, printed heat of fusion, its unit, how far another print may lie off as a share, and source. */
const HEATS: readonly (readonly [string, number, string, number, number])[] = [
  ['n-tetradecane', 45.074, 'kJ/mol', 0.03, 0],
  ['n-hexadecane', 53.35, 'kJ/mol', 0.03, 0],
  ['n-octadecane', 61.716, 'kJ/mol', 0.03, 0],
  ['n-eicosane', 69.877, 'kJ/mol', 0.03, 0],
  ['dodecanoic acid', 36.65, 'kJ/mol', 0.03, 1],
  ['hexadecanoic acid', 54.935, 'kJ/mol', 0.03, 1],
  ['1-tetradecanol', 49.4, 'kJ/mol', 0.03, 1],
  ['sodium sulfate decahydrate', 251.1, 'kJ/kg', 0.05, 2],
  ['disodium hydrogen phosphate dodecahydrate', 279, 'kJ/kg', 0.06, 2],
  ['calcium chloride hexahydrate', 171, 'kJ/kg', 0.15, 2],
];

/** Printed heats of fusion for heat-storage materials, from a second print where there is one. */
export const storageChecks: readonly Check[] = HEATS.map(([name, value, unit, share, source]): Check => ({
  call: 'LATENT',
  args: [name, 'fusion'],
  settings: `heat=${unit}`,
  expected: value,
  within: share * value,
  because: `prints differ by up to ${100 * share} %`,
  source: SOURCES[source] ?? '',
}));
