import type { Gap, Ladder, Rung } from '../../../../core/substance';

/** What unit conversion leaves of a transition temperature, K. */
const SAME_K = 1e-6;

/** What is stable at a temperature: a rung, or a transition with a rung on either side; nothing off the ladder. */
export interface StableAt {
  readonly rung?: Rung;
  readonly gap?: Gap;
}

/** Finds what is stable on a ladder at a temperature. */
export function stableAt(ladder: Ladder, temperatureK: number): StableAt {
  const gap = ladder.gaps.find((one) => Math.abs(one.temperatureK - temperatureK) <= SAME_K);
  if (gap !== undefined) return { gap };
  const rung = ladder.rungs.find(({ fromK, toK }) => temperatureK >= fromK && temperatureK <= toK);
  return rung === undefined ? {} : { rung };
}

/** A rung's name: `liquid`, or `solid (alpha)` where a substance has several forms. */
export function rungName({ phase, form }: Pick<Rung, 'phase' | 'form'>): string {
  return form === undefined ? phase : `${phase} (${form})`;
}
