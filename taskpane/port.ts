/**
 * The port: all that the pane knows of a workbook. `hosts/excel.ts` implements it with Office.js,
 * the local page with its grid, the tests with a workbook in memory; one contract suite holds them equal.
 */
export type CellErrorCode =
  '#VALUE!' | '#N/A' | '#REF!' | '#NAME?' | '#NUM!' | '#DIV/0!' | '#NULL!' | '#SPILL!' | '#CALC!' | '#BUSY!';
export type Cell = number | string | boolean | null | { readonly error: CellErrorCode; readonly message?: string };

/** `address` is A1 style without the sheet: `B2`, `B2:D9`. */
export interface Ref {
  readonly sheet: string;
  readonly address: string;
}

/** `formulas` holds `""` where a cell has none. */
export interface Block {
  readonly ref: Ref;
  readonly values: readonly (readonly Cell[])[];
  readonly formulas: readonly (readonly string[])[];
}

export type CellFormat = 'plain' | 'heading' | 'input' | 'answer' | 'note';

export type Change =
  | {
      readonly kind: 'cells';
      readonly ref: Ref;
      readonly values?: readonly (readonly Cell[])[];
      /** `""` leaves the value of that cell to `values`. */
      readonly formulas?: readonly (readonly string[])[];
      readonly format?: CellFormat;
    }
  | { readonly kind: 'sheet'; readonly name: string }
  | { readonly kind: 'name'; readonly name: string; readonly ref: Ref }
  | { readonly kind: 'note'; readonly ref: Ref; readonly text: string };

export interface HostError {
  readonly reason: 'occupied' | 'protected' | 'too large' | 'editing' | 'no such sheet' | 'bad reference';
  readonly ref: Ref;
  readonly text: string;
}

export interface ChartSeries {
  readonly label: string;
  readonly x: Ref;
  readonly y: Ref;
  readonly draw: 'points' | 'line';
}

export interface ChartSpec {
  readonly title: string;
  readonly xLabel: string;
  readonly yLabel: string;
  readonly series: readonly ChartSeries[];
}

export interface HostEvent {
  readonly ref?: Ref;
  /** True where another person's session made the change. */
  readonly remote: boolean;
  /** True where this add-in made the change itself. */
  readonly own: boolean;
}

export interface WorkbookHost {
  readonly can: {
    readonly chart: boolean;
    readonly undoGroup: boolean;
    readonly startup: boolean;
    readonly file: boolean;
  };
  readonly locale: { readonly decimal: string; readonly list: string };
  selection(): Promise<Ref | null>;
  /** One crossing for all references. */
  read(refs: readonly Ref[]): Promise<Block[]>;
  /** Names of workbook scope that start with `prefix`. */
  names(prefix: string): Promise<Map<string, Ref | 'broken'>>;
  /** Every used block that holds a formula matching `formula`. */
  scan(formula: RegExp, signal: AbortSignal): AsyncIterable<Block>;
  /** What would stand in the way of `apply`; empty when nothing does. */
  check(changes: readonly Change[]): Promise<HostError[]>;
  /** All or nothing; one undo step where the host can. */
  apply(changes: readonly Change[], label: string): Promise<void>;
  recalculate(refs: readonly Ref[]): Promise<void>;
  reveal(ref: Ref): Promise<void>;
  chart(spec: ChartSpec, at: Ref): Promise<void>;
  /** A small text kept in the file. */
  state(key: string, value?: string): Promise<string | null>;
  startup(on?: boolean): Promise<boolean>;
  on(event: 'select' | 'change' | 'calculated' | 'activated', listener: (event: HostEvent) => void): () => void;
}
