import type { IMutationInfo } from '@univerjs/core';
import { ICommandService, IUndoRedoService } from '@univerjs/core';
import type { Grid } from '../grid/openGrid';

/** Changes to the grid that stand or fall together, and are undone together. */
export interface Step {
  /** Makes a change now; `undo` takes it back. */
  run(redo: IMutationInfo, undo: IMutationInfo): void;
}

/**
 * Makes changes as one step of the undo list; when one can't be made, those before it are taken back.
 * @throws Error naming the change that the grid refused
 */
export function runStep(grid: Grid, make: (step: Step) => void): void {
  const commands = grid.injector.get(ICommandService);
  const redoMutations: IMutationInfo[] = [];
  const undoMutations: IMutationInfo[] = [];
  try {
    make({
      run: (redo, undo) => {
        if (!commands.syncExecuteCommand(redo.id, redo.params)) throw new Error(`the grid refused ${redo.id}`);
        redoMutations.push(redo);
        undoMutations.unshift(undo);
      },
    });
  } catch (error) {
    for (const undo of undoMutations) commands.syncExecuteCommand(undo.id, undo.params);
    throw error;
  }
  if (redoMutations.length === 0) return;
  grid.injector.get(IUndoRedoService).pushUndoRedo({ unitID: grid.workbook().getId(), undoMutations, redoMutations });
}
