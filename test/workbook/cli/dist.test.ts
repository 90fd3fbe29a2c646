import { execFile } from 'node:child_process';
import { mkdtemp, readFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { beforeAll, describe, expect, it } from 'vitest';
import type { Book } from '../../../workbook/book';
import { readXlsx } from '../../../workbook/file/readXlsx';
import { built } from '../../built';

/** The command as it is shipped, with the functions as they are shipped. */
let command = '';
let folder = '';

beforeAll(async () => {
  command = path.join(await built('latentry.cjs', 'functions.js', 'functions.json'), 'latentry.cjs');
  folder = await mkdtemp(path.join(tmpdir(), 'latentry-dist-'));
}, 300_000);

function latentry(...args: string[]): Promise<{ exit: number; out: string; err: string }> {
  return new Promise((resolve) => {
    execFile(process.execPath, [command, ...args], { cwd: folder }, (error, out, err) => {
      resolve({ exit: error === null ? 0 : Number(error.code), out, err });
    });
  });
}

async function book(file: string): Promise<Book> {
  return (await readXlsx(await readFile(path.join(folder, file)))).book;
}

describe('the shipped command', { timeout: 120_000 }, () => {
  it('answers with the latent heat of water', async () => {
    const { exit, out } = await latentry('calc', 'LATENTRY.LATENT("water","vaporization",60)');
    const { value } = JSON.parse(out) as { value: number };
    // IAPWS R6-95(2018) along saturation at 333.15 K, to the two decimals that the README prints: half of the last.
    expect(Math.abs(value - 2357.65)).toBeLessThanOrEqual(0.005);
    expect(exit).toBe(0);
  });

  it('follows --units: per amount and per mass differ by the molar mass', async () => {
    const formula = 'LATENTRY.LATENT("water","vaporization",333.15)';
    const value = async (units: string) =>
      (JSON.parse((await latentry('calc', formula, '--units', units)).out) as { value: number }).value;
    const ratio = (await value('temperature=K; heat=J/mol')) / (await value('temperature=K; heat=J/g'));
    // M = 18.015268 g/mol, IAPWS R6-95(2018) section 2; two divisions and one product may each round once.
    expect(Math.abs(ratio - 18.015268)).toBeLessThanOrEqual(4 * Number.EPSILON * 18.015268);
  });

  it('refuses what is out of range with words, and exits 1', async () => {
    const { exit, out } = await latentry('calc', 'LATENTRY.LATENT("water","vaporization",600)');
    expect(JSON.parse(out)).toMatchObject({
      error: '#N/A',
      message: expect.stringContaining('600 degC is outside') as string,
    });
    expect(exit).toBe(1);
  });

  it('answers every check of SELFCHECK with pass', async () => {
    const { out } = await latentry('calc', 'LATENTRY.SELFCHECK()');
    const { values } = JSON.parse(out) as { values: unknown[][] };
    expect(values.length).toBeGreaterThan(10);
    for (const row of values.slice(1)) expect(row).toContain('pass');
  });

  it('writes the standard workbook with every formula calculated, the same as it calculates it again', async () => {
    const { exit, out, err } = await latentry('new', '-o', 'standard.xlsx');
    expect([exit, out, err]).toEqual([0, 'wrote standard.xlsx\n', '']);
    const { sheets } = await book('standard.xlsx');
    const formulas = sheets.flatMap((sheet) =>
      Object.entries(sheet.cells)
        .filter(([, cell]) => cell.formula !== undefined)
        .map(([address, cell]) => ({ reference: `'${sheet.name}'!${address}`, value: cell.value })),
    );
    expect(formulas.length).toBeGreaterThan(10);
    const again = await latentry('calc', '--book', 'standard.xlsx', ...formulas.map(({ reference }) => reference));
    const values = again.out.split('\n').slice(0, -1);
    expect(values.map((line) => JSON.parse(line) as unknown)).toEqual(
      formulas.map(({ reference, value }) => ({ formula: reference, value })),
    );
  });
});
