import type { BookCell } from '../book';
import { escapeXml } from './escapeXml';
import { maySpill, toFileFormula } from './formulaText';

/** Errors that the format stores by another name: the newer ones stand there as `#VALUE!` with extra data. */
const STORED_ERRORS: Readonly<Record<string, string>> = { '#SPILL!': '#VALUE!', '#CALC!': '#VALUE!', '#BUSY!': '#N/A' };

/**
 * One cell as the file stores it. A formula that may spill is stored as a spilling array, even over one cell, as the
 * spreadsheet itself does.
 *
 * @param address - `B5`
 * @param cell - undefined for a cell that was emptied
 * @param style - its `s` number
 * @param spill - gives the `cm` number of spilling formulas
 */
export function cellXml(address: string, cell: BookCell | undefined, style: number, spill: () => string): string {
  const s = style === 0 ? '' : ` s="${style}"`;
  if (cell === undefined) return `<c r="${address}"${s}/>`;
  const { value, formula } = cell;
  if (formula === undefined) return valueXml(address, s, value);
  const spills = cell.spill !== undefined || (cell.array === undefined && maySpill(formula));
  const range = cell.spill ?? cell.array ?? address;
  const array = spills || cell.array !== undefined ? ` t="array" ref="${range}"` : '';
  const f = `<f${array}>${escapeXml(toFileFormula(formula))}</f>`;
  const head = `<c r="${address}"${s}${spills ? ` cm="${spill()}"` : ''}`;
  if (value === null) return `${head}>${f}</c>`;
  if (typeof value === 'number') return `${head}>${f}<v>${value}</v></c>`;
  if (typeof value === 'boolean') return `${head} t="b">${f}<v>${value ? 1 : 0}</v></c>`;
  if (typeof value === 'string') return `${head} t="str">${f}<v>${escapeXml(value)}</v></c>`;
  return `${head} t="e">${f}<v>${STORED_ERRORS[value.error] ?? value.error}</v></c>`;
}

function valueXml(address: string, s: string, value: BookCell['value']): string {
  const head = `<c r="${address}"${s}`;
  if (value === null) return `${head}/>`;
  if (typeof value === 'number') return `${head}><v>${value}</v></c>`;
  if (typeof value === 'boolean') return `${head} t="b"><v>${value ? 1 : 0}</v></c>`;
  if (typeof value === 'string')
    return `${head} t="inlineStr"><is><t xml:space="preserve">${escapeXml(value)}</t></is></c>`;
  return `${head} t="e"><v>${STORED_ERRORS[value.error] ?? value.error}</v></c>`;
}

/** Whether two cells would be stored alike; the words of an error are not stored. */
export function sameCell(a: BookCell | undefined, b: BookCell | undefined): boolean {
  if (a === b) return true;
  if (a === undefined || b === undefined) return false;
  const sameValue =
    a.value === b.value ||
    (typeof a.value === 'object' && typeof b.value === 'object' && a.value?.error === b.value?.error);
  return (
    sameValue &&
    a.formula === b.formula &&
    a.spill === b.spill &&
    a.array === b.array &&
    a.style === b.style &&
    a.format === b.format
  );
}
