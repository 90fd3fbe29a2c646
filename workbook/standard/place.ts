import { formatArea, parseArea } from '../../taskpane/hosts/address';
import type { Cell } from '../../taskpane/port';
import type { BookCell } from '../book';
import type { StandardStyle } from './styles';

type Cells = Record<string, BookCell>;

/** A text or number in one cell. */
export function put(cells: Cells, address: string, value: Cell, style: StandardStyle, format?: string): void {
  cells[address] = { value, style, ...(format === undefined ? {} : { format }) };
}

/** A formula in one cell; `kept` is what it shows until it is calculated. */
export function putFormula(
  cells: Cells,
  address: string,
  formula: string,
  style: StandardStyle,
  kept: Cell = null,
  format?: string,
): void {
  cells[address] = { value: kept, formula, style, ...(format === undefined ? {} : { format }) };
}

/** A formula that fills `range`: look and format stand on every cell of it. */
export function putSpill(cells: Cells, range: string, formula: string, style: StandardStyle, format: string): void {
  const area = parseArea(range);
  if (area === null) return;
  for (let at = 0; at < area.rows * area.columns; at++) {
    const top = area.top + Math.floor(at / area.columns);
    const left = area.left + (at % area.columns);
    cells[formatArea({ top, left, rows: 1, columns: 1 })] = { value: null, style, format };
  }
  const anchor = formatArea({ top: area.top, left: area.left, rows: 1, columns: 1 });
  cells[anchor] = { value: null, formula, spill: range, style, format };
}
