/** What the formula engine calculates: positions count from zero, formulas start with `=`. */
export interface EngineBook {
  readonly sheets: readonly EngineSheet[];
  readonly names: readonly EngineName[];
}

export interface EngineSheet {
  readonly name: string;
  readonly rows: number;
  readonly columns: number;
  readonly cells: readonly EngineCell[];
}

export interface EngineCell {
  readonly row: number;
  readonly column: number;
  readonly value: EngineValue;
  readonly formula?: string;
}

export interface EngineName {
  readonly name: string;
  /** A reference, `Units!$A$4:$B$14`, or a formula with its `=`. */
  readonly formula: string;
  /** Index of the sheet that it is private to. */
  readonly sheet?: number;
}

export type EngineValue = number | string | boolean | null | { readonly code: string };

/** A whole result, row by row. */
export type EngineMatrix = readonly (readonly EngineValue[])[];

/** One sheet after calculation: cells with a formula, and those that a formula spilled into. */
export interface EngineCells {
  value(row: number, column: number): EngineValue;
  /** How far the formula of a cell spills; one by one where it does not. */
  extent(row: number, column: number): { readonly rows: number; readonly columns: number };
}

/** How the formula engine calls the sheet at an index. */
export function sheetId(index: number): string {
  return `sheet${index}`;
}
