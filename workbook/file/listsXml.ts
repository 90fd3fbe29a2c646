import type { BookList } from '../book';
import { escapeXml } from './escapeXml';
import { readList } from './readList';
import { attributeText } from './tagText';
import { child, xmlTree } from './xmlTree';

/** What one rule may hold in its own text. Source: ECMA-376 part 1, 18.3.1.33 with the spreadsheet's limit of 255. */
const LONGEST_INLINE = 255;

/**
 * The `dataValidations` element for new lists; rules of other kinds, and lists that stay, keep their text.
 *
 * @param old - the element as it stands, or `''`
 * @param part - the sheet's part, for refusals
 * @param lists - all lists of the sheet
 */
export function listsXml(old: string, part: string, lists: readonly BookList[]): string {
  const missing = new Set(lists);
  const kept: string[] = [];
  for (const node of xmlTree(old, part).children) {
    const had = readList(node.attributes, child(node, 'formula1')?.text ?? '');
    const found = had.map((each) => [...missing].find((list) => sameRule(list, each)));
    if (found.some((list) => list === undefined)) continue;
    for (const list of found) if (list !== undefined) missing.delete(list);
    kept.push(old.slice(node.start, node.end));
  }
  const rules = [...kept, ...[...missing].map(listXml)].filter((rule) => rule !== '');
  return rules.length === 0 ? '' : `<dataValidations count="${rules.length}">${rules.join('')}</dataValidations>`;
}

const sameRule = (a: BookList, b: BookList) =>
  a.range === b.range &&
  a.source === b.source &&
  a.prompt === b.prompt &&
  (a.open ?? false) === (b.open ?? false) &&
  (a.source !== undefined || a.values.join(',') === b.values.join(','));

function listXml({ range, values, source, prompt, open }: BookList): string {
  const inline = `"${values.join(',').replace(/"/g, '""')}"`;
  // Choices too long for a rule, or with commas inside, need cells to stand in; without them no rule is better than a wrong one.
  if (source === undefined && (inline.length > LONGEST_INLINE + 2 || values.some((value) => value.includes(','))))
    return '';
  const shown = prompt === undefined ? '' : ` showInputMessage="1" prompt="${attributeText(prompt)}"`;
  const strict = open === true ? '' : ' showErrorMessage="1"';
  return (
    `<dataValidation type="list" allowBlank="1"${strict}${shown} sqref="${range}">` +
    `<formula1>${escapeXml(source ?? inline)}</formula1></dataValidation>`
  );
}
