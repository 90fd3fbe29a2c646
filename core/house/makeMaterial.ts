import type { Answer, LatentKind } from '../answer';
import { remember } from '../water/remember';
import { Problem } from '../problem';
import type { Change, Curve, Substance } from '../substance';
import { missing, need, readable } from './given';
import { ATMOSPHERE_PA, coexistenceTermCurve, latentCurve, type Around, type Answered } from './latentCurves';
import { joined, NO_MARKS } from './marks';
import { heatKey, usualKind, type MaterialData } from './materialData';
import { materialLadder } from './materialLadder';
import { materialEnthalpy, materialHeatCapacity } from './phaseCurves';
import { materialBoiling, materialPressure } from './saturationCurves';
import { formsOf } from './stations';

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
      curve = make();
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

/** The usual kind, unless only another one is given. */
function defaultKind(data: MaterialData, change: Change): LatentKind {
  const usual = usualKind(change);
  const kinds = [usual, 'coexistence', 'isobaric', 'standard'] as const;
  return kinds.find((kind) => data.heats.has(heatKey(change, kind))) ?? usual;
}

function referenceOf({ ladder }: Around): string {
  try {
    return `${ladder(ATMOSPHERE_PA).reference}: h = 0`;
  } catch (thrown) {
    if (thrown instanceof Problem) return 'no path at one atmosphere';
    throw thrown;
  }
}

/** [L(to) − L(from)] − ∫Δcp dT where the heat is given by itself over a range; the two-phase line to the vapour needs real-gas data. */
function disagreementOf({ data, ladder }: Around, change: Change, fromK: number, toK: number): Answer {
  const kind = defaultKind(data, change);
  if (kind === 'coexistence') {
    throw missing(
      data,
      `real-gas correction along the two-phase line, without which the heat of ${change} and heat capacities can't be compared,`,
    );
  }
  const found = need(data, data.heats.get(heatKey(change, kind)), `heat of ${change}`);
  if (found.single) throw missing(data, `second value of the heat of ${change}, at another temperature,`);
  const curve = latentCurve({ data, ladder }, change, kind, 'latent');
  const hotPhase =
    change === 'vaporization' || change === 'sublimation' ? 'gas' : change === 'fusion' ? 'liquid' : 'solid';
  const coldPhase = change === 'vaporization' ? 'liquid' : 'solid';
  const [coldForm, hotForm] = hotPhase === 'solid' ? change.split('-') : [formsOf(data.solidChanges).at(-1), undefined];
  const cold = materialHeatCapacity(data, coldPhase, 'standard', coldPhase === 'solid' ? coldForm : undefined);
  const hot = materialHeatCapacity(data, hotPhase, 'standard', hotForm);
  const from = Math.max(curve.from, cold.from, hot.from);
  const to = Math.min(curve.to, cold.to, hot.to);
  for (const received of [fromK, toK]) {
    if (received >= from && received <= to) continue;
    throw new Problem({
      code: 'range',
      argument: 'temperature',
      quantity: 'temperature',
      received,
      from,
      to,
      subject: `disagreement about ${change} of ${data.name}`,
    });
  }
  const area = (phase: string, form: string | undefined): number => {
    const given = data.heatCapacities.get(form ?? phase) ?? data.heatCapacities.get(phase);
    return need(data, given, `${phase} heat capacity`).shape.area(fromK, toK);
  };
  return {
    value:
      curve.at(toK) -
      curve.at(fromK) -
      (area(hotPhase, hotForm) - area(coldPhase, coldPhase === 'solid' ? coldForm : undefined)),
    unit: 'J/mol',
    kind,
    method: 'change of the heat given less the integral of the heat-capacity difference given',
    sources: [...new Set([...curve.sources, ...cold.sources, ...hot.sources])],
    range: { axis: 'temperature', from, to },
    marks: joined(
      curve.marksAt?.(fromK) ?? NO_MARKS,
      cold.marksAt?.(fromK) ?? NO_MARKS,
      hot.marksAt?.(fromK) ?? NO_MARKS,
    ),
  };
}
