/** What stands in a formula, read without calculating it. */
export interface FormulaScan {
  /** Function names as written, without `@`. */
  readonly functions: readonly string[];
  /** References to cells of no named sheet: `A1`, `$B$2:C9`, `A:A`. */
  readonly unqualified: readonly string[];
  /** References to a whole spill, `E1#`, which the engine can't follow. */
  readonly spills: readonly string[];
  /** Whether an `@` narrows something to one cell, which the engine can't follow either. */
  readonly intersects: boolean;
}

/**
 * Finds functions and references in a formula; texts in quotes are left out.
 * @example
 * scanFormula('=SUM(A1:A3)+Data!B2').unqualified // => ['A1:A3']
 */
export function scanFormula(formula: string): FormulaScan {
  const bare = formula.replace(/"(?:[^"]|"")*"/g, '""').replace(/'(?:[^']|'')*'!/g, 'Sheet!');
  const all = (pattern: RegExp) => [...bare.matchAll(pattern)].map((match) => match[1] ?? match[0]);
  return {
    functions: all(/([A-Za-z_][\w.]*)\s*\(/g),
    unqualified: [
      ...all(/(?<![\w!.$:])\$?[A-Za-z]{1,3}\$?\d{1,7}(?::\$?[A-Za-z]{1,3}\$?\d{1,7})?(?![\w(!.])/g),
      ...all(/(?<![\w!.$:])\$?[A-Za-z]{1,3}:\$?[A-Za-z]{1,3}(?![\w(!.$:])/g),
      ...all(/(?<![\w!.$:])\$?\d{1,7}:\$?\d{1,7}(?![\w(!.$:])/g),
    ],
    intersects: bare.includes('@'),
    spills: all(/\$?[A-Za-z]{1,3}\$?\d{1,7}#/g),
  };
}
