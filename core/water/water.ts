import type { LatentKind } from '../answer';
import type { Change, Substance } from '../substance';
import { betweenBranches } from './betweenBranches';
import { meltingTemperature } from './boundaries';
import { coexistenceCurve, noSuchChange } from './coexistenceCurves';
import { enthalpyCurve, heatCapacityCurve } from './phaseCurves';
import { noDisagreement } from './noDisagreement';
import { MOLAR_MASS, NORMAL_PRESSURE_PA } from './ranges';
import { saturationPressureCurve, saturationTemperatureCurve } from './saturationCurves';
import { waterConstants } from './waterConstants';
import { waterLadder } from './waterLadder';

const DEFAULT_KINDS: Readonly<Record<string, LatentKind>> = {
  fusion: 'isobaric',
  vaporization: 'coexistence',
  sublimation: 'coexistence',
};

/**
 * Water and ice Ih, after IAPWS R6-95(2018) and R10-06(2009).
 *
 * All three phases share one enthalpy reference and meet at the triple point, so that latent heats are differences and
 * cycles close. Supercooled liquid is followed to 235 K, metastable vapour and superheated liquid until their heat
 * capacity is one and a half times that of the saturated phase; vapour begins at 130 K.
 *
 * @example
 * import { water } from 'latentry';
 * water.latent('vaporization', 'coexistence').at(333.15) / water.molarMass // => 2357654.5
 * water.latent('fusion', 'isobaric').at(263.15) / water.molarMass // => 311597.3
 * water.saturationPressure('stable').at(253.15) // => 103.243
 */
export const water: Substance = {
  name: 'water',
  formula: 'H2O',
  cas: '7732-18-5',
  synonyms: ['steam', 'ice', 'ice Ih', 'ordinary water', 'light water', 'water vapour', 'water vapor', 'eau', 'aqua'],
  group: 'fluid',
  notes: [
    'One equation of state for liquid and vapour and one for ice: latent heats and heat capacities agree by construction.',
  ],
  molarMass: MOLAR_MASS,
  constants: waterConstants,
  changes: ['fusion', 'vaporization', 'sublimation'],
  enthalpyReference:
    'internal energy and entropy of saturated liquid are zero at the triple point (IAPWS R6-95); ice shares this reference (IAPWS R10-06)',
  transitionTemperature: (change) => (change === 'fusion' ? meltingTemperature(NORMAL_PRESSURE_PA) : undefined),
  defaultKind(change: Change): LatentKind {
    const kind = DEFAULT_KINDS[change];
    if (kind === undefined) throw noSuchChange(change);
    return kind;
  },
  latent: (change, kind, pressurePa) =>
    kind === 'coexistence' ? coexistenceCurve(change, 'latent') : betweenBranches(change, kind, 'latent', pressurePa),
  latentSlope: (change, kind, pressurePa) =>
    kind === 'coexistence' ? coexistenceCurve(change, 'slope') : betweenBranches(change, kind, 'slope', pressurePa),
  coexistenceTerm: (change) => coexistenceCurve(change, 'term'),
  heatCapacity: heatCapacityCurve,
  saturationPressure: saturationPressureCurve,
  saturationTemperature: saturationTemperatureCurve,
  enthalpy: enthalpyCurve,
  ladder: waterLadder,
  disagreement: noDisagreement,
};
