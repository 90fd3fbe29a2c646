import path from 'node:path';
import type { Book, BookCell } from '../../workbook/book';
import { emptySheet } from '../../workbook/emptySheet';
import { openEngine } from '../../workbook/engine/openEngine';
import { readable } from './measure';

const CELLS = 10_000;

/** A workbook of 10,000 temperatures with one formula a row beside them. */
function bookOf(formula: (row: number) => string): Book {
  const cells: Record<string, BookCell> = {};
  for (let row = 1; row <= CELLS; row++) {
    cells[`A${row}`] = { value: 1 + (370 * row) / (CELLS + 1) };
    cells[`B${row}`] = { value: null, formula: formula(row) };
  }
  const sheet = { ...emptySheet('Sheet1'), cells };
  return { sheets: [sheet], names: [], styles: {}, properties: {} };
}

/** Function cells on the engine against cells of a built-in function. */
export async function benchGrid(): Promise<void> {
  const engine = await openEngine({ bundlePath: path.join(import.meta.dirname, '../../dist/functions.js') });
  const books = {
    'EXP cells': bookOf((row) => `=EXP(A${row}/100)`),
    'LATENT cells': bookOf((row) => `=LATENTRY.LATENT("water","vaporization",A${row})`),
  };
  const times: Record<string, number[]> = {};
  for (let round = 0; round < 5; round++) {
    for (const [name, book] of Object.entries(books)) {
      const start = process.hrtime.bigint();
      await engine.calculate(book);
      (times[name] ??= []).push(Number(process.hrtime.bigint() - start) / 1e9);
    }
  }
  process.stdout.write(
    `\n${CELLS} formula cells, load and calculate, headless (aim: function cells at most 2× EXP cells)\n`,
  );
  const median = (name: string): number => [...(times[name] ?? [])].sort((a, b) => a - b)[2] ?? NaN;
  for (const name of Object.keys(books)) {
    process.stdout.write(
      `  ${name.padEnd(58)} ${readable(median(name)).padStart(10)}  ×${(median(name) / median('EXP cells')).toFixed(2)}\n`,
    );
  }
}
