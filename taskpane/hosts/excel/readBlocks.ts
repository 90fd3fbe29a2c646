import type { Block, Cell, HostError, Ref } from '../../port';
import { formatArea, formatReference, parseArea, parseReference, type Area } from '../address';
import { HostFailure } from '../hostFailure';
import { cellFromExcel, formulaFromExcel } from './cells';
import { excelCode } from './runExcel';

/** Keeps an answer of Excel on the web below its cap of 5 MB. */
export const CELLS_PER_CROSSING = 100_000;

interface Piece {
  readonly index: number;
  readonly area: Area;
}

function pieces(areas: readonly Area[]): Piece[] {
  return areas.flatMap((area, index) => {
    const rows = Math.max(1, Math.floor(CELLS_PER_CROSSING / area.columns));
    return Array.from({ length: Math.ceil(area.rows / rows) }, (_, i) => ({
      index,
      area: { ...area, top: area.top + i * rows, rows: Math.min(rows, area.rows - i * rows) },
    }));
  });
}

function crossings(all: readonly Piece[]): Piece[][] {
  const groups: Piece[][] = [];
  let size = Number.POSITIVE_INFINITY;
  for (const piece of all) {
    const cells = piece.area.rows * piece.area.columns;
    if (size + cells > CELLS_PER_CROSSING) {
      groups.push([]);
      size = 0;
    }
    groups[groups.length - 1]?.push(piece);
    size += cells;
  }
  return groups;
}

async function missingSheets(context: Excel.RequestContext, refs: readonly Ref[]): Promise<HostError[]> {
  const sheets = context.workbook.worksheets.load('items/name');
  await context.sync();
  const known = new Set(sheets.items.map((sheet) => sheet.name.toLowerCase()));
  return refs
    .filter((ref) => !known.has(ref.sheet.toLowerCase()))
    .map((ref) => ({ reason: 'no such sheet', ref, text: `no sheet named "${ref.sheet}"` }));
}

/** Reads all references in one crossing, or in as few as the platform's size cap allows. */
export async function readBlocks(context: Excel.RequestContext, refs: readonly Ref[]): Promise<Block[]> {
  const areas = refs.map((ref) => {
    const area = parseArea(ref.address);
    if (area !== null) return area;
    const text = `address: allowed A1 style; received "${formatReference(ref)}"`;
    throw new HostFailure([{ reason: 'bad reference', ref, text }]);
  });
  const read = refs.map((ref, i) => ({
    sheet: ref.sheet,
    area: areas[i],
    values: [] as Cell[][],
    formulas: [] as string[][],
  }));
  for (const group of crossings(pieces(areas))) {
    const ranges = group.map(({ index, area }) => ({
      into: read[index],
      range: context.workbook.worksheets
        .getItem(refs[index]?.sheet ?? '')
        .getRange(formatArea(area))
        .load('address,values,formulas,valueTypes'),
    }));
    try {
      await context.sync();
    } catch (error) {
      if (excelCode(error) !== 'ItemNotFound') throw error;
      throw new HostFailure(await missingSheets(context, refs));
    }
    for (const { into, range } of ranges) {
      if (into === undefined) continue;
      into.sheet = parseReference(range.address)?.sheet ?? into.sheet;
      const { values, formulas, valueTypes } = range;
      for (const [r, row] of values.entries()) {
        into.values.push(row.map((value, c) => cellFromExcel(value, valueTypes[r]?.[c] ?? 'Unknown')));
        into.formulas.push(row.map((value, c) => formulaFromExcel(formulas[r]?.[c], value)));
      }
    }
  }
  return read.map(({ sheet, area, values, formulas }) => ({
    ref: { sheet, address: area === undefined ? 'A1' : formatArea(area) },
    values,
    formulas,
  }));
}
