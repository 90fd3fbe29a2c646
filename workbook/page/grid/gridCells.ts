import type { ICellData, Injector, IRange, Nullable, Worksheet } from '@univerjs/core';
import { FormulaDataModel } from '@univerjs/engine-formula';

/** One sheet's cells as they are kept, spilled values among them. */
export interface GridCells {
  at(row: number, column: number): Nullable<ICellData>;
  formula(row: number, column: number): string;
  /** The area that a cell's formula fills, where that is more than its own cell. */
  spill(row: number, column: number): IRange | undefined;
  /** The cell whose formula filled this one. */
  anchor(row: number, column: number): { readonly row: number; readonly column: number } | undefined;
  /** The last row and column that hold anything, spilled values counted; -1 where nothing does. */
  last(): { readonly row: number; readonly column: number };
  each(visit: (row: number, column: number, data: ICellData) => void): void;
}

/** The cells of a sheet of the open workbook. */
export function gridCells(injector: Injector, worksheet: Worksheet): GridCells {
  const model = injector.get(FormulaDataModel);
  const unitId = worksheet.getUnitId();
  const sheetId = worksheet.getSheetId();
  const matrix = worksheet.getCellMatrix();
  const spilled = model.getArrayFormulaCellData()[unitId]?.[sheetId];
  const ranges = model.getArrayFormulaRange()[unitId]?.[sheetId];
  const formula = (row: number, column: number) => {
    const data = matrix.getValue(row, column);
    if (!data?.f && !data?.si) return '';
    return data.f && !data.si ? data.f : (model.getFormulaStringByCell(row, column, sheetId, unitId) ?? '');
  };
  const areas: { row: number; column: number; range: IRange }[] = [];
  for (const [row, columns] of Object.entries(ranges ?? {})) {
    for (const [column, range] of Object.entries(columns as Record<string, IRange>)) {
      if (formula(Number(row), Number(column)) !== '') areas.push({ row: Number(row), column: Number(column), range });
    }
  }
  const within = (row: number, column: number) =>
    areas.find(
      ({ range }) =>
        row >= range.startRow && row <= range.endRow && column >= range.startColumn && column <= range.endColumn,
    );
  return {
    at: (row, column) => {
      const kept = matrix.getValue(row, column);
      const filled = spilled?.[row]?.[column];
      if (!filled || within(row, column) === undefined) return kept;
      return { ...kept, ...filled, f: kept?.f ?? null };
    },
    formula,
    spill: (row, column) => {
      const range = ranges?.[row]?.[column];
      const single = range === undefined || (range.startRow === range.endRow && range.startColumn === range.endColumn);
      return single ? undefined : range;
    },
    anchor: (row, column) => within(row, column),
    last: () => {
      let lastRow = -1;
      let lastColumn = -1;
      matrix.forValue((row, column, data) => {
        if (!data || (data.v == null && !data.f && !data.si && !data.p)) return;
        lastRow = Math.max(lastRow, row);
        lastColumn = Math.max(lastColumn, column);
      });
      for (const { range } of areas) {
        lastRow = Math.max(lastRow, range.endRow);
        lastColumn = Math.max(lastColumn, range.endColumn);
      }
      return { row: lastRow, column: lastColumn };
    },
    each: (visit) => {
      matrix.forValue((row, column, data) => {
        if (data) visit(row, column, data);
      });
    },
  };
}
