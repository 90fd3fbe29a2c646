import type { HouseColumn } from '../../../../core/house/houseRow';
import { parseNumber, type Decimal } from '../../../../core/units/parseNumber';
import { plainText } from '../../../../core/units/plainText';
import type { SubstanceRow } from '../../../plan/planSubstance';

/** The texts of the form, a field a column. */
export type RowDraft = Readonly<Record<HouseColumn, string>>;

export const EMPTY_DRAFT: RowDraft = {
  substance: '',
  property: '',
  form: '',
  coefficients: '',
  unit: '',
  'valid from': '',
  'valid to': '',
  source: '',
  revision: '',
};

/** Columns whose cell is a number where its text is nothing but one. */
const NUMBERS: readonly HouseColumn[] = ['coefficients', 'valid from', 'valid to'];

/** The row that the sheet gets: plain numbers as numbers, blanks left out, all else as typed. */
export function draftRow(draft: RowDraft, decimal: Decimal): SubstanceRow {
  const cells = Object.entries(draft).flatMap(([column, typed]) => {
    const text = typed.trim();
    if (text === '') return [];
    const number = NUMBERS.includes(column as HouseColumn) ? parseNumber(plainText(text), decimal) : undefined;
    return [[column, number?.value !== undefined && number.rest === '' ? number.value : text] as const];
  });
  return Object.fromEntries(cells);
}
