import { STANDARD_ATMOSPHERE_PA } from '../core/atmosphere';
import type { Datum } from '../core/answer';
import { findChange, findPhaseOf, plainName } from '../core/catalogue/find';
import { Problem, shortNumber } from '../core/problem';
import type { Curve, Substance } from '../core/substance';
import { differenceUnit } from '../core/units/differenceUnit';
import { fromMolar } from '../core/units/fromMolar';
import { answer } from './edge/answer';
import { writerFor } from './edge/cellError';
import { constantOf, noSuchItem } from './edge/constantOf';
import { kindOption, substanceKey, textKey } from './edge/keys';
import type { CellwiseSpec } from './edge/spec';
import type { Settings } from './settings/settings';

const spec: CellwiseSpec = {
  family: 'cellwise',
  name: 'SOURCE',
  args: [
    { name: 'substance', kind: 'key' },
    { name: 'item', kind: 'key' },
  ],
  options: ['kind'],
  plan: (keys, settings) => {
    const words = sourceWords(substanceKey(keys[0]), textKey('item', keys[1]), settings);
    return { compute: () => words };
  },
};

/** Citation, valid range, uncertainty and standing of a constant, a change or a property; the substance's notes. */
function sourceWords(substance: Substance, item: string, settings: Settings): string {
  if (plainName(item) === 'notes') {
    return substance.notes.length === 0 ? `no notes on ${substance.name}` : notesOf(substance).join('; ');
  }
  const datum = constantOf(substance, item);
  if (datum !== undefined) return datumWords(datum);
  const change = changeOf(substance, item);
  if (change !== undefined) {
    const curve = substance.latent(change, kindOption(settings, substance.defaultKind(change)));
    return [
      curveWords(curve, substance, settings, substance.transitionTemperature(change)),
      ...notesOf(substance),
    ].join('; ');
  }
  const curve = propertyOf(substance, item, settings);
  if (curve !== undefined) return curveWords(curve, substance, settings);
  throw noSuchItem(substance, item, itemsOf(substance, settings));
}

/** Notes as parts of one text. */
function notesOf({ notes }: Substance): string[] {
  return notes.map((note) => note.replace(/\.$/, ''));
}

function datumWords({ source, uncertainty, unit, confirmed }: Datum): string {
  const u =
    uncertainty === undefined
      ? 'no stated uncertainty'
      : `standard uncertainty ${shortNumber(uncertainty)}${unit === '1' ? '' : ` ${unit}`} (k = 1)`;
  return `${source}; ${u}; ${confirmed ? 'confirmed' : 'unconfirmed'}`;
}

/** Judged at the transition itself where the change has one, else in the middle of the range. */
function curveWords(curve: Curve, substance: Substance, settings: Settings, transition?: number): string {
  const write = writerFor(settings)[curve.axis];
  const { from, to } = curve;
  const place = transition !== undefined && transition >= from && transition <= to ? transition : (from + to) / 2;
  const u = curve.uncertaintyAt?.(place);
  const unconfirmed = (curve.marksAt?.(place) ?? []).filter((mark) => mark.code === 'unconfirmed');
  return [
    curve.sources.filter((text) => text !== '').join('; ') || 'no source stated',
    curve.method,
    from === to ? `valid at ${write(from)} only` : `valid from ${write(from)} to ${write(to)}`,
    u === undefined
      ? 'no stated uncertainty'
      : `standard uncertainty ${spreadWords(curve, u, substance, settings)} (k = 1) at ${write(place)}`,
    unconfirmed.length === 0 ? 'confirmed' : unconfirmed.map(({ text }) => `unconfirmed: ${text}`).join('; '),
  ].join('; ');
}

/** An uncertainty in the workbook's unit; a workbook in moles has none for a material without a molar mass. */
function spreadWords({ unit }: Curve, u: number, { molarMass }: Substance, { units }: Settings): string {
  const perAmount = unit === 'Pa' || unit === 'K' ? undefined : /K\)$/.test(unit) ? units.heatCapacity : units.heat;
  if (perAmount === undefined) {
    const own = unit === 'K' ? differenceUnit(units.temperature) : units.pressure;
    return `${shortNumber(u / own.factor)} ${own.symbol.replace(/ gauge$/, '')}`;
  }
  if (!(molarMass > 0) && perAmount.basis === 'mole') return `${shortNumber(u)} ${unit}`;
  return `${shortNumber(u * fromMolar(perAmount, molarMass).scale)} ${perAmount.symbol}`;
}

/** A change by any of its words; `undefined` for a word that is none, so that it may still be a property. */
function changeOf(substance: Substance, item: string): string | undefined {
  try {
    return findChange(substance, item).change;
  } catch (thrown) {
    if (thrown instanceof Problem && thrown.data.code === 'argument') return undefined;
    throw thrown;
  }
}

const HEAT_CAPACITY = 'heat capacity';

/** A property by its words: saturation pressure and temperature, or the heat capacity of a phase or a crystal form. */
function propertyOf(substance: Substance, item: string, settings: Settings): Curve | undefined {
  const plain = plainName(item);
  if (plain === 'saturationpressure') return substance.saturationPressure('stable');
  if (plain === 'saturationtemperature') return substance.saturationTemperature('stable');
  const at = plain.lastIndexOf(plainName(HEAT_CAPACITY));
  if (at <= 0 || at + plainName(HEAT_CAPACITY).length < plain.length) return undefined;
  const words = plain.slice(0, at);
  if (words === 'idealgas') return substance.heatCapacity('gas', 'standard');
  const { phase, form } = phaseOf(substance, words) ?? {};
  if (phase === undefined) return undefined;
  const standard = kindOption(settings, undefined) === 'standard';
  return substance.heatCapacity(phase, standard ? 'standard' : STANDARD_ATMOSPHERE_PA, form);
}

function phaseOf(substance: Substance, words: string): ReturnType<typeof findPhaseOf> | undefined {
  try {
    return findPhaseOf(substance, words);
  } catch (thrown) {
    if (thrown instanceof Problem && thrown.data.code === 'argument') return undefined;
    throw thrown;
  }
}

/** Everything that this substance has an answer for. */
function itemsOf(substance: Substance, settings: Settings): string[] {
  const forms = (substance.forms ?? []).map((form) => `solid ${form}`);
  const phases = ['solid', ...forms, 'liquid', 'gas', 'ideal gas'].map((phase) => `${phase} ${HEAT_CAPACITY}`);
  const properties = ['saturation pressure', 'saturation temperature', ...phases];
  const changes = substance.changes.filter((change) =>
    has(() => substance.latent(change, substance.defaultKind(change))),
  );
  return [
    ...changes,
    ...properties.filter((property) => has(() => propertyOf(substance, property, settings))),
    ...substance.constants.map(({ item }) => item),
    'notes',
  ];
}

function has(curve: () => Curve | undefined): boolean {
  try {
    return curve() !== undefined;
  } catch (thrown) {
    if (thrown instanceof Problem) return false;
    throw thrown;
  }
}

/**
 * Where a number comes from: citation, valid range, stated uncertainty, and whether it is confirmed.
 * @customfunction SOURCE
 * @param substance Substance by name, formula or CAS number, as "water".
 * @param item A change ("vaporization"), a property ("saturation pressure", "solid alpha heat capacity"), a constant ("molar mass"), or "notes".
 * @param [settings] Latentry_units, or text as "temperature=K" or "kind=standard".
 * @param invocation The call itself.
 * @returns One text.
 */
export function source(
  substance: any[][],
  item: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [substance, item, settings, invocation]);
}
