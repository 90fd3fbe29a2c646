import { spawn } from 'node:child_process';
import { copyFile, mkdtemp, readFile, symlink, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { beforeAll, describe, expect, it } from 'vitest';
import { build } from 'esbuild';
import { emptySheet } from '../../../workbook/emptySheet';
import { readXlsx } from '../../../workbook/file/readXlsx';
import { writeXlsx } from '../../../workbook/file/writeXlsx';
import { smallBundle } from '../engine/smallBundle';

interface Ended {
  readonly exit: number | null;
  readonly out: string;
  readonly err: string;
  /** The lines of standard output as JSON. */
  readonly lines: readonly unknown[];
}

let folder = '';

beforeAll(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'latentry-cli-'));
  const bundle = path.dirname(await smallBundle());
  for (const file of ['functions.js', 'functions.json'])
    await copyFile(path.join(bundle, file), path.join(folder, file));
  await build({
    entryPoints: ['workbook/cli/main.ts'],
    outfile: path.join(folder, 'latentry.cjs'),
    bundle: true,
    platform: 'node',
    format: 'cjs',
    target: 'node20',
    define: { LATENTRY_EDITION: '"0.0.1"' },
    logLevel: 'error',
  });
}, 60_000);

/** Runs the command as people do: a process of its own, output into a pipe. */
function latentry(args: readonly string[], input = '', file = 'latentry.cjs'): Promise<Ended> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, [path.join(folder, file), ...args], { cwd: folder });
    let out = '';
    let err = '';
    child.stdout.setEncoding('utf8').on('data', (chunk: string) => (out += chunk));
    child.stderr.setEncoding('utf8').on('data', (chunk: string) => (err += chunk));
    child.on('error', reject);
    child.on('close', (exit) => {
      const lines = out.split('\n').slice(0, -1);
      resolve({
        exit,
        out,
        err,
        lines: lines.map((line) => (line.startsWith('{') ? JSON.parse(line) : line) as unknown),
      });
    });
    child.stdin.end(input);
  });
}

describe('latentry calc', { timeout: 60_000 }, () => {
  it('prints a JSON line a formula into a pipe, in the order given, and exits 0', async () => {
    const { exit, lines, err } = await latentry(['calc', '1/3', '=LATENTRY.COLUMN(2)', '"a"&"b"', '1=1']);
    expect(lines).toEqual([
      { formula: '1/3', value: 1 / 3 },
      {
        formula: '=LATENTRY.COLUMN(2)',
        values: [
          [1, 'n1'],
          [2, 'n2'],
        ],
      },
      { formula: '"a"&"b"', value: 'ab' },
      { formula: '1=1', value: true },
    ]);
    expect([exit, err]).toEqual([0, '']);
  });

  it('exits 1 when a formula gave an error, and prints every line all the same', async () => {
    const { exit, lines, err } = await latentry([
      'calc',
      '--json',
      'LATENTRY.REFUSE("#N/A","outside")',
      'LATENTRY.MIXED()',
      '1+',
      '2',
    ]);
    expect(lines).toEqual([
      { formula: 'LATENTRY.REFUSE("#N/A","outside")', error: '#N/A', message: 'outside' },
      {
        formula: 'LATENTRY.MIXED()',
        values: [
          [1, { error: '#N/A', message: 'second is missing' }],
          ['', { error: '#VALUE!', message: 'the function gave no finite number' }],
          [true, ''],
        ],
      },
      { formula: '1+', error: '#VALUE!', message: 'brackets, quotes, commas or operators do not agree in =1+' },
      { formula: '2', value: 2 },
    ]);
    expect([exit, err]).toEqual([1, '']);
  });

  it('reads formulas from standard input, a line each, whatever ends the lines', async () => {
    const { exit, lines } = await latentry(['calc', '-'], '\uFEFF=1+1\r\n\r\n  LATENTRY.LATE(4)  \n"last"');
    expect(lines).toEqual([
      { formula: '=1+1', value: 2 },
      { formula: 'LATENTRY.LATE(4)', value: 8 },
      { formula: '"last"', value: 'last' },
    ]);
    expect(exit).toBe(0);
  });

  it('takes ten thousand lines', async () => {
    const { exit, lines } = await latentry(
      ['calc', '-'],
      Array.from({ length: 10_000 }, (_, i) => `${i}*2`).join('\n'),
    );
    expect(lines).toHaveLength(10_000);
    expect(lines[9999]).toEqual({ formula: '9999*2', value: 19_998 });
    expect(exit).toBe(0);
  });

  it('applies --units', async () => {
    const { lines } = await latentry(['calc', 'LATENTRY.SETTING("temperature")', '--units', 'temperature=K']);
    expect(lines).toEqual([{ formula: 'LATENTRY.SETTING("temperature")', value: 'K' }]);
  });

  it('lets formulas use the cells, names and settings of a workbook, which stays as it is', async () => {
    const book = {
      sheets: [
        {
          ...emptySheet('Feed tank'),
          cells: { A1: { value: 20 }, A2: { value: 22 }, B1: { value: null, formula: '=SUM(A1:A2)' } },
        },
        { ...emptySheet('Units'), cells: { A1: { value: 'Temperature' }, B1: { value: 'degF' } } },
      ],
      names: [
        { name: 'Latentry_units', formula: 'Units!$A$1:$B$1' },
        { name: 'feed', formula: "'Feed tank'!$A$1:$A$2" },
      ],
      styles: {},
      properties: {},
    };
    const file = path.join(folder, 'plant.xlsx');
    const bytes = writeXlsx(book);
    await writeFile(file, bytes);
    const formulas = ["'Feed tank'!B1", 'MAX(feed)', 'LATENTRY.SETTING("temperature")'];
    const { exit, lines } = await latentry(['calc', ...formulas, '--book', 'plant.xlsx']);
    expect(lines).toEqual([
      { formula: formulas[0], value: 42 },
      { formula: formulas[1], value: 22 },
      { formula: formulas[2], value: 'degF' },
    ]);
    expect(exit).toBe(0);
    expect(new Uint8Array(await readFile(file))).toEqual(bytes);
  });

  it('finds its functions when it is called through a link', async () => {
    await symlink(path.join(folder, 'latentry.cjs'), path.join(folder, 'linked'));
    expect((await latentry(['calc', '40+2'], '', 'linked')).lines).toEqual([{ formula: '40+2', value: 42 }]);
  });
});

