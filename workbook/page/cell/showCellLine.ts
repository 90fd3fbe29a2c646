import { ICommandService } from '@univerjs/core';
import { SetRangeValuesMutation, SheetsSelectionsService } from '@univerjs/sheets';
import { BuiltInUIPart } from '@univerjs/ui';
import { createElement } from 'react';
import type { FunctionList } from '../../grid/functionList';
import type { Grid } from '../grid/openGrid';
import { CellLine, type CellLineStore } from './CellLine';
import { type CellInfo, cellInfo } from './cellInfo';

/** Puts the line about the active cell below the formula bar and keeps it up to date. */
export function showCellLine(grid: Grid, list: FunctionList): void {
  let info: CellInfo = { tone: 'plain', text: '' };
  const listeners = new Set<() => void>();
  const store: CellLineStore = {
    current: () => info,
    subscribe: (changed) => {
      listeners.add(changed);
      return () => listeners.delete(changed);
    },
  };
  const refresh = () => {
    const sheet = grid.workbook().getActiveSheet();
    const cell = sheet.getActiveCell()?.getRange();
    const next: CellInfo =
      cell === undefined
        ? { tone: 'plain', text: '' }
        : cellInfo(grid, list, sheet.getSheetId(), cell.startRow, cell.startColumn);
    if (next.tone === info.tone && next.text === info.text) return;
    info = next;
    for (const listener of listeners) listener();
  };
  grid.api.registerUIPart(BuiltInUIPart.HEADER, () => createElement(CellLine, { store }));
  grid.injector.get(SheetsSelectionsService).selectionChanged$.subscribe(refresh);
  grid.injector.get(ICommandService).onCommandExecuted(({ id }) => {
    if (id === SetRangeValuesMutation.id) refresh();
  });
  grid.api.getFormula().calculationResultApplied(refresh);
  grid.onOpened(refresh);
  refresh();
}
