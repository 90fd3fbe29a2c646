import { CommandType, ICommandService } from '@univerjs/core';
import type { Grid } from '../grid/openGrid';

const SOON_MS = 500;

/** Mutations that follow from others, or from opening a workbook. */
const AUTOMATIC = /auto-height|formula\.mutation\.(?!set-defined-name|remove-defined-name)/;

export interface Saving {
  /** Saves what waits to be saved. */
  flush(): void;
}

/** Calls `changed` at each change of the open workbook and `save` a little after the last of them. */
export function autosave(grid: Grid, changed: (byPerson: boolean) => void, save: () => void): Saving {
  let timer: ReturnType<typeof setTimeout> | undefined;
  const flush = () => {
    if (timer === undefined) return;
    clearTimeout(timer);
    timer = undefined;
    save();
  };
  const soon = () => {
    clearTimeout(timer);
    timer = setTimeout(flush, SOON_MS);
  };
  grid.injector.get(ICommandService).onCommandExecuted((command, options) => {
    const params = command.params as { unitId?: string } | undefined;
    if (command.type !== CommandType.MUTATION || params?.unitId !== grid.workbook().getId()) return;
    changed(!AUTOMATIC.test(command.id) && !options?.fromFormula && !options?.onlyLocal);
    soon();
  });
  grid.onText(() => {
    changed(false);
    soon();
  });
  return { flush };
}
