/**
 * One published value and the formula that must reproduce it. The one list of them feeds SELFCHECK, the
 * Checks sheet, the tests and the function pages.
 */
export interface Check {
  /** Function id, as `LATENT`. */
  readonly call: string;
  /** Scalars, columns of numbers with the name they go by in the formula shown, or a small table written out in it. */
  readonly args: readonly (string | number | Column | Rows)[];
  /** Settings text that goes with it, so that a check never depends on the workbook's units. */
  readonly settings: string;
  /** Which cell of a table result is checked, found by the label in its first column; the only cell when absent. */
  readonly pick?: { readonly label: string; readonly column: number };
  readonly expected: number;
  /** Largest deviation that still reproduces the published figure. */
  readonly within: number;
  /** Where the deviation comes from. */
  readonly because: string;
  readonly source: string;
}

export interface Column {
  readonly name: string;
  readonly values: readonly number[];
}

export interface Rows {
  readonly rows: readonly (readonly (string | number)[])[];
}

/** The formula of a check, as a user would type it; a column is shown by its name. */
export function formulaOf(check: Check): string {
  const args = [...check.args, check.settings].map((arg) => {
    if (typeof arg !== 'object') return scalarOf(arg);
    return 'name' in arg ? arg.name : `{${arg.rows.map((row) => row.map(scalarOf).join(',')).join(';')}}`;
  });
  return `=LATENTRY.${check.call}(${args.join(',')})`;
}

function scalarOf(value: string | number): string {
  return typeof value === 'number' ? String(value) : `"${value}"`;
}
