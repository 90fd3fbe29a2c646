import type { Cell } from '../taskpane/port';

/**
 * A workbook as plain data: JSON in, JSON out, never changed in place. The standard workbook is one,
 * the file layer reads and writes them, the grid and the headless engine load them.
 */
export interface Book {
  readonly sheets: readonly BookSheet[];
  readonly names: readonly BookName[];
  /** Looks that cells point at by key. */
  readonly styles: Readonly<Record<string, BookStyle>>;
  /** Small texts kept in the file, such as the stamp of its settings. */
  readonly properties: Readonly<Record<string, string>>;
}

export interface BookSheet {
  readonly name: string;
  /** Its part in the file that it came from; whoever edits a sheet keeps it, so that a renamed sheet is still known. */
  readonly id?: string;
  /** Keyed by A1 address without `$`: `B5`. An address that is absent is an empty, unstyled cell. */
  readonly cells: Readonly<Record<string, BookCell>>;
  /** In characters of the standard font, keyed by column letters. */
  readonly columnWidths: Readonly<Record<string, number>>;
  /** In points, keyed by row number as text. */
  readonly rowHeights: Readonly<Record<string, number>>;
  /** `B2:D2` */
  readonly merges: readonly string[];
  readonly lists: readonly BookList[];
  /** Rows and columns that stay in view. */
  readonly freeze: { readonly rows: number; readonly columns: number };
  readonly gridLines: boolean;
  readonly hidden: boolean;
  readonly print: BookPrint;
}

export interface BookCell {
  /** What the cell shows; where it has a formula, the value kept from the last calculation. */
  readonly value: Cell;
  /** As a person types it, with its `=`: `=LATENTRY.LATENT("water","vaporization",A5:A25,Latentry_units)`. */
  readonly formula?: string;
  /**
   * For a formula that spills: the range it fills, `B5:B25`; absent while that is not known, and where it fills its own
   * cell only. The other cells of the range hold kept values and no formula; see `spilledCells`.
   */
  readonly spill?: string;
  /** For an array formula of the older, fixed kind: the range it fills. */
  readonly array?: string;
  /** Key into `Book.styles`. */
  readonly style?: string;
  /** Number format of this cell; without it the style's, else `General`. */
  readonly format?: string;
}

export interface BookName {
  readonly name: string;
  /** Without `=`: `Units!$A$4:$B$14`. */
  readonly formula: string;
  /** The sheet it is private to; absent for workbook scope. */
  readonly sheet?: string;
  readonly hidden?: boolean;
}

/** The choices that a cell offers. */
export interface BookList {
  /** `B4` or `B4:B9` */
  readonly range: string;
  readonly values: readonly string[];
  /** Cells that hold the choices, without `=`: `Lists!$A$2:$A$9`; absent where the choices stand in the rule itself. */
  readonly source?: string;
  /** Shown when the cell is selected. */
  readonly prompt?: string;
  /** The choices are usual ones only: other entries are taken too. */
  readonly open?: boolean;
}

export interface BookPrint {
  readonly landscape: boolean;
  /** Shrinks to one page in width. */
  readonly fitWidth: boolean;
}

/** Colours are six hex digits without `#`. Fonts are sized in points. */
export interface BookStyle {
  readonly format?: string;
  readonly bold?: boolean;
  readonly italic?: boolean;
  readonly size?: number;
  readonly color?: string;
  readonly fill?: string;
  /** Colour of thin lines: all round, or only below. */
  readonly box?: string;
  readonly under?: string;
  readonly align?: 'left' | 'center' | 'right';
  readonly valign?: 'top' | 'center' | 'bottom';
  readonly wrap?: boolean;
}
