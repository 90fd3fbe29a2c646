import { plainWords } from '../../../../core/problem';
import type { Quantity } from './quantity';

/** Leaves out a line that lacks the very piece that the line before it lacks. */
export function withoutEchoes(quantities: readonly Quantity[]): Quantity[] {
  let before = '';
  return quantities.filter(({ fact }) => {
    const words = fact.problem === undefined ? '' : plainWords(fact.problem);
    const echo = words !== '' && words === before;
    before = words;
    return !echo;
  });
}
