import type { Answer, LatentKind } from '../../answer';
import { evaluate } from '../../evaluate';
import type { Change, Substance } from '../../substance';
import { remember } from '../../remember';
import { condensedConstants, molarMassOf } from './constants';
import { condensedLadder } from './ladder';
import { coexistenceTermCurve, latentCurve } from './latentCurves';
import { makeModel, noSuchChange, type CondensedModel } from './model';
import { condensedNotes } from './notes';
import { enthalpyCurve, heatCapacityCurve } from './phaseCurves';
import type { CondensedRecord } from './record';
import { saturationPressureCurve, saturationTemperatureCurve } from './saturationCurves';

/**
 * A metal, salt or oxide from the nine-coefficient polynomials of its forms, its liquid and its vapour's species.
 *
 * Latent heats of fusion and solid-solid changes are differences of two enthalpy polynomials; the two-phase line with
 * the vapour is where Gibbs energies are equal, the vapour an ideal gas of species in equilibrium.
 *
 * @param record what the catalogue holds of it
 * @source McBride, Zehe & Gordon, NASA/TP-2002-211556 (2002)
 */
export function condensedSubstance(record: CondensedRecord): Substance {
  const model = makeModel(record);
  const { name, formula, cas, synonyms, group } = record;
  const forms = model.solids.flatMap(({ form }) => form ?? []);
  const changes = changesOf(model);
  const isobaric = new Set(
    model.forms.flatMap(({ changeAbove, secondOrder }) => (secondOrder ? [] : (changeAbove ?? []))),
  );
  const defaultKind = (change: Change): LatentKind => {
    if (!changes.includes(change)) throw noSuchChange(model, change);
    return isobaric.has(change) ? 'isobaric' : 'coexistence';
  };
  return {
    name,
    formula,
    cas,
    synonyms,
    group,
    notes: condensedNotes(model),
    ...(forms.length === 0 ? {} : { forms }),
    ...(record.lambdaPoints === undefined ? {} : { lambdaPoints: record.lambdaPoints }),
    molarMass: molarMassOf(model),
    constants: condensedConstants(model),
    changes,
    enthalpyReference:
      'zero for the elements in their reference states at 298.15 K and 1 bar, so that a compound has its enthalpy of formation there (NASA/TP-2002-211556)',
    transitionTemperature: (change) =>
      model.forms.find(({ changeAbove, secondOrder }) => changeAbove === change && !secondOrder)?.toK,
    defaultKind,
    latent: (change, kind, pressurePa) => latentCurve(model, change, kind, 'latent', pressurePa),
    latentSlope: (change, kind, pressurePa) => latentCurve(model, change, kind, 'slope', pressurePa),
    coexistenceTerm: (change) => coexistenceTermCurve(model, change),
    heatCapacity: (phase, at, form) => heatCapacityCurve(model, phase, at, form),
    saturationPressure: (surface) => saturationPressureCurve(model, surface),
    saturationTemperature: (surface) => saturationTemperatureCurve(model, surface),
    enthalpy: (phase, pressurePa, form) => enthalpyCurve(model, phase, pressurePa, form),
    ladder: remember((pressurePa) => condensedLadder(model, pressurePa)),
    disagreement(change, fromK, toK): Answer {
      const curve = latentCurve(model, change, defaultKind(change), 'latent');
      evaluate(curve, fromK, 'refuse', 'from');
      return {
        ...evaluate(curve, toK, 'refuse', 'to'),
        value: 0,
        uncertainty: undefined,
        method:
          'latent heat and heat capacities come from one data set, so they cannot disagree; other published values are in the notes',
      };
    },
  };
}

/** In order of temperature: solid-solid changes, fusion, and the two to the vapour. */
function changesOf({ forms, liquid, solids, vapour }: CondensedModel): readonly Change[] {
  const between = forms.flatMap(({ changeAbove, secondOrder }) => (secondOrder ? [] : (changeAbove ?? [])));
  if (vapour === undefined) return between;
  return [
    ...between,
    ...(liquid === undefined ? [] : ['vaporization']),
    ...(solids.length === 0 ? [] : ['sublimation']),
  ];
}
