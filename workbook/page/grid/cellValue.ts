import { CellValueType, type ICellData, type Nullable } from '@univerjs/core';
import type { Cell, CellErrorCode } from '../../../taskpane/port';

const ERROR = /^#(?:VALUE!|N\/A|REF!|NAME\?|NUM!|DIV\/0!|NULL!|SPILL!|CALC!|BUSY!)$/;

/** Text that would be read as something else if it were typed. */
const AMBIGUOUS = /^\s*[=+\-.'(%$\d]|^\s*(?:true|false)\s*$/i;

/** What a cell of the grid holds; a formula's empty text is a text, an empty cell is null. */
export function cellValue(data: Nullable<ICellData>): Cell {
  if (!data) return null;
  const { v: value, p: rich } = data;
  if (value === undefined || value === null) {
    const text = rich?.body?.dataStream.replace(/\r?\n?$/, '').replaceAll('\r', '\n') ?? '';
    return text === '' ? null : text;
  }
  if (data.t === CellValueType.BOOLEAN) return value === 1 || value === true || value === '1';
  if (typeof value !== 'string') return value;
  if (value === '') return data.f || data.si ? '' : null;
  if (ERROR.test(value) && data.t !== CellValueType.FORCE_STRING) return { error: value as CellErrorCode };
  return value;
}

/** The content of a cell for the grid; whatever stood there before goes. */
export function gridCell(content: Cell | { readonly formula: string }): ICellData {
  const empty: ICellData = { v: null, t: null, f: null, si: null, p: null };
  switch (typeof content) {
    case 'number':
      return { ...empty, v: content, t: CellValueType.NUMBER };
    case 'boolean':
      return { ...empty, v: content ? 1 : 0, t: CellValueType.BOOLEAN };
    case 'string':
      return { ...empty, v: content, t: AMBIGUOUS.test(content) ? CellValueType.FORCE_STRING : CellValueType.STRING };
    default:
      if (content === null) return empty;
      return 'formula' in content
        ? { ...empty, f: content.formula }
        : { ...empty, v: content.error, t: CellValueType.STRING };
  }
}
