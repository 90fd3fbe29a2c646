import { findChange, findPhaseOf, refused, type FoundChange, type FoundPhase } from '../../core/catalogue/find';
import type { LatentKind } from '../../core/answer';
import { Problem } from '../../core/problem';
import { parseQuantity } from '../../core/units/parseQuantity';
import type { Substance, Surface } from '../../core/substance';
import { currentRegistry } from '../house/currentRegistry';
import type { Settings } from '../settings/settings';
import type { Key } from './spec';

/** A key that must be a text. */
export function textKey(argument: string, key: Key): string {
  if (typeof key === 'string') return key;
  throw new Problem({
    code: 'argument',
    argument,
    allowed: 'a text',
    received: key === undefined ? 'nothing' : String(key),
  });
}

export function substanceKey(key: Key): Substance {
  return currentRegistry().find(textKey('substance', key));
}

export function changeKey(substance: Substance, key: Key): FoundChange {
  return findChange(substance, textKey('change', key));
}

export function phaseKey(substance: Substance, key: Key): FoundPhase {
  return findPhaseOf(substance, textKey('phase', key));
}

/** An option that takes one word of a list. */
export function wordOption<Word extends string, Fallback extends Word | undefined>(
  settings: Settings,
  option: string,
  words: readonly Word[],
  fallback: Fallback,
): Word | Fallback {
  const asked = settings.options[option];
  if (asked === undefined) return fallback;
  const word = words.find((w) => w === asked.trim().toLowerCase());
  if (word !== undefined) return word;
  throw refused(option, asked, words);
}

const KINDS = ['coexistence', 'isobaric', 'standard'] as const;

/** `kind=`, or the kind that holds without it. */
export function kindOption<Fallback extends LatentKind | undefined>(
  settings: Settings,
  fallback: Fallback,
): LatentKind | Fallback {
  return wordOption(settings, 'kind', KINDS, fallback);
}

/** `at_pressure=saturation`: the isobaric kind at the pressure of the two-phase line. */
export function onSaturation(settings: Settings, kind: LatentKind): boolean {
  return kind === 'isobaric' && settings.options['at_pressure']?.trim().toLowerCase() === 'saturation';
}

/** `at_pressure=`, in Pa; it belongs to the isobaric kind only. */
export function pressureOption(settings: Settings, kind: LatentKind): number | undefined {
  const text = settings.options['at_pressure'];
  if (text === undefined) return undefined;
  if (kind !== 'isobaric') {
    throw new Problem({
      code: 'argument',
      argument: 'at_pressure',
      allowed: 'with kind=isobaric only',
      received: `kind=${kind}`,
    });
  }
  return parseQuantity(text, 'pressure', settings, 'at_pressure').si;
}

const SURFACES = ['stable', 'ice', 'solid', 'liquid'] as const;

/** `surface=`: the phase below the vapour; the stable one unless forced. */
export function surfaceOption(settings: Settings): Surface {
  const word = wordOption(settings, 'surface', SURFACES, 'stable');
  return word === 'solid' ? 'ice' : word;
}
