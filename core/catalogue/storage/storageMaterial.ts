import { STANDARD_ATMOSPHERE_PA } from '../../atmosphere';
import type { Datum, Mark } from '../../answer';
import { makeMaterial } from '../../house/makeMaterial';
import { heatKey, type HeatCapacityData, type HeatData } from '../../house/materialData';
import { monotoneTable } from '../../house/monotoneTable';
import { polynomialShape } from '../../house/polynomialShape';
import type { Substance } from '../../substance';
import { STORAGE_CP_SOURCE, STORAGE_SOURCES, type StorageRecord } from './materials';

/** Shares of the value, k = 1: independent handbooks differ by up to 3 % for pure organics, reviews of hydrates by 5 to 15 %. */
const PUBLISHED_SHARE = 0.02;
const REMEMBERED_SHARE = 0.05;
const REMEMBERED_CP_SHARE = 0.1;
const CP_SHARE = 0.01;
/** Melting temperatures of technical purity, K: handbooks agree within 0.5 K, reviews within about 2 K. */
const MELTING_K = 0.3;
const REMEMBERED_MELTING_K = 1;

const FROM_MEMORY: readonly Mark[] = [{ code: 'unconfirmed', text: 'from memory, not confirmed in a document' }];
const NO_MARKS: readonly Mark[] = [];

/** Whether a figure was read in a document or in one that quotes it. */
function isConfirmed(source: number): boolean {
  return source <= 2;
}

function sourceText(source: number): string {
  return STORAGE_SOURCES[source] ?? '';
}

/** A heat-storage material as a substance: it melts, and what else is known of it. */
export function storageMaterial(record: StorageRecord): Substance {
  const { name, formula, cas, synonyms, mass, melts, note } = record;
  const molarMass = mass / 1000;
  const heatCapacities = new Map<string, HeatCapacityData>();
  const { solidCp, liquidCp, liquid, liquidShare } = record;
  if (solidCp !== undefined) heatCapacities.set('solid', oneValue(solidCp, molarMass));
  if (liquidCp !== undefined) heatCapacities.set('liquid', oneValue(liquidCp, molarMass));
  if (liquid !== undefined) heatCapacities.set('liquid', points(liquid, liquidShare ?? CP_SHARE));
  const known = isConfirmed(record.source);
  return makeMaterial({
    name,
    formula,
    cas,
    synonyms: synonyms?.split(';') ?? [],
    group: 'storage material',
    molarMass,
    notes: notesOf(record, note, known),
    constants: constantsOf(record, known),
    solidChanges: [],
    heats: new Map([[heatKey('fusion', 'isobaric'), fusion(record, molarMass, known)]]),
    transitions: new Map([['fusion', { temperatureK: melts, pressurePa: STANDARD_ATMOSPHERE_PA }]]),
    heatCapacities,
    pressures: new Map(),
    lack: () => 'not in the catalogue',
  });
}

function notesOf({ others }: StorageRecord, note: string | undefined, known: boolean): string[] {
  const notes = note === undefined ? [] : [note];
  if (!known) notes.push('figures from memory: confirm them before use in a product');
  if (others !== undefined) notes.push('published heats of fusion differ: half their difference counts as uncertainty');
  return notes;
}

function constantsOf({ mass, melts, source }: StorageRecord, confirmed: boolean): readonly Datum[] {
  const text = sourceText(source);
  return [
    {
      item: 'molar mass',
      value: mass / 1000,
      unit: 'kg/mol',
      source: 'sum of standard atomic weights',
      confirmed: true,
    },
    {
      item: 'melting temperature',
      value: melts,
      unit: 'K',
      uncertainty: confirmed ? MELTING_K : REMEMBERED_MELTING_K,
      source: text,
      confirmed,
    },
  ];
}

function fusion({ molar, perKg, others, source }: StorageRecord, molarMass: number, known: boolean): HeatData {
  const value = molar ?? perKg ?? NaN;
  const spread = Math.max(0, ...(others ?? []).map((other) => Math.abs(other - value) / 2 / value));
  const joulePerMole = molar === undefined ? value * 1000 * molarMass : value * 1000;
  return {
    shape: polynomialShape([joulePerMole], 0),
    single: true,
    fromK: NaN,
    toK: NaN,
    method: 'published heat of fusion at the melting temperature',
    sources: [sourceText(source)],
    marks: known ? NO_MARKS : FROM_MEMORY,
    relativeUncertainty: Math.max(known ? PUBLISHED_SHARE : REMEMBERED_SHARE, spread),
  };
}

function points(text: string, share: number): HeatCapacityData {
  const pairs = text.split(' ').map((pair) => pair.split(':').map(Number) as [number, number]);
  const temperatures = pairs.map(([t]) => t);
  return {
    shape: monotoneTable(
      temperatures,
      pairs.map(([, cp]) => cp),
    ),
    fromK: temperatures[0] ?? NaN,
    toK: temperatures.at(-1) ?? NaN,
    method: 'monotone interpolation between point values',
    sources: [STORAGE_CP_SOURCE],
    marks: NO_MARKS,
    relativeUncertainty: share,
  };
}

function oneValue(
  [value, fromK, toK, source]: readonly [number, number, number, number],
  molarMass: number,
): HeatCapacityData {
  return {
    shape: polynomialShape([value * 1000 * molarMass], 0),
    fromK,
    toK,
    method: 'one value, used near the temperature it was published for',
    sources: [sourceText(source)],
    marks: isConfirmed(source) ? NO_MARKS : FROM_MEMORY,
    relativeUncertainty: REMEMBERED_CP_SHARE,
  };
}
