import type { Mark } from '../answer';

export const NO_MARKS: readonly Mark[] = [];

export const IDEAL_GAS: readonly Mark[] = [
  { code: 'ideal-gas', text: 'the heat capacity of the vapour is that of the ideal gas' },
];

/** Joined without repeats of the same text. */
export function joined(...lists: readonly (readonly Mark[])[]): readonly Mark[] {
  const seen = new Map(lists.flat().map((mark) => [mark.text, mark]));
  return [...seen.values()];
}
