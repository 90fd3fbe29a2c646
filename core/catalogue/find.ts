import { nearest } from '../nearest';
import { Problem } from '../problem';
import type { Change, Phase, Substance } from '../substance';
import { water } from '../water/water';

/** Every built-in substance, in alphabetical order of its name. */
export const substances: readonly Substance[] = [water];

/** Case, spaces, hyphens and underscores do not matter in a name. */
export function plainName(text: string): string {
  return text.toLowerCase().replace(/[\s\-_]+/g, '');
}

const byName = new Map<string, Substance>();
for (const substance of substances) {
  for (const name of [substance.name, substance.formula, substance.cas, ...substance.synonyms]) {
    byName.set(plainName(name), substance);
  }
}

/** Finds a substance by name, formula, CAS number or synonym; a near miss names the nearest. */
export function findSubstance(text: string): Substance {
  const found = byName.get(plainName(text));
  if (found !== undefined) return found;
  throw refused(
    'substance',
    text,
    substances.map((s) => s.name),
    [...byName.keys()],
  );
}

/** A change as the core knows it, and −1 where the word names the opposite direction. */
export interface FoundChange {
  readonly change: Change;
  readonly sign: 1 | -1;
}

const CHANGE_WORDS: Readonly<Record<string, readonly [string, 1 | -1]>> = {
  vaporization: ['vaporization', 1],
  vaporisation: ['vaporization', 1],
  evaporation: ['vaporization', 1],
  boiling: ['vaporization', 1],
  condensation: ['vaporization', -1],
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

/** Finds a change of a substance by its name or a synonym. */
export function findChange(substance: Substance, text: string): FoundChange {
  const plain = plainName(text);
  const word = CHANGE_WORDS[plain];
  const named = substance.changes.find((change) => plainName(change) === (word?.[0] ?? plain));
  if (named !== undefined) return { change: named, sign: word?.[1] ?? 1 };
  if (word !== undefined) {
    throw new Problem({
      code: 'missing',
      subject: `${word[0]} of ${substance.name}`,
      reason: `no such transition in the catalogue; it has ${substance.changes.join(', ')}`,
    });
  }
  throw refused('change', text, substance.changes, Object.keys(CHANGE_WORDS));
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

/** A word that is not on a list, with the list and the nearest word. */
export function refused(
  argument: string,
  received: string,
  allowed: readonly string[],
  known: readonly string[] = allowed,
): Problem {
  const close = nearest(received, known);
  return new Problem({
    code: 'argument',
    argument,
    allowed: allowed.join(', '),
    received: `"${received}"`,
    ...(close === undefined ? {} : { nearest: close }),
  });
}
