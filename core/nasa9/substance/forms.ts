import { nasa9Species } from '../nasa9Species';
import type { Nasa9Species } from '../nasa9Types';
import type { CondensedRecord } from './record';

/**
 * How far a form or a liquid is followed past the temperature at which another one becomes stable, as a part of that
 * temperature: a convention, since the data set says nothing there. The heat capacity is kept over that stretch.
 */
export const METASTABLE_PART = 0.15;

/** A liquid without vapour data and without a known end is followed to this multiple of its melting temperature. */
const LIQUID_REACH = 1.5;

/** A crystal form or the liquid, where it is stable and how far it is followed. */
export interface CondensedForm {
  readonly phase: 'solid' | 'liquid';
  /** Name of the crystal form where there are several. */
  readonly form?: string;
  readonly species: Nasa9Species;
  /** Where it is the stable one, K. */
  readonly fromK: number;
  readonly toK: number;
  /** How far it is followed, K. */
  readonly lowK: number;
  readonly highK: number;
  /** Change to the next warmer form; absent on the last. */
  readonly changeAbove?: string;
  /** True where that change is of second order: no latent heat. */
  readonly secondOrder: boolean;
}

/** Crystal forms from cold to hot and the liquid after them. */
export function formsOf(record: CondensedRecord): readonly CondensedForm[] {
  const end = record.end?.kelvin ?? Infinity;
  const solids = record.solids.map(([form, name]) => ({ phase: 'solid' as const, form, species: nasa9Species(name) }));
  const liquid =
    record.liquid === undefined ? [] : [{ phase: 'liquid' as const, form: '', species: nasa9Species(record.liquid) }];
  const all = [...solids, ...liquid];
  return all.map(({ phase, form, species }, i) => {
    const before = all[i - 1];
    const after = all[i + 1];
    const fromK = before === undefined ? species.fromK : before.species.toK;
    const reach = record.vapour === undefined && phase === 'liquid' && end === Infinity ? LIQUID_REACH * fromK : end;
    const toK = after === undefined ? Math.min(species.toK, Math.max(reach, fromK)) : species.toK;
    const changeAbove = after === undefined ? undefined : after.phase === 'liquid' ? 'fusion' : `${form}-${after.form}`;
    return {
      phase,
      ...(form === '' ? {} : { form }),
      species,
      fromK,
      toK,
      lowK: before === undefined ? fromK : fromK * (1 - METASTABLE_PART),
      highK: after === undefined ? toK : toK * (1 + METASTABLE_PART),
      ...(changeAbove === undefined ? {} : { changeAbove }),
      secondOrder: record.lambdaPoints?.some(({ name }) => name === changeAbove) ?? false,
    };
  });
}