describe('called wrongly, it exits 2 with words on standard error and nothing else', { timeout: 60_000 }, () => {
  it.each([
    [[], 'no command given'],
    [['calk'], 'no command calk; allowed calc, new; nearest: calc'],
    [['toString'], 'no command toString; allowed calc, new'],
    [['calc'], 'calc: no formula given'],
    [['calc', ''], 'calc: formula 1 is empty'],
    [['calc', '-'], 'calc: standard input holds no formula'],
    [['calc', '-', '1+1'], 'calc: either - or formulas, not both'],
    [['calc', '1+1', '--unit', 'x'], "Unknown option '--unit'"],
    [['calc', '-5+3'], 'a formula that starts with - needs its ='],
    [['calc', '1+1', '--units', 'colour=red'], '--units: unknown key colour'],
    [['calc', '1+1', '--book', 'missing.xlsx'], '--book missing.xlsx: no such file or folder'],
    [['calc', '1+1', '--book', 'functions.json'], '--book functions.json: '],
    [['new'], 'new: no file given; say where with -o FILE.xlsx'],
    [['new', '-o', 'book.txt'], 'new: the file is to end in .xlsx; received book.txt'],
    [['new', 'book.xlsx'], 'new: what is book.xlsx?'],
  ] as const)('latentry %j', async (args, words) => {
    const { exit, out, err } = await latentry(args);
    expect([exit, out]).toEqual([2, '']);
    expect(err).toContain(`latentry: `);
    expect(err).toContain(words);
    expect(err).toMatch(/\nMore: latentry .*--help\n$/);
  });
});

describe('help and version', { timeout: 60_000 }, () => {
  it.each([
    [['--help'], 'latentry COMMAND --help'],
    [['-h'], 'latentry COMMAND --help'],
    [['calc', '--help'], 'latentry calc FORMULA... [--units TEXT] [--book FILE.xlsx] [--json]'],
    [['new', '--help'], 'latentry new -o FILE.xlsx [--force]'],
  ] as const)('latentry %j', async (args, words) => {
    const { exit, out, err } = await latentry(args);
    expect([exit, err]).toEqual([0, '']);
    expect(out).toContain(words);
  });

  it('says its edition', async () => {
    expect(await latentry(['--version'])).toMatchObject({ exit: 0, out: '0.0.1\n', err: '' });
  });
});

describe('latentry new', { timeout: 60_000 }, () => {
  it('writes a workbook, not over one that is there, unless forced', async () => {
    const first = await latentry(['new', '-o', 'standard.xlsx']);
    // The small bundle lacks the functions of the standard workbook, and the command says so.
    expect(first.exit).toBe(1);
    expect(first.err).toMatch(/^latentry: errors in /);
    const { book } = await readXlsx(await readFile(path.join(folder, 'standard.xlsx')));
    expect(book.sheets.map((sheet) => sheet.name)).toContain('Latent heat');

    await writeFile(path.join(folder, 'mine.xlsx'), 'precious');
    const refused = await latentry(['new', '-o', 'mine.xlsx']);
    expect([refused.exit, refused.out]).toEqual([2, '']);
    expect(refused.err).toContain('new: mine.xlsx: the file is there already; --force writes over it');
    expect(await readFile(path.join(folder, 'mine.xlsx'), 'utf8')).toBe('precious');

    expect((await latentry(['new', '-o', 'mine.xlsx', '--force'])).out).toBe('wrote mine.xlsx\n');
    expect((await readFile(path.join(folder, 'mine.xlsx'))).subarray(0, 2).toString()).toBe('PK');
  });

  it('says where it cannot write', async () => {
    const { exit, err } = await latentry(['new', '-o', 'no/such/folder/book.xlsx']);
    expect(exit).toBe(2);
    expect(err).toContain('no such file or folder');
  });
});
