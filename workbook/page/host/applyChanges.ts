import {
  BooleanNumber,
  type IAccessor,
  type ICellData,
  type IMutationInfo,
  type IStyleData,
  mergeWorksheetSnapshotWithDefault,
} from '@univerjs/core';
import { IDefinedNamesService, RemoveDefinedNameMutation, SetDefinedNameMutation } from '@univerjs/engine-formula';
import {
  InsertSheetMutation,
  RemoveSheetMutation,
  SetRangeValuesMutation,
  SetRangeValuesUndoMutationFactory,
  SetWorksheetActiveOperation,
  SetWorksheetColumnCountMutation,
  SetWorksheetRowCountMutation,
} from '@univerjs/sheets';
import { type Area, formatReference, formatArea } from '../../../taskpane/hosts/address';
import { FORMATS } from '../../../taskpane/hosts/excel/formats';
import type { CellFormat, Change, Ref } from '../../../taskpane/port';
import { gridCell } from '../grid/cellValue';
import type { Grid } from '../grid/openGrid';
import { placeOf } from './place';
import { runStep, type Step } from './step';

type Cells = Record<number, Record<number, ICellData>>;

/** Makes changes that `obstacles` found possible, as one step. */
export function applyChanges(grid: Grid, changes: readonly Change[]): void {
  runStep(grid, (step) => {
    for (const change of changes) {
      if (change.kind === 'sheet') addSheet(grid, step, change.name);
      else if (change.kind === 'name') setName(grid, step, change.name, change.ref);
      else if (change.kind === 'note') writeCells(grid, step, change.ref, () => note(change.text));
      else writeCells(grid, step, change.ref, (row, column) => content(change, row, column));
    }
  });
}

function addSheet(grid: Grid, step: Step, name: string): void {
  if (grid.sheet(name) !== undefined) return;
  const unitId = grid.workbook().getId();
  const id = crypto.randomUUID();
  const sheet = mergeWorksheetSnapshotWithDefault({ id, name, rowCount: 400, columnCount: 26 });
  const index = grid.workbook().getSheets().length;
  const active = grid.workbook().getActiveSheet().getSheetId();
  step.run(
    { id: InsertSheetMutation.id, params: { unitId, index, sheet } },
    { id: RemoveSheetMutation.id, params: { unitId, subUnitId: id, subUnitName: name } },
  );
  // Undone, the sheet may be the one in view, and the grid can't show a sheet that is gone.
  step.run(
    { id: SetWorksheetActiveOperation.id, params: { unitId, subUnitId: active } },
    { id: SetWorksheetActiveOperation.id, params: { unitId, subUnitId: active } },
  );
}

function setName(grid: Grid, step: Step, name: string, ref: Ref): void {
  const unitId = grid.workbook().getId();
  const known = Object.values(grid.injector.get(IDefinedNamesService).getDefinedNameMap(unitId) ?? {}).find(
    (entry) => entry.name.toLowerCase() === name.toLowerCase(),
  );
  const { sheet, area } = placeOf(grid, ref);
  const formulaOrRefString = formatReference({ sheet: sheet.getSheetName(), address: absolute(area) });
  const id = known?.id ?? crypto.randomUUID();
  const params = { unitId, id, name: known?.name ?? name, formulaOrRefString, localSheetId: 'AllDefaultWorkbook' };
  const undo: IMutationInfo =
    known === undefined
      ? { id: RemoveDefinedNameMutation.id, params }
      : { id: SetDefinedNameMutation.id, params: { ...known, unitId } };
  step.run({ id: SetDefinedNameMutation.id, params }, undo);
}

function absolute(area: Area): string {
  return formatArea(area).replace(/[A-Z]+|\d+/g, (part) => `$${part}`);
}

function note(text: string): ICellData {
  return { custom: text === '' ? null : { note: text } };
}

function content(change: Extract<Change, { kind: 'cells' }>, row: number, column: number): ICellData | null {
  const formula = change.formulas?.[row]?.[column] ?? '';
  const value = change.values?.[row]?.[column];
  const cell = formula !== '' ? gridCell({ formula }) : value === undefined ? null : gridCell(value);
  if (change.format === undefined) return cell;
  return { ...cell, s: look(change.format) };
}

function look(format: CellFormat): IStyleData {
  const { bold, italic, color, fill } = FORMATS[format];
  return {
    bl: bold ? BooleanNumber.TRUE : BooleanNumber.FALSE,
    it: italic ? BooleanNumber.TRUE : BooleanNumber.FALSE,
    cl: { rgb: color },
    bg: fill === null ? null : { rgb: fill },
  };
}

function writeCells(grid: Grid, step: Step, ref: Ref, cellAt: (row: number, column: number) => ICellData | null): void {
  const { sheet, area } = placeOf(grid, ref);
  makeRoom(grid, step, ref, area);
  const cellValue: Cells = {};
  for (let row = 0; row < area.rows; row++) {
    for (let column = 0; column < area.columns; column++) {
      const cell = cellAt(row, column);
      if (cell !== null) (cellValue[area.top + row] ??= {})[area.left + column] = cell;
    }
  }
  if (Object.keys(cellValue).length === 0) return;
  const params = { unitId: grid.workbook().getId(), subUnitId: sheet.getSheetId(), cellValue };
  const undo = grid.injector.invoke((accessor: IAccessor) => SetRangeValuesUndoMutationFactory(accessor, params));
  step.run({ id: SetRangeValuesMutation.id, params }, { id: SetRangeValuesMutation.id, params: undo });
}

/** A sheet of the grid ends somewhere; writing beyond its end makes it longer. */
function makeRoom(grid: Grid, step: Step, ref: Ref, area: Area): void {
  const { sheet } = placeOf(grid, ref);
  const at = { unitId: grid.workbook().getId(), subUnitId: sheet.getSheetId() };
  const rows = sheet.getMaxRows();
  const columns = sheet.getMaxColumns();
  const needRows = area.top + area.rows;
  const needColumns = area.left + area.columns;
  if (needRows > rows) {
    step.run(
      { id: SetWorksheetRowCountMutation.id, params: { ...at, rowCount: needRows } },
      { id: SetWorksheetRowCountMutation.id, params: { ...at, rowCount: rows } },
    );
  }
  if (needColumns > columns) {
    step.run(
      { id: SetWorksheetColumnCountMutation.id, params: { ...at, columnCount: needColumns } },
      { id: SetWorksheetColumnCountMutation.id, params: { ...at, columnCount: columns } },
    );
  }
}
