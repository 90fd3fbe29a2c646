import { readFile } from 'node:fs/promises';
import type { Book } from '../book';
import { openEngine, type Engine } from '../engine/openEngine';
import { readXlsx } from '../file/readXlsx';
import { CALC_HELP } from './help';
import type { Io } from './io';
import { hasError, jsonLine, readableBlock } from './printResult';
import { readOptions } from './readOptions';
import { EXIT, Usage, type Exit } from './usage';
import { wordsOf } from './wordsOf';

const HELP = 'latentry calc --help';

/** `latentry calc`: evaluates formulas and prints a line or a block for each. */
export async function calc(args: readonly string[], io: Io): Promise<Exit> {
  const { values, positionals } = readOptions(
    args,
    {
      units: { type: 'string' },
      book: { type: 'string' },
      json: { type: 'boolean' },
      help: { type: 'boolean', short: 'h' },
    },
    HELP,
  );
  if (values.help === true) {
    io.out(CALC_HELP);
    return EXIT.fine;
  }
  const fromInput = positionals.includes('-');
  if (fromInput && positionals.length > 1) throw new Usage('calc: either - or formulas, not both', HELP);
  if (positionals.length === 0) throw new Usage('calc: no formula given', HELP);
  const formulas = fromInput ? linesOf(await io.input()) : positionals;
  if (formulas.length === 0) throw new Usage('calc: standard input holds no formula', HELP);
  const blank = formulas.findIndex((formula) => formula.trim() === '');
  if (blank >= 0) throw new Usage(`calc: formula ${blank + 1} is empty`, HELP);

  const book = values.book === undefined ? undefined : await readBook(values.book);
  const engine = await openEngine({ bundlePath: io.bundlePath });
  if (values.units !== undefined) checkUnits(engine, values.units);
  const results = await engine.evaluate(formulas, {
    ...(book === undefined ? {} : { book }),
    ...(values.units === undefined ? {} : { unitsText: values.units }),
  });
  const readable = io.terminal && values.json !== true;
  for (const result of results) io.out(readable ? readableBlock(result, results.length > 1) : jsonLine(result));
  return results.some(hasError) ? EXIT.formulaError : EXIT.fine;
}

/** What can't be read is a slip of the caller. */
function checkUnits(engine: Engine, units: string): void {
  try {
    engine.readSettings(units);
  } catch (thrown) {
    throw new Usage(`--units: ${wordsOf(thrown)}`, HELP);
  }
}

function linesOf(text: string): string[] {
  return text
    .replace(/^\uFEFF/, '')
    .split(/\r?\n/)
    .map((line) => line.trim())
    .filter((line) => line !== '');
}

async function readBook(file: string): Promise<Book> {
  try {
    return (await readXlsx(await readFile(file))).book;
  } catch (thrown) {
    throw new Usage(`--book ${file}: ${wordsOf(thrown)}`, HELP);
  }
}
