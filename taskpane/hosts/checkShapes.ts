import type { Change, HostError, Ref } from '../port';
import { formatReference, parseArea } from './address';

const SHEET_NAME = /^(?!')[^:\\/?*[\]]{1,31}(?<!')$/;
const NAME = /^(?!(?:[A-Za-z]{1,3}\d+|[RrCc]|[Rr]\d*[Cc]\d*)$)[\p{L}_\\][\p{L}\p{N}_.\\]{0,254}$/u;

/**
 * The part of `check` that needs no workbook but the list of its sheets: shapes, addresses, names.
 * A sheet made earlier in the same list counts as there.
 */
export function checkShapes(
  changes: readonly Change[],
  sheets: readonly string[],
  mostCells = Number.POSITIVE_INFINITY,
): HostError[] {
  const known = new Set(sheets.map((name) => name.toLowerCase()));
  const errors: HostError[] = [];
  const add = (reason: HostError['reason'], ref: Ref, text: string) => errors.push({ reason, ref, text });
  let cells = 0;
  for (const change of changes) {
    if (change.kind === 'sheet') {
      if (SHEET_NAME.test(change.name)) known.add(change.name.toLowerCase());
      else
        add(
          'bad reference',
          { sheet: change.name, address: 'A1' },
          `sheet name not allowed: received "${change.name}"`,
        );
      continue;
    }
    const { ref } = change;
    if (!known.has(ref.sheet.toLowerCase())) {
      add('no such sheet', ref, `no sheet named "${ref.sheet}"`);
      continue;
    }
    const area = parseArea(ref.address);
    if (area === null) {
      add('bad reference', ref, `address: allowed A1 style; received "${ref.address}"`);
      continue;
    }
    if (change.kind === 'name' && !NAME.test(change.name)) {
      add('bad reference', ref, `name not allowed: received "${change.name}"`);
    }
    if (change.kind !== 'cells') continue;
    cells += area.rows * area.columns;
    for (const grid of [change.values, change.formulas]) {
      if (grid === undefined) continue;
      const fits = grid.length === area.rows && grid.every((row) => row.length === area.columns);
      if (fits) continue;
      const allowed = `${String(area.rows)} × ${String(area.columns)}`;
      const received = `${String(grid.length)} × ${String(grid[0]?.length ?? 0)}`;
      add('bad reference', ref, `${formatReference(ref)}: allowed ${allowed} cells; received ${received}`);
    }
    const numbers = change.values?.flat().filter((value) => typeof value === 'number') ?? [];
    if (!numbers.every(Number.isFinite)) {
      add('bad reference', ref, `${formatReference(ref)}: allowed finite numbers; received NaN or Infinity`);
    }
    if (cells > mostCells) {
      add('too large', ref, `allowed at most ${String(mostCells)} cells in one step; received ${String(cells)}`);
      break;
    }
  }
  return errors;
}
