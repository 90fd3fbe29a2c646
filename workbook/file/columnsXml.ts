import { parseArea } from '../../taskpane/hosts/address';
import { attributeText } from './tagText';
import { xmlTree } from './xmlTree';

type Widths = Readonly<Record<string, number>>;
type Attributes = Readonly<Record<string, string>>;

/**
 * The `cols` element with new widths; styles and outlines of columns stay.
 *
 * @param old - the element as it stands, or `''`
 * @param part - the sheet's part, for refusals
 */
export function columnsXml(old: string, part: string, before: Widths, after: Widths): string {
  const changed = [...new Set([...Object.keys(before), ...Object.keys(after)])]
    .filter((letters) => before[letters] !== after[letters])
    .map((letters) => ({ number: (parseArea(`${letters}1`)?.left ?? -1) + 1, width: after[letters] }))
    .sort((a, b) => a.number - b.number);
  const runs: { first: number; last: number; rest: Attributes }[] = [];
  for (const node of xmlTree(old, part).children) {
    const { min, max, ...rest } = node.attributes;
    let first = Number(min);
    for (const { number } of changed) {
      if (number < first || number > Number(max)) continue;
      if (first < number) runs.push({ first, last: number - 1, rest });
      runs.push({ first: number, last: number, rest });
      first = number + 1;
    }
    if (first <= Number(max)) runs.push({ first, last: Number(max), rest });
  }
  for (const { number, width } of changed) {
    const run = runs.find(({ first, last }) => first === number && last === number);
    const others = Object.fromEntries(
      Object.entries(run?.rest ?? {}).filter(([name]) => name !== 'width' && name !== 'customWidth'),
    );
    const rest: Attributes = width === undefined ? others : { ...others, width: String(width), customWidth: '1' };
    if (run !== undefined) run.rest = rest;
    else if (width !== undefined) runs.push({ first: number, last: number, rest });
  }
  const cols = runs
    .filter(({ rest }) => Object.keys(rest).length > 0)
    .sort((a, b) => a.first - b.first)
    .map(({ first, last, rest }) => {
      const written = Object.entries(rest).map(([name, value]) => ` ${name}="${attributeText(value)}"`);
      return `<col min="${first}" max="${last}"${written.join('')}/>`;
    });
  return cols.length === 0 ? '' : `<cols>${cols.join('')}</cols>`;
}
