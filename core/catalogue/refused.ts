import { nearest } from '../nearest';
import { Problem } from '../problem';

/** This many letters at least make the beginning of a word. */
const BEGINNING = 3;

/** The one word that begins with what was written, as "evap" begins evaporation. */
function begunBy(received: string, known: readonly string[]): string | undefined {
  const written = received.trim().toLowerCase();
  if (written.length < BEGINNING) return undefined;
  const begun = known.filter((word) => word.toLowerCase().startsWith(written));
  return begun.length === 1 ? begun[0] : undefined;
}

/** A word that is not on a list, with the list and the nearest word. */
export function refused(
  argument: string,
  received: string,
  allowed: readonly string[],
  known: readonly string[] = allowed,
  close: string | undefined = begunBy(received, known) ?? nearest(received, known),
): Problem {
  return new Problem({
    code: 'argument',
    argument,
    allowed: allowed.join(', '),
    received: `"${received}"`,
    ...(close === undefined ? {} : { nearest: close }),
  });
}
