import { type IDisposable, type Injector, toDisposable } from '@univerjs/core';
import { IEditorBridgeService, ISheetCellDropdownManagerService } from '@univerjs/sheets-ui';

/**
 * A cell's list of choices opens on its arrow only. Opened by typing, as the grid would have it, the list takes the
 * keys away from the cell after the first letter.
 */
export function quietLists(injector: Injector): void {
  const lists = injector.get(ISheetCellDropdownManagerService);
  const editor = injector.get(IEditorBridgeService);
  const show = lists.showDropdown.bind(lists);
  lists.showDropdown = (choices): IDisposable =>
    editor.isVisible().visible ? toDisposable(() => undefined) : show(choices);
}
