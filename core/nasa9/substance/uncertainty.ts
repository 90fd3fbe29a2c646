import { STANDARD_ATMOSPHERE_PA } from '../../atmosphere';
import type { Change } from '../../substance';
import type { CondensedModel } from './model';

/** No published latent heat is taken to be better known than this part of it: common practice, no source. */
const LEAST_PART = 0.01;

/** The same for the enthalpy of vaporization behind a boiling temperature: common practice, no source. */
const LEAST_VAPOUR_PART = 0.002;

/** Why the uncertainty is what it is, for the method of an answer. */
export const SPREAD_WORDS =
  'uncertainty: the largest difference from other published values, at least 1 %; the data set states none';
export const BOILING_WORDS =
  'uncertainty: from the computed against the published boiling temperature, at least 0.2 %; the data set states none';

/** Standard uncertainty of a latent heat of fusion or of a solid-solid change, J/mol; only where other values are known. */
export function spreadOf({ record }: CondensedModel, change: Change, value: number): number | undefined {
  const published = record.published?.[change];
  if (published === undefined || published.length === 0) return undefined;
  return published.reduce(
    (worst, [kilojoules]) => Math.max(worst, Math.abs(1000 * kilojoules - value)),
    LEAST_PART * Math.abs(value),
  );
}

/** The computed boiling temperature at one atmosphere, K; absent where the line does not reach it. */
export function boilingK({ overLiquid, overSolid, meltingK }: CondensedModel): number | undefined {
  if (overLiquid === undefined || overLiquid.toPa < STANDARD_ATMOSPHERE_PA) return undefined;
  const t = overLiquid.temperatureK(STANDARD_ATMOSPHERE_PA);
  return meltingK !== undefined && t < meltingK && overSolid !== undefined ? undefined : t;
}

/**
 * Relative standard uncertainty of the enthalpy of vaporization. At a given entropy of vaporization ΔH = T·ΔS: a
 * boiling temperature that is off by a part has an enthalpy that is off by that part.
 */
export function vapourPart(model: CondensedModel): number | undefined {
  const printed = model.record.vapour?.boils;
  const computed = boilingK(model);
  if (printed === undefined || computed === undefined) return undefined;
  return Math.max(LEAST_VAPOUR_PART, Math.abs(computed - printed[0]) / Math.min(computed, printed[0]));
}
