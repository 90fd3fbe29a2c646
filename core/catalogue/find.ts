import { nearest } from '../nearest';
import { Problem } from '../problem';
import type { Change, Phase, Substance } from '../substance';
import { entries } from './entries';
import { plainName } from './plainName';
import { refused } from './refused';
import { makeRegistry, type Registry } from './registry';

export { plainName, refused };

/** The built-in substances by every name they have. */
export const catalogue: Registry = makeRegistry(entries);

/** Finds a built-in substance by name, formula, CAS number or synonym; a near miss names the nearest. */
export function findSubstance(text: string): Substance {
  return catalogue.find(text);
}

/** A change as the core knows it, and −1 where the word names the opposite direction. */
export interface FoundChange {
  readonly change: Change;
  readonly sign: 1 | -1;
}

const CHANGE_WORDS: Readonly<Record<string, readonly [string, 1 | -1]>> = {
  vaporization: ['vaporization', 1],
  vaporisation: ['vaporization', 1],
  vapourization: ['vaporization', 1],
  vapourisation: ['vaporization', 1],
  evaporation: ['vaporization', 1],
  boiling: ['vaporization', 1],
  condensation: ['vaporization', -1],
  condensing: ['vaporization', -1],
  fusion: ['fusion', 1],
  melting: ['fusion', 1],
  freezing: ['fusion', -1],
  solidification: ['fusion', -1],
  crystallization: ['fusion', -1],
  crystallisation: ['fusion', -1],
  sublimation: ['sublimation', 1],
  deposition: ['sublimation', -1],
  desublimation: ['sublimation', -1],
};

/** The words of `CHANGE_WORDS`, for autocomplete lists. */
export const changeWords: readonly string[] = [
  'vaporization',
  'fusion',
  'sublimation',
  'condensation',
  'freezing',
  'deposition',
];

/**
 * Finds a change of a substance by its name or a synonym. A solid-solid change has the names of its two forms, cold
 * first: `alpha-gamma`; the other way round, `gamma-alpha`, is its opposite direction.
 *
 * @throws Problem `missing` for a change that this substance does not have and for a lambda point, `argument` for an
 * unknown word
 */
export function findChange(substance: Substance, text: string): FoundChange {
  const asked = hyphened(text);
  const plain = plainName(asked);
  const word = CHANGE_WORDS[plain];
  const { changes } = substance;
  // with its hyphen first: II-I and I-II differ by nothing else
  const exact = changes.find((change) => plainParts(change) === plainParts(asked));
  if (exact !== undefined) return { change: exact, sign: 1 };
  const turned = changes.find((change) => plainParts(reversed(change)) === plainParts(asked));
  if (turned !== undefined) return { change: turned, sign: -1 };
  const named = changes.find((change) => plainName(change) === (word?.[0] ?? plain) && !eitherWay(change));
  if (named !== undefined) return { change: named, sign: word?.[1] ?? 1 };
  const back = changes.find((change) => plainName(reversed(change)) === plain && !eitherWay(change));
  if (back !== undefined) return { change: back, sign: -1 };
  const begun = changes.filter((change) => begins(change, asked));
  if (begun.length === 1 && begun[0] !== undefined) return { change: begun[0], sign: 1 };
  const lambda = substance.lambdaPoints?.find(({ name }) => plainName(name) === plain);
  if (lambda !== undefined) {
    throw new Problem({
      code: 'missing',
      subject: `${lambda.name} of ${substance.name} at ${lambda.temperatureK} K`,
      reason: 'a second-order change: the heat capacity peaks there and there is no latent heat',
    });
  }
  if (word !== undefined) {
    // a team's own substance names the row that would say it
    if (substance.group === 'house') substance.defaultKind(word[0]);
    throw new Problem({
      code: 'missing',
      subject: `${word[0]} of ${substance.name}`,
      reason: `no such transition in the catalogue; it has ${listed(substance.changes)}`,
    });
  }
  throw refused('change', text, substance.changes, [...substance.changes, ...Object.keys(CHANGE_WORDS)]);
}

const GREEK: Readonly<Record<string, string>> = { α: 'alpha', β: 'beta', γ: 'gamma', δ: 'delta' };

/** A solid-solid change with Greek letters, an arrow or "to" between its forms, as its name has them: `alpha-gamma`. */
function hyphened(text: string): string {
  return text.replace(/[α-δ]/g, (letter) => GREEK[letter] ?? letter).replace(/\s*(?:→|->|[–—−]|\sto\s)\s*/g, '-');
}

/** True where both forms begin as written: `alpha-beta` for `alpha quartz-beta quartz`. A numeral is no beginning. */
function begins(change: Change, asked: string): boolean {
  const forms = change.split('-').map(plainName);
  const parts = asked.split('-').map(plainName);
  return (
    forms.length === 2 &&
    parts.length === 2 &&
    forms.every((form, i) => (parts[i] ?? '').length > 3 && form.startsWith(parts[i] ?? ''))
  );
}

function reversed(change: Change): string {
  const at = change.indexOf('-');
  return at < 0 ? '' : `${change.slice(at + 1)}-${change.slice(0, at)}`;
}

/** A name without regard to case and spaces, its hyphens kept. */
function plainParts(text: string): string {
  return text.split('-').map(plainName).join('-');
}

/** True where a name reads the same both ways once its hyphen is gone, as III-II does. */
function eitherWay(change: Change): boolean {
  return change.includes('-') && plainName(change) === plainName(reversed(change));
}

function listed(words: readonly string[]): string {
  return words.length === 0 ? 'none' : words.join(', ');
}

const PHASE_WORDS: Readonly<Record<string, Phase>> = {
  solid: 'solid',
  ice: 'solid',
  liquid: 'liquid',
  gas: 'gas',
  vapor: 'gas',
  vapour: 'gas',
  steam: 'gas',
};

/** Finds a phase by its name or a synonym. */
export function findPhase(text: string): Phase {
  const phase = PHASE_WORDS[plainName(text)];
  if (phase !== undefined) return phase;
  throw refused('phase', text, ['solid', 'liquid', 'gas'], Object.keys(PHASE_WORDS));
}

/** A phase, and one crystal form of the solid where it is named. */
export interface FoundPhase {
  readonly phase: Phase;
  readonly form?: string;
}

/** Finds a phase, or a crystal form of a substance by its name (`gamma`, `solid gamma`). */
export function findPhaseOf(substance: Substance, text: string): FoundPhase {
  const plain = plainName(text);
  const phase = PHASE_WORDS[plain];
  if (phase !== undefined) return { phase };
  const forms = substance.forms ?? [];
  const form = forms.find((name) => plainName(name) === plain || `solid${plainName(name)}` === plain);
  if (form !== undefined) return { phase: 'solid', form };
  const allowed = ['solid', 'liquid', 'gas', ...forms];
  throw refused('phase', text, allowed, [...Object.keys(PHASE_WORDS), ...forms], nearest(text, allowed));
}
