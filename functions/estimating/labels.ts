import { plainName } from '../../core/catalogue/find';
import { COMPOSITION_PARTS } from '../../core/estimate/compositionHeatCapacity';
import type { QuantityKind } from '../../core/units/unit';

/** What a row of the inputs can be: a quantity of a kind, or words. */
export type InputKind = QuantityKind | 'text';

/** Labels of the inputs by trade words, what each holds, and other words for it. */
const LABELS: readonly (readonly [label: string, kind: InputKind, ...others: string[]])[] = [
  ['boiling temperature', 'temperature', 'boiling point', 'normal boiling temperature', 'normal boiling point'],
  ['critical temperature', 'temperature'],
  ['critical pressure', 'pressure'],
  ['acentric factor', 'share'],
  ['latent heat', 'heat'],
  ['at temperature', 'temperature', 'at'],
  ['temperature', 'temperature', 'to temperature', 'to'],
  ['liquid heat capacity', 'heatCapacity'],
  ['solid heat capacity', 'heatCapacity', 'crystal heat capacity'],
  ['molar mass', 'molarMass', 'molecular mass'],
  ['trouton constant', 'heatCapacity'],
  ['exponent', 'share'],
  ['association factor', 'share'],
  ['formula', 'text'],
  ['substance', 'text'],
  ...COMPOSITION_PARTS.map((part) => [part, 'share'] as const),
  ['fibre', 'share', 'fiber'],
];

export interface Label {
  readonly label: string;
  readonly kind: InputKind;
}

const BY_WORD = new Map<string, Label>(
  LABELS.flatMap(([label, kind, ...others]) =>
    [label, ...others].map((word) => [plainName(word), { label, kind }] as const),
  ),
);

/** Rows that name a constituent: `amount of iron`, `heat capacity of iron`. */
const CONSTITUENT = /^(amount|heat capacity) of (.+)$/i;

/** What a label means; `undefined` where it is none. */
export function labelOf(text: string): Label | undefined {
  const known = BY_WORD.get(plainName(text));
  if (known !== undefined) return known;
  const [, property, name = ''] = CONSTITUENT.exec(text.trim()) ?? [];
  if (property === undefined) return undefined;
  const amount = property.toLowerCase() === 'amount';
  return { label: `${property.toLowerCase()} of ${name.toLowerCase()}`, kind: amount ? 'share' : 'heatCapacity' };
}

/** Every label, for messages. */
export const labelWords: readonly string[] = [
  ...new Set(LABELS.map(([label]) => label)),
  'amount of …',
  'heat capacity of …',
];
