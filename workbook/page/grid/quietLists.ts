import {
  DataValidationStatus,
  type IDisposable,
  type Injector,
  IUniverInstanceService,
  ObjectMatrix,
  toDisposable,
  UniverInstanceType,
  type Workbook,
} from '@univerjs/core';
import { SheetDataValidationModel, SheetsDataValidationValidatorService } from '@univerjs/sheets-data-validation';
import { IEditorBridgeService, ISheetCellDropdownManagerService } from '@univerjs/sheets-ui';
import { isOpen } from './listRule';

/**
 * Three things about lists of choices.
 *
 * 1. A list opens on its cell's arrow only. Opened by typing, as the grid would have it, it takes the keys away from
 *    the cell after the first letter.
 * 2. The grid checks entries a little later; when their workbook is gone by then, that is no fault.
 * 3. An entry beside choices that are usual ones only is no fault either, and gets no mark of one.
 */
export function quietLists(injector: Injector): void {
  const lists = injector.get(ISheetCellDropdownManagerService);
  const editor = injector.get(IEditorBridgeService);
  const show = lists.showDropdown.bind(lists);
  lists.showDropdown = (choices): IDisposable =>
    editor.isVisible().visible ? toDisposable(() => undefined) : show(choices);

  const rules = injector.get(SheetDataValidationModel);
  const validator = rules.validator.bind(rules);
  rules.validator = (rule, place, done) => {
    if (!isOpen(rule)) return validator(rule, place, done);
    done?.(DataValidationStatus.VALID, false);
    return DataValidationStatus.VALID;
  };

  const checks = injector.get(SheetsDataValidationValidatorService);
  const units = injector.get(IUniverInstanceService);
  const isThere = (unitId: string): boolean =>
    units.getAllUnitsForType<Workbook>(UniverInstanceType.UNIVER_SHEET).some((unit) => unit.getUnitId() === unitId);
  const cell = checks.validatorCell.bind(checks);
  checks.validatorCell = (unitId, sheetId, row, column) =>
    isThere(unitId) ? cell(unitId, sheetId, row, column) : Promise.resolve(DataValidationStatus.VALID);
  const ranges = checks.validatorRanges.bind(checks);
  checks.validatorRanges = (unitId, sheetId, places) =>
    isThere(unitId) ? ranges(unitId, sheetId, places) : Promise.resolve([]);
  const worksheet = checks.validatorWorksheet.bind(checks);
  checks.validatorWorksheet = (unitId, sheetId) =>
    isThere(unitId) ? worksheet(unitId, sheetId) : Promise.resolve(new ObjectMatrix());
}
