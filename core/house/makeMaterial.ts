import { STANDARD_ATMOSPHERE_PA } from '../atmosphere';
import type { LatentKind } from '../answer';
import { remember } from '../remember';
import { Problem } from '../problem';
import type { Change, Curve, Substance } from '../substance';
import { missing, readable } from './given';
import { coexistenceTermCurve } from './coexistenceTerm';
import { defaultKind, disagreementOf } from './disagreementOf';
import { latentCurve, type Around, type Answered } from './latentCurves';
import { heatKey, type MaterialData } from './materialData';
import { materialLadder } from './materialLadder';
import { materialEnthalpy, materialHeatCapacity } from './phaseCurves';
import { materialBoiling, materialPressure } from './saturationCurves';
import { formsOf } from './stations';

const PER_KILOGRAM: Readonly<Partial<Record<Curve['unit'], Curve['unit']>>> = {
  'J/mol': 'J/kg',
  'J/(mol K)': 'J/(kg K)',
};

/** A material without a molar mass is counted in kilograms, and its curves say so. */
function inOwnUnit(curve: Curve, molarMass: number): Curve {
  const unit = Number.isNaN(molarMass) ? PER_KILOGRAM[curve.unit] : undefined;
  return unit === undefined ? curve : { ...curve, unit };
}

/**
 * A substance from what is known of a material: everything that its data support, and a `missing` problem that names
 * the piece for everything else.
 *
 * Liquid and solids have the same enthalpy at every pressure; the vapour is joined to them where they meet at that
 * pressure and goes on as an ideal gas. So every path at a pressure closes, and the heat across a transition is the
 * latent heat given.
 *
 * @param data constants, heats, heat capacities and vapour pressures, each readable or a problem
 */
export function makeMaterial(data: MaterialData): Substance {
  const ladder = remember((pressurePa: number) => materialLadder(data, pressurePa));
  const around: Around = { data, ladder };
  const curves = new Map<string, Curve>();
  const kept = (key: string, make: () => Curve): Curve => {
    let curve = curves.get(key);
    if (curve === undefined) {
      curve = inOwnUnit(make(), data.molarMass);
      if (curves.size >= MOST_CURVES) curves.clear();
      curves.set(key, curve);
    }
    return curve;
  };
  const changes = changesOf(data);
  const known = (change: Change): Change => {
    if (changes.includes(change)) return change;
    throw missing(data, `heat of ${change}`);
  };
  const latent = (answered: Answered) => (change: Change, kind: LatentKind, pressurePa?: number) =>
    kept(`${answered} ${change} ${kind} ${pressurePa ?? ''}`, () =>
      latentCurve(around, known(change), kind, answered, pressurePa),
    );
  const forms = formsOf(data.solidChanges);
  return {
    name: data.name,
    formula: data.formula,
    cas: data.cas,
    synonyms: data.synonyms,
    group: data.group,
    notes: data.notes,
    ...(forms.length === 0 ? {} : { forms }),
    molarMass: data.molarMass,
    constants: data.constants,
    changes,
    enthalpyReference: referenceOf(around),
    transitionTemperature(change) {
      const single =
        change !== 'vaporization' || readable(data.heats.get(heatKey(change, defaultKind(data, change))))?.single;
      return single === true ? readable(data.transitions.get(change))?.temperatureK : undefined;
    },
    defaultKind: (change) => defaultKind(data, known(change)),
    latent: latent('latent'),
    latentSlope: latent('slope'),
    coexistenceTerm: (change) => kept(`term ${change}`, () => coexistenceTermCurve(around, known(change))),
    heatCapacity: (phase, at, form) =>
      kept(`cp ${phase} ${typeof at === 'number' ? 'at' : at} ${form ?? ''}`, () =>
        materialHeatCapacity(data, phase, at, form),
      ),
    saturationPressure: (surface) => kept(`p ${surface}`, () => materialPressure(data, surface)),
    saturationTemperature: (surface) => kept(`T ${surface}`, () => materialBoiling(data, surface)),
    enthalpy: (phase, pressurePa, form) =>
      kept(`h ${phase} ${pressurePa} ${form ?? ''}`, () => materialEnthalpy(data, ladder(pressurePa), phase, form)),
    ladder,
    disagreement: (change, fromK, toK) => disagreementOf(around, known(change), fromK, toK),
  };
}

const MOST_CURVES = 128;

function changesOf(data: MaterialData): readonly Change[] {
  const has = (change: Change): boolean => [...data.heats.keys()].some((key) => key.startsWith(`${change} `));
  return [...data.solidChanges, 'fusion', 'vaporization', 'sublimation'].filter(has);
}

function referenceOf(around: Around): string {
  try {
    return `${around.ladder(STANDARD_ATMOSPHERE_PA).reference}: h = 0`;
  } catch (thrown) {
    if (thrown instanceof Problem) return 'no path at one atmosphere';
    throw thrown;
  }
}
