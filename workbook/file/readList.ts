import type { BookList } from '../book';
import { unescapeText } from './escapeXml';

/**
 * Reads a rule that offers choices; rules of other kinds give nothing. Choices that stand in cells are filled in by
 * `resolveLists` when all sheets are read.
 *
 * @param attributes - of the `dataValidation` element
 * @param formula - its `formula1`
 */
export function readList(attributes: Readonly<Record<string, string>>, formula: string): BookList[] {
  if (attributes['type'] !== 'list' || attributes['sqref'] === undefined) return [];
  const text = unescapeText(formula).trim();
  const inline = /^"([^]*)"$/.exec(text)?.[1];
  const prompt = attributes['prompt'] === undefined ? {} : { prompt: unescapeText(attributes['prompt']) };
  const strict = attributes['showErrorMessage'] === '1' || attributes['showErrorMessage'] === 'true';
  const open = strict ? {} : { open: true };
  const choices =
    inline === undefined
      ? { values: [], source: text }
      : {
          values: inline
            .replace(/""/g, '"')
            .split(',')
            .map((each) => each.trim()),
        };
  return attributes['sqref'].split(/\s+/).map((range) => ({ range, ...choices, ...prompt, ...open }));
}
