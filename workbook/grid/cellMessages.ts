import type { CallPlace, Report } from './callPlace';
import type { CallFault } from './results';

interface Spoken {
  readonly code: string;
  readonly message: string;
}

interface Owner {
  readonly calculation: number;
  /** By offset `row,column` from the cell that holds the formula. */
  readonly faults: Map<string, Spoken>;
}

/** The words behind error cells of one workbook: the grid itself keeps only the codes. */
export interface CellMessages {
  readonly report: Report;
  /** Call when a calculation begins: messages of the cells calculated anew are then replaced. */
  begin(): void;
  /**
   * The words for an error cell, or undefined.
   * @param sheetId The grid's id of the sheet.
   * @param row Row of the cell that holds the formula, from zero.
   * @param column Its column, from zero.
   * @param code The error that the cell shows.
   * @param offset Where in the formula's spill the cell lies; the formula's own cell when left out.
   */
  at(
    sheetId: string,
    row: number,
    column: number,
    code: string,
    offset?: { readonly row: number; readonly column: number },
  ): string | undefined;
}

/** Makes an empty store of messages; several functions of one formula add to each other. */
export function createCellMessages(): CellMessages {
  const owners = new Map<string, Owner>();
  let calculation = 0;

  const report = ({ sheetId, row, column }: CallPlace, faults: readonly CallFault[]): void => {
    if (faults.length === 0 && owners.size === 0) return;
    const key = `${sheetId},${row},${column}`;
    const known = owners.get(key);
    if (faults.length === 0) {
      if (known !== undefined && known.calculation !== calculation) owners.delete(key);
      return;
    }
    const owner = known?.calculation === calculation ? known : { calculation, faults: new Map<string, Spoken>() };
    for (const fault of faults) {
      const offset = `${fault.row},${fault.column}`;
      if (!owner.faults.has(offset)) owner.faults.set(offset, { code: fault.code, message: fault.message });
    }
    owners.set(key, owner);
  };

  return {
    report,
    begin: () => {
      calculation += 1;
    },
    at: (sheetId, row, column, code, offset = { row: 0, column: 0 }) => {
      const faults = owners.get(`${sheetId},${row},${column}`)?.faults;
      if (faults === undefined) return undefined;
      const exact = faults.get(`${offset.row},${offset.column}`);
      if (exact?.code === code) return exact.message;
      // An error of an inner call, or of a cell further down that the outer formula passed on.
      for (const spoken of faults.values()) if (spoken.code === code) return spoken.message;
      return undefined;
    },
  };
}
