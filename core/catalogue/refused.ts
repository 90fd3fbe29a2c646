import { nearest } from '../nearest';
import { Problem } from '../problem';

/** A word that is not on a list, with the list and the nearest word. */
export function refused(
  argument: string,
  received: string,
  allowed: readonly string[],
  known: readonly string[] = allowed,
  close: string | undefined = nearest(received, known),
): Problem {
  return new Problem({
    code: 'argument',
    argument,
    allowed: allowed.join(', '),
    received: `"${received}"`,
    ...(close === undefined ? {} : { nearest: close }),
  });
}
