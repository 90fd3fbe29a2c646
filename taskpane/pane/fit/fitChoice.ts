import type { LatentKind } from '../../../core/answer';
import { currentRegistry } from '../../../functions/house/currentRegistry';
import type { FoundColumns } from '../../plan/findColumns';

/** What the person has said about their data; an empty text leaves a thing to the data or the settings. */
export interface FitChoice {
  /** Places in the columns found. */
  readonly temperature: number | undefined;
  readonly latent: number | undefined;
  readonly temperatureUnit: string;
  readonly latentUnit: string;
  readonly substance: string;
  readonly change: string;
  readonly kind: LatentKind;
  /** A number in the temperature unit of the data, or a temperature with its unit. */
  readonly reference: string;
}

export const FIRST_CHOICE: FitChoice = {
  temperature: undefined,
  latent: undefined,
  temperatureUnit: '',
  latentUnit: '',
  substance: '',
  change: 'vaporization',
  kind: 'coexistence',
  reference: '',
};

/** The choice for newly read data: columns as found, units as the headers say, the rest kept. */
export function choiceFor({ parts }: FoundColumns, before: FitChoice): FitChoice {
  return { ...before, temperature: parts.temperature, latent: parts.latent, temperatureUnit: '', latentUnit: '' };
}

/** Another change of phase, with the kind that its latent heats usually are. */
export function withChange(choice: FitChoice, wanted: string): FitChoice {
  const substance = currentRegistry().entry(choice.substance)?.make();
  if (substance === undefined || substance.changes.length === 0) return { ...choice, change: wanted };
  const change = substance.changes.includes(wanted) ? wanted : (substance.changes[0] ?? wanted);
  return { ...choice, change, kind: substance.defaultKind(change) };
}
