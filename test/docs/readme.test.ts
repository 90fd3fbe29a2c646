import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import * as library from '../../core/index';

const root = path.resolve(import.meta.dirname, '../..');
const readme = readFileSync(path.join(root, 'README.md'), 'utf8');

/** Rows of the table of formulas: formula, answer as printed, unit. */
const rows = [...readme.matchAll(/^\| `(=LATENTRY\..+?)` +\| (-?[\d.]+) +\| (.+?) +\|$/gm)].map((m) => ({
  formula: m[1] ?? '',
  answer: m[2] ?? '',
}));

/** Half a unit of the last digit that the page prints. */
const halfDigit = (printed: string): number => 0.5 * 10 ** -(printed.split('.')[1]?.length ?? 0);

describe('README', () => {
  it('says the answers that the command line gives', () => {
    expect(rows.length).toBeGreaterThanOrEqual(5);
    const command = path.join(root, 'dist/latentry.cjs');
    expect(existsSync(command), 'build first: npm run build').toBe(true);
    const input = rows.map((row) => row.formula).join('\n');
    const { stdout, status } = spawnSync(process.execPath, [command, 'calc', '-', '--json'], {
      input,
      encoding: 'utf8',
    });
    expect(status).toBe(0);
    const answers = stdout
      .trim()
      .split('\n')
      .map((line) => JSON.parse(line) as { formula: string; value: number });
    rows.forEach(({ formula, answer }, i) => {
      const value = answers[i]?.value ?? NaN;
      expect(
        Math.abs(value - Number(answer)),
        `${formula} gives ${value}, the page says ${answer}`,
      ).toBeLessThanOrEqual(halfDigit(answer));
    });
  });

  it('shows library code that runs', () => {
    const code = /```ts\n([\s\S]*?)```/.exec(readme)?.[1] ?? '';
    const imported = /import \{ (.+) \} from 'latentry'/.exec(code)?.[1]?.split(', ') ?? [];
    expect(imported.length).toBeGreaterThan(0);
    for (const name of imported) expect(Object.keys(library)).toContain(name);
    const value = library.evaluate(library.water.latent('vaporization', 'coexistence'), 333.15).value;
    // IAPWS R6-95: 2357.65 kJ/kg at 60 degC
    expect(Math.abs(value / library.water.molarMass / 1000 - 2357.65)).toBeLessThanOrEqual(0.005);
  });

  it('links to files that exist', () => {
    for (const page of ['README.md', 'DEVELOPERS.md']) {
      const text = readFileSync(path.join(root, page), 'utf8');
      for (const [, target = ''] of text.matchAll(/\]\((?!https?:)([^)#]+)[^)]*\)/g)) {
        expect(existsSync(path.join(root, target)), `${page} links to ${target}`).toBe(true);
      }
    }
  });
});
