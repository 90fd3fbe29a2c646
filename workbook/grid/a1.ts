/** The letters of a zero-based column. */
export function columnLetters(column: number): string {
  let letters = '';
  for (let rest = column + 1; rest > 0; rest = Math.floor((rest - 1) / 26)) {
    letters = String.fromCharCode(65 + ((rest - 1) % 26)) + letters;
  }
  return letters;
}

/** `Sheet!A1` of zero-based positions; the sheet is quoted where its name needs it. */
export function cellAddress(sheetName: string, row: number, column: number): string {
  const plain = /^[A-Za-z_][A-Za-z0-9_.]*$/.test(sheetName) && !/^[A-Za-z]{1,3}[0-9]+$/.test(sheetName);
  const sheet = plain ? sheetName : `'${sheetName.replaceAll("'", "''")}'`;
  return `${sheet}!${columnLetters(column)}${row + 1}`;
}

/** `Sheet!A1:B9`, or `Sheet!A1` where both ends are one cell. */
export function rangeAddress(sheetName: string, row: number, column: number, rows: number, columns: number): string {
  const first = cellAddress(sheetName, row, column);
  return rows === 1 && columns === 1 ? first : `${first}:${columnLetters(column + columns - 1)}${row + rows}`;
}
