import type { Cell } from '../../taskpane/port';
import type { Evaluated } from '../engine/openEngine';

type CellError = Exclude<Cell, number | string | boolean | null>;

/** Whether a formula gave an error, by itself or in one cell of its spill. */
export function hasError({ values }: Evaluated): boolean {
  return values.some((row) => row.some(isError));
}

/** One line of JSON: `{"formula","value"}`, `{"formula","values"}` or `{"formula","error","message"}`. */
export function jsonLine({ formula, values }: Evaluated): string {
  const only = single(values);
  if (only === undefined) return `${JSON.stringify({ formula, values })}\n`;
  return `${JSON.stringify(isError(only) ? { formula, ...only } : { formula, value: only })}\n`;
}

/** The same for a person: a value, an error with its words, or a table; under its formula where there are several. */
export function readableBlock({ formula, values }: Evaluated, named: boolean): string {
  const only = single(values);
  const text =
    only === undefined ? table(values) : isError(only) ? `${only.error}  ${only.message ?? ''}` : shown(only);
  if (!named) return `${text}\n`;
  return `${formula}\n${text.replace(/^/gm, '  ')}\n`;
}

function single(values: Evaluated['values']): Cell | undefined {
  return values.length === 1 && values[0]?.length === 1 ? (values[0][0] ?? null) : undefined;
}

function isError(cell: Cell): cell is CellError {
  return typeof cell === 'object' && cell !== null;
}

/** Numbers to twelve significant digits: what a person reads; JSON has them all. */
function shown(cell: Cell): string {
  if (cell === null) return '';
  if (typeof cell === 'number') return String(Number(cell.toPrecision(12)));
  if (typeof cell === 'boolean') return cell ? 'TRUE' : 'FALSE';
  return typeof cell === 'string' ? cell : cell.error;
}

function table(values: Evaluated['values']): string {
  const texts = values.map((row) => row.map(shown));
  const widths = (texts[0] ?? []).map((_text, c) => Math.max(...texts.map((row) => row[c]?.length ?? 0)));
  const lines = texts.map((row, r) =>
    row
      .map((text, c) =>
        typeof values[r]?.[c] === 'number' ? text.padStart(widths[c] ?? 0) : text.padEnd(widths[c] ?? 0),
      )
      .join('  ')
      .trimEnd(),
  );
  const words = values.flatMap((row) => row.filter(isError).map(({ error, message }) => `${error}  ${message ?? ''}`));
  return [...lines, ...new Set(words)].join('\n');
}
