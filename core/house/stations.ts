import type { Change, Phase } from '../substance';
import { readable } from './given';
import { heatKey, usualKind, type HeatCapacityData, type HeatData, type MaterialData } from './materialData';

/** A phase that a heating path may pass, with its heat capacity where one is known. */
export interface Station {
  readonly phase: Phase;
  readonly form?: string;
  readonly cp: HeatCapacityData | undefined;
}

/** What lies between two stations; the heat is undefined where it is not known. */
export interface Crossing {
  readonly change: Change;
  readonly temperatureK: number | undefined;
  readonly heat: number | undefined;
}

export interface Chain {
  readonly stations: readonly Station[];
  readonly crossings: readonly Crossing[];
}

/** Names of the solid forms from cold to hot: `alpha-beta`, `beta-gamma` are alpha, beta, gamma. */
export function formsOf(solidChanges: readonly Change[]): readonly string[] {
  const forms: string[] = [];
  for (const change of solidChanges) {
    for (const form of change.split('-')) if (!forms.includes(form)) forms.push(form);
  }
  return forms;
}

/** Heat capacity of a solid form: its own, else that of the solid as a whole. */
export function heatCapacityOf(data: MaterialData, phase: Phase, form?: string): HeatCapacityData | undefined {
  const own = form === undefined ? undefined : readable(data.heatCapacities.get(form));
  return own ?? readable(data.heatCapacities.get(phase));
}

/** The solids and the liquid with the transitions between them, which hardly depend on pressure. */
export function condensedChain(data: MaterialData): Chain {
  const stations: Station[] = [];
  const crossings: Crossing[] = [];
  const forms = formsOf(data.solidChanges);
  const solid = forms.length > 0 || knows(data, 'solid', ['fusion', 'sublimation']) || data.pressures.has('solid');
  if (solid) {
    for (const form of forms.length > 0 ? forms : [undefined]) {
      const cp = heatCapacityOf(data, 'solid', form);
      stations.push({ phase: 'solid', cp, ...(form === undefined ? {} : { form }) });
    }
    for (const change of data.solidChanges) crossings.push(crossing(data, change));
  }
  if (!knows(data, 'liquid', ['fusion', 'vaporization']) && !data.pressures.has('liquid'))
    return { stations, crossings };
  if (solid) crossings.push(crossing(data, 'fusion'));
  stations.push({ phase: 'liquid', cp: heatCapacityOf(data, 'liquid') });
  return { stations, crossings };
}

function knows(data: MaterialData, phase: Phase, changes: readonly Change[]): boolean {
  return (
    data.heatCapacities.has(phase) ||
    changes.some((change) => data.transitions.has(change)) ||
    [...data.heats.keys()].some((key) => changes.some((change) => key.startsWith(`${change} `)))
  );
}

function crossing(data: MaterialData, change: Change): Crossing {
  const temperatureK = readable(data.transitions.get(change))?.temperatureK;
  const heat = temperatureK === undefined ? undefined : heatAt(data, change, temperatureK);
  return { change, temperatureK, heat };
}

/** The heat of a change at a place on its two-phase line, where the data reach there; J/mol. */
export function heatAt(data: MaterialData, change: Change, temperatureK: number): number | undefined {
  for (const kind of [usualKind(change), 'coexistence', 'isobaric'] as const) {
    const given = readable(data.heats.get(heatKey(change, kind)));
    if (given !== undefined && reaches(data, change, given, temperatureK)) return given.shape.at(temperatureK);
  }
  return undefined;
}

/** The heat that is given at the transition temperature only, J/mol. */
export function singleHeat(data: MaterialData, change: Change, temperatureK: number): number | undefined {
  const given = readable(data.heats.get(heatKey(change, usualKind(change))));
  return given?.single === true ? given.shape.at(temperatureK) : undefined;
}

function reaches(data: MaterialData, change: Change, given: HeatData, temperatureK: number): boolean {
  if (!given.single) return covers(given, temperatureK);
  const at = readable(data.transitions.get(change))?.temperatureK;
  return at !== undefined && Math.abs(at - temperatureK) <= SAME_K;
}

/** Temperatures that unit conversion may have set apart, K. */
export const SAME_K = 1e-6;

export function covers(range: { readonly fromK: number; readonly toK: number }, temperatureK: number): boolean {
  return temperatureK >= range.fromK - SAME_K && temperatureK <= range.toK + SAME_K;
}
