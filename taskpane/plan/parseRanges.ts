import { Problem } from '../../core/problem';
import { formatArea, parseArea, parseReference } from '../hosts/address';
import type { Ref } from '../port';

const SEPARATORS = /[;,](?=(?:[^']*'[^']*')*[^']*$)/;

/**
 * Reads one or several ranges as a person types them: `Data!A1:B20`, or `Data!A1:A20; Data!D1:D20`.
 * A range without a sheet belongs to the sheet of the range before it, the first one to `sheet`.
 * @param text Ranges apart by semicolons or commas.
 * @param sheet The sheet in front, where one is known.
 * @returns The references in the order typed.
 * @throws Problem when a part is no range.
 * @example parseRanges("Data!A1:A3; C1:C3") // => [{ sheet: "Data", address: "A1:A3" }, { sheet: "Data", address: "C1:C3" }]
 */
export function parseRanges(text: string, sheet?: string): Ref[] {
  const refs: Ref[] = [];
  for (const part of text.split(SEPARATORS).map((piece) => piece.trim())) {
    if (part === '') continue;
    refs.push(oneRange(part, refs.at(-1)?.sheet ?? sheet));
  }
  if (refs.length === 0) throw refused(text);
  return refs;
}

function oneRange(part: string, sheet: string | undefined): Ref {
  const full = parseReference(part);
  if (full !== null) return full;
  const area = parseArea(part);
  if (area === null || sheet === undefined) throw refused(part);
  return { sheet, address: formatArea(area) };
}

function refused(received: string): Problem {
  return new Problem({
    code: 'argument',
    argument: 'range',
    allowed: 'a sheet and cells as Data!A1:B20, several apart by semicolons',
    received: received.trim() === '' ? 'nothing' : `"${received}"`,
  });
}
