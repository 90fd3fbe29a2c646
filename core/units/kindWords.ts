import type { UnitKind } from './unit';

/** A kind in words, and units of it for messages. */
const KIND_WORDS: Record<UnitKind, readonly [words: string, examples: string]> = {
  temperature: ['temperature', 'K, degC, degF, degR'],
  difference: ['temperature difference', 'K, degC, degF'],
  pressure: ['pressure', 'kPa, bar, psi, mmHg, kPa gauge'],
  heat: ['heat per amount', 'kJ/kg, kJ/mol, kcal_th/mol, Btu_IT/lb'],
  heatCapacity: ['heat capacity per amount', 'kJ/(kg K), J/(mol K), Btu_IT/(lb degF)'],
  amount: ['amount', 'kg, lb, mol, kmol'],
  energy: ['energy', 'kJ, MJ, kWh, kcal_th, Btu_IT'],
  flow: ['flow', 'kg/h, kg/s, lb/h, kmol/h'],
  power: ['power', 'kW, MW, Btu_IT/h'],
  molarMass: ['molar mass', 'g/mol, kg/mol'],
  length: ['length', 'm, mm, ft, in'],
  area: ['area', 'm2, mm2, ft2'],
  volume: ['volume', 'm3, L, ft3'],
  volumeFlow: ['volume flow', 'm3/h, L/min'],
  time: ['time', 's, min, h, d'],
  share: ['share', '1, %'],
  density: ['density', 'kg/m3, g/cm3, lb/ft3'],
  specificVolume: ['specific volume', 'm3/kg, ft3/lb'],
  bodyHeatCapacity: ['heat capacity', 'J/K, kJ/K'],
  heatFlux: ['heat flux', 'W/m2'],
  heatTransfer: ['heat transfer coefficient', 'W/(m2 K)'],
  heatingRate: ['heating rate', 'K/min, K/s'],
  specificPower: ['specific power', 'W/g, W/kg'],
  force: ['force', 'N, lbf'],
};

/** `temperature difference` for `difference`, and so on. */
export function kindWords(kind: UnitKind): string {
  return KIND_WORDS[kind][0];
}

/** Units of a kind, as a message lists them. */
export function kindExamples(kind: UnitKind): string {
  return KIND_WORDS[kind][1];
}
