import { ICommandService } from '@univerjs/core';
import { RemoveDefinedNameMutation, SetDefinedNameMutation } from '@univerjs/engine-formula';
import {
  InsertColMutation,
  InsertRowMutation,
  InsertSheetMutation,
  MoveColsMutation,
  MoveRangeMutation,
  MoveRowsMutation,
  RemoveColMutation,
  RemoveRowMutation,
  RemoveSheetMutation,
  SetRangeValuesMutation,
  SetWorksheetActiveOperation,
  SetWorksheetNameMutation,
  SheetsSelectionsService,
} from '@univerjs/sheets';
import { formatArea } from '../../../taskpane/hosts/address';
import type { HostEvent, Ref, WorkbookHost } from '../../../taskpane/port';
import type { Grid } from '../grid/openGrid';
import { selectedRef } from './selectedRef';

type EventName = Parameters<WorkbookHost['on']>[0];

/** Changes that move cells or names without saying which cells look different now. */
const MOVING = new Set<string>(
  [
    InsertColMutation,
    InsertRowMutation,
    InsertSheetMutation,
    MoveColsMutation,
    MoveRangeMutation,
    MoveRowsMutation,
    RemoveColMutation,
    RemoveRowMutation,
    RemoveSheetMutation,
    SetWorksheetNameMutation,
    SetDefinedNameMutation,
    RemoveDefinedNameMutation,
  ].map(({ id }) => id),
);

/** The port's `on`; `isOwn` tells whether a change that happens just now is the add-in's. */
export function gridEvents(grid: Grid, isOwn: () => boolean): WorkbookHost['on'] {
  const listeners = new Map<EventName, Set<(event: HostEvent) => void>>();
  const emit = (name: EventName, event: Pick<HostEvent, 'ref'> = {}, own = false) => {
    for (const listener of [...(listeners.get(name) ?? [])]) listener({ ...event, remote: false, own });
  };

  grid.injector.get(ICommandService).onCommandExecuted((command, options) => {
    if (command.id === SetRangeValuesMutation.id) {
      if (options?.fromFormula === true) return;
      const ref = changedRef(grid, command.params as ChangedCells);
      if (ref !== null) emit('change', { ref }, isOwn());
    } else if (MOVING.has(command.id)) {
      emit('change', {}, isOwn());
    } else if (command.id === SetWorksheetActiveOperation.id) {
      emit('activated');
    }
  });
  grid.injector.get(SheetsSelectionsService).selectionChanged$.subscribe(() => {
    const ref = selectedRef(grid);
    emit('select', ref === null ? {} : { ref });
  });
  grid.api.getFormula().calculationResultApplied(() => emit('calculated'));

  return (name, listener) => {
    const own = (event: HostEvent) => listener(event);
    const set = listeners.get(name) ?? new Set();
    listeners.set(name, set.add(own));
    return () => set.delete(own);
  };
}

interface ChangedCells {
  readonly unitId: string;
  readonly subUnitId: string;
  readonly cellValue?: Readonly<Record<number, Readonly<Record<number, object | null>>>>;
}

/** The area around the cells whose content changed; null where only looks did. */
function changedRef(grid: Grid, { unitId, subUnitId, cellValue }: ChangedCells): Ref | null {
  const sheet = unitId === grid.workbook().getId() ? grid.workbook().getSheetBySheetId(subUnitId) : null;
  let top = Infinity;
  let left = Infinity;
  let bottom = -1;
  let right = -1;
  for (const [row, columns] of Object.entries(cellValue ?? {})) {
    for (const [column, cell] of Object.entries(columns)) {
      if (cell !== null && Object.keys(cell).every((key) => key === 's')) continue;
      top = Math.min(top, Number(row));
      left = Math.min(left, Number(column));
      bottom = Math.max(bottom, Number(row));
      right = Math.max(right, Number(column));
    }
  }
  if (sheet === null || bottom < 0) return null;
  const address = formatArea({ top, left, rows: bottom - top + 1, columns: right - left + 1 });
  return { sheet: sheet.getSheetName(), address };
}
