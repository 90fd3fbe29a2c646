/** A cell of a settings block as text; `""` for a blank. */
export function settingCell(cell: unknown): string {
  if (typeof cell === 'string') return cell.trim();
  if (typeof cell === 'number' || typeof cell === 'boolean') return String(cell);
  if (cell === null || cell === undefined || typeof cell !== 'object') return '';
  const { basicValue, code, error } = cell as { basicValue?: unknown; code?: unknown; error?: unknown };
  for (const text of [error, code, basicValue])
    if (typeof text === 'string' || typeof text === 'number') return String(text);
  return 'a data-type cell';
}
