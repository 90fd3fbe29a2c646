/**
 * One published value and the formula that must reproduce it. The one list of them feeds SELFCHECK, the
 * Checks sheet, the tests and the function pages.
 */
export interface Check {
  /** Function id, as `LATENT`. */
  readonly call: string;
  /** Scalars, or columns of numbers with the name they go by in the formula shown. */
  readonly args: readonly (string | number | Column)[];
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

/** The formula of a check, as a user would type it; a column is shown by its name. */
export function formulaOf(check: Check): string {
  const args = [...check.args, check.settings].map((arg) =>
    typeof arg === 'number' ? String(arg) : typeof arg === 'string' ? `"${arg}"` : arg.name,
  );
  return `=LATENTRY.${check.call}(${args.join(',')})`;
}
