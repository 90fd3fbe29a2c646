import { nearest } from '../nearest';
import { Problem } from '../problem';
import type { Unit } from '../units/unit';
import { unitOf } from '../units/unitOf';

/** How the coefficients of a row are meant. */
export const HOUSE_FORMS = [
  ...(['constant', 'polynomial', 'table', 'Watson', 'Antoine', 'Majer-Svoboda', 'mass fractions', 'text'] as const),
] as const;
export type FormWord = (typeof HOUSE_FORMS)[number];

export interface ReadForm {
  readonly word: FormWord | undefined;
  /** Unit of the temperatures among the coefficients, where the cell says it: `polynomial in degC`. */
  readonly temperature: Unit | undefined;
}

const WORDS: Readonly<Record<string, FormWord>> = {
  value: 'constant',
  point: 'constant',
  points: 'table',
  majersvoboda: 'Majer-Svoboda',
  massfraction: 'mass fractions',
  massfractions: 'mass fractions',
  composition: 'mass fractions',
  choiokos: 'mass fractions',
};

/**
 * Reads a form cell: one of `HOUSE_FORMS`, and perhaps the unit of its temperatures; a blank leaves it to the property.
 *
 * @param text the cell
 * @param allowed the forms that the property can have
 * @throws Problem `argument` for another word, with the nearest
 */
export function readForm(text: string, allowed: readonly FormWord[]): ReadForm {
  const [, said = '', unitText] = /^(.*?)(?:\s+in\s+(\S+))?$/i.exec(text.trim()) ?? [];
  const temperature = unitText === undefined ? undefined : unitOf(unitText, 'temperature', 'form');
  if (said === '') return { word: undefined, temperature };
  const plain = said.toLowerCase().replace(/[^a-z]+/g, '');
  const word = HOUSE_FORMS.find((form) => form.toLowerCase().replace(/[^a-z]+/g, '') === plain) ?? WORDS[plain];
  if (word !== undefined && allowed.includes(word)) return { word, temperature };
  const close = word === undefined ? nearest(said, allowed) : undefined;
  throw new Problem({
    code: 'argument',
    argument: 'form',
    allowed: allowed.join(', '),
    received: `"${said}"`,
    ...(close === undefined ? {} : { nearest: close }),
  });
}
