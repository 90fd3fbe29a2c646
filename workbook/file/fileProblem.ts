import { Problem } from '../../core/problem';

/**
 * A refusal of a file, in the words of every other refusal: what is wrong, what is allowed, what was received.
 *
 * @param allowed - what would have been accepted
 * @param received - what the file holds instead
 * @param place - the part of the file where it stands; without it, the file as a whole
 * @example
 * fileProblem('an .xlsx workbook', 'a file that is not a zip package').message
 * // => 'file: allowed an .xlsx workbook; received a file that is not a zip package'
 */
export function fileProblem(allowed: string, received: string, place?: string): Problem {
  return new Problem({
    code: 'argument',
    argument: place === undefined ? 'file' : `file, ${place}`,
    allowed,
    received,
  });
}
