import { readHeader, type Header } from '../../core/units/readHeader';
import { formatArea, parseArea } from '../hosts/address';
import type { Block, Cell, Ref } from '../port';

/** One column of the data, with what its header says. */
export interface DataColumn {
  /** The whole column, header included. */
  readonly ref: Ref;
  /** As a person tells it from others: `B: ΔH / kJ/mol`, or `column B` without a header. */
  readonly label: string;
  readonly header: Header | undefined;
  /** Cells below the header. */
  readonly values: readonly Cell[];
  /** Row of the sheet that the first of `values` stands in, from 1. */
  readonly firstRow: number;
}

export type Part = 'temperature' | 'latent' | 'uLatent' | 'uTemperature';

/** Place of each part in the columns, where it was found. */
export type Parts = Readonly<Partial<Record<Part, number | undefined>>>;

/** Columns in the order of the ranges; each part is a place in `columns` where it was found. */
export interface FoundColumns {
  readonly columns: readonly DataColumn[];
  readonly parts: Parts;
}

/**
 * Finds which columns of the ranges hold temperatures, latent heats and their uncertainties.
 *
 * Headers decide by name and unit; an uncertainty that doesn't say of what belongs to the column on its left; columns
 * without a header are taken in order, temperature first.
 */
export function findColumns(blocks: readonly Block[]): FoundColumns {
  const columns = blocks.flatMap(columnsOf);
  const parts: Partial<Record<Part, number | undefined>> = {};
  for (const [i, { header }] of columns.entries()) {
    if (header?.role === 'temperature') parts.temperature ??= i;
    if (header?.role === 'latent') parts.latent ??= i;
  }
  const free = columns.flatMap(({ header, values }, i) => (isOpen(header) && hasNumber(values) ? [i] : []));
  parts.temperature ??= free.find((i) => i !== parts.latent);
  parts.latent ??= free.find((i) => i !== parts.temperature);
  for (const [i, { header }] of columns.entries()) {
    if (header?.role !== 'uncertainty') continue;
    const of = header.of === 'temperature' || header.of === 'latent' ? header.of : partOf(parts, i - 1);
    if (of === 'latent') parts.uLatent ??= i;
    if (of === 'temperature') parts.uTemperature ??= i;
  }
  if (columns.every(({ header }) => header === undefined)) {
    const rest = free.filter((i) => i !== parts.temperature && i !== parts.latent);
    if (rest[0] !== undefined) parts.uLatent = rest[0];
    if (rest[1] !== undefined) parts.uTemperature = rest[1];
  }
  return { columns, parts };
}

const isOpen = (header: Header | undefined) => header === undefined || header.role === 'unknown';

const hasNumber = (values: readonly Cell[]) => values.some((value) => typeof value === 'number');

function partOf(parts: Parts, place: number): Part | undefined {
  return (['temperature', 'latent'] as const).find((part) => parts[part] === place);
}

function columnsOf({ ref, values }: Block): DataColumn[] {
  const area = parseArea(ref.address);
  const [first] = values;
  if (area === null || first === undefined) return [];
  const titled = first.some(isWords) && !first.some((cell) => typeof cell === 'number');
  return first.map((title, c) => {
    const address = formatArea({ ...area, left: area.left + c, columns: 1 });
    const letter = /^[A-Z]+/.exec(address)?.[0] ?? '';
    const words = titled && isWords(title) ? title.trim() : undefined;
    return {
      ref: { sheet: ref.sheet, address },
      label: words === undefined ? `column ${letter}` : `${letter}: ${words}`,
      header: words === undefined ? undefined : readHeader(words),
      values: (titled ? values.slice(1) : values).map((row) => row[c] ?? null),
      firstRow: area.top + (titled ? 2 : 1),
    };
  });
}

function isWords(cell: Cell): cell is string {
  return typeof cell === 'string' && cell.trim() !== '';
}
