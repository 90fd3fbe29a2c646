import { writeFile } from 'node:fs/promises';
import { openEngine } from '../engine/openEngine';
import { writeXlsx } from '../file/writeXlsx';
import { standardBook } from '../standard/standardBook';
import { NEW_HELP } from './help';
import type { Io } from './io';
import { readOptions } from './readOptions';
import { EXIT, Usage, type Exit } from './usage';
import { wordsOf } from './wordsOf';

const HELP = 'latentry new --help';

/** So many cells with an error are named. */
const SHOWN = 5;

/** `latentry new`: writes the standard workbook, calculated. */
export async function newBook(args: readonly string[], io: Io): Promise<Exit> {
  const { values, positionals } = readOptions(
    args,
    {
      output: { type: 'string', short: 'o' },
      force: { type: 'boolean' },
      help: { type: 'boolean', short: 'h' },
    },
    HELP,
  );
  if (values.help === true) {
    io.out(NEW_HELP);
    return EXIT.fine;
  }
  const [extra] = positionals;
  if (extra !== undefined) throw new Usage(`new: what is ${extra}? the file to write follows -o`, HELP);
  const file = values.output;
  if (file === undefined) throw new Usage('new: no file given; say where with -o FILE.xlsx', HELP);
  if (!/\.xlsx$/i.test(file)) throw new Usage(`new: the file is to end in .xlsx; received ${file}`, HELP);

  const engine = await openEngine({ bundlePath: io.bundlePath });
  const book = await engine.calculate(standardBook({ revisionDate: today() }));
  try {
    await writeFile(file, writeXlsx(book), { flag: values.force === true ? 'w' : 'wx' });
  } catch (thrown) {
    throw new Usage(`new: ${file}: ${wordsOf(thrown)}`, HELP);
  }
  const failed = book.sheets.flatMap((sheet) =>
    Object.entries(sheet.cells)
      .filter(([, { value }]) => typeof value === 'object' && value !== null)
      .map(([address]) => `${sheet.name}!${address}`),
  );
  io.out(`wrote ${file}\n`);
  if (failed.length === 0) return EXIT.fine;
  const more = failed.length > SHOWN ? `, and ${failed.length - SHOWN} more` : '';
  io.err(`latentry: errors in ${failed.slice(0, SHOWN).join(', ')}${more}\n`);
  return EXIT.formulaError;
}

function today(): string {
  const now = new Date();
  const two = (number: number) => String(number).padStart(2, '0');
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}
