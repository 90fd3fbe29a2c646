import {
  DataValidationStatus,
  type IDisposable,
  type Injector,
  IUniverInstanceService,
  toDisposable,
} from '@univerjs/core';
import { SheetsDataValidationValidatorService } from '@univerjs/sheets-data-validation';
import { IEditorBridgeService, ISheetCellDropdownManagerService } from '@univerjs/sheets-ui';

/**
 * Two things about lists of choices.
 *
 * 1. A list opens on its cell's arrow only. Opened by typing, as the grid would have it, it takes the keys away from
 *    the cell after the first letter.
 * 2. The grid checks entries a little later; when their workbook is gone by then, that is no fault.
 */
export function quietLists(injector: Injector): void {
  const lists = injector.get(ISheetCellDropdownManagerService);
  const editor = injector.get(IEditorBridgeService);
  const show = lists.showDropdown.bind(lists);
  lists.showDropdown = (choices): IDisposable =>
    editor.isVisible().visible ? toDisposable(() => undefined) : show(choices);

  const checks = injector.get(SheetsDataValidationValidatorService);
  const units = injector.get(IUniverInstanceService);
  const check = checks.validatorCell.bind(checks);
  checks.validatorCell = (unitId, sheetId, row, column) =>
    units.getUnit(unitId) === null ? Promise.resolve(DataValidationStatus.VALID) : check(unitId, sheetId, row, column);
}
