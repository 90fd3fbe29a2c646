import { buildSync } from 'esbuild';
import path from 'node:path';
import vm from 'node:vm';
import { gzipSync } from 'node:zlib';
import { catalogue } from '../../core/catalogue/find';
import { Problem } from '../../core/problem';
import { DEFAULT_SETTINGS, settingsRows } from '../../functions/settings/settings';
import { loadFunctions } from './loadFunctions';
import { race, readable, report } from './measure';

const root = path.join(import.meta.dirname, '../..');
const UNITS = settingsRows(DEFAULT_SETTINGS);
const ROWS = 100_000;

function bundled(stdin: string): string {
  const { outputFiles } = buildSync({
    stdin: { contents: stdin, resolveDir: root },
    bundle: true,
    minify: true,
    write: false,
    format: 'iife',
    target: 'es2020',
    loader: { '.ts': 'ts' },
  });
  return outputFiles[0]?.text ?? '';
}

/** The catalogue: what it weighs, how long it takes to load and to make, and spills of substances of each group. */
export function benchCatalogue(): void {
  const whole = bundled("export * from './core/catalogue/entries.ts'");
  const without = bundled("export * from './core/water/water.ts'");
  const weight = (text: string): number => gzipSync(text).length;
  process.stdout.write('\nCatalogue\n');
  const line = (name: string, text: string): void => void process.stdout.write(`  ${name.padEnd(58)} ${text}\n`);
  line('substances', String(catalogue.entries.length));
  line(
    'weight beside water (aim: at most 60 kB gzip)',
    `${((weight(whole) - weight(without)) / 1000).toFixed(1)} kB gzip`,
  );
  const seconds = (work: () => void): number => {
    const start = process.hrtime.bigint();
    work();
    return Number(process.hrtime.bigint() - start) / 1e9;
  };
  const loads = Array.from({ length: 7 }, () =>
    [whole, without].map((text) => seconds(() => void vm.runInNewContext(text))),
  );
  const median = (column: number): number => loads.map((row) => row[column] ?? NaN).sort((a, b) => a - b)[3] ?? NaN;
  line('loading, beside water (aim: under 10 ms)', readable(median(0) - median(1)));
  const makes = catalogue.entries.map((entry) => ({ name: entry.name, time: seconds(() => void entry.make()) }));
  makes.sort((a, b) => b.time - a.time);
  line('making one substance, longest', `${readable(makes[0]?.time ?? NaN)} (${makes[0]?.name ?? ''})`);
  line('making all of them', readable(makes.reduce((sum, { time }) => sum + time, 0)));

  const functions = loadFunctions();
  const call = (name: string, ...args: unknown[]): unknown => {
    const found = functions[name];
    if (found === undefined) throw new Error(`${name} is not in the bundle`);
    return found(...args, [UNITS], {});
  };
  const column = (fromK: number, toK: number): number[][] =>
    Array.from({ length: ROWS }, (_, i) => [fromK - 273.15 + ((toK - fromK) * (i + 0.5)) / ROWS]);
  const spills = [
    'water',
    'ethanol',
    'ammonia',
    'propane',
    'acetic acid',
    'mercury',
    'iron',
    'sodium nitrate',
    'n-octadecane',
  ]
    .map((name) => catalogue.entry(name))
    .filter((entry) => entry !== undefined)
    .flatMap((entry) => {
      const substance = entry.make();
      const change = substance.changes.includes('vaporization') ? 'vaporization' : 'fusion';
      const latent = substance.latent(change, substance.defaultKind(change));
      const rows = [
        {
          name: `${ROWS} rows of LATENT ${entry.name} ${change}`,
          run: () => call('LATENT', [[entry.name]], [[change]], column(latent.from, latent.to)),
        },
      ];
      for (const [what, ranged] of [
        ['HEATCAP', () => substance.heatCapacity('liquid', 101325)],
        ['SATPRESSURE', () => substance.saturationPressure('stable')],
      ] as const) {
        try {
          const curve = ranged();
          const cells = column(curve.from, curve.to);
          const keys = what === 'HEATCAP' ? [[[entry.name]], [['liquid']]] : [[[entry.name]]];
          const between = what === 'HEATCAP' ? [null, null] : [];
          rows.push({
            name: `${ROWS} rows of ${what} ${entry.name}`,
            run: () => call(what, ...keys, cells, ...between),
          });
        } catch (error) {
          if (!(error instanceof Problem)) throw error;
        }
      }
      return rows;
    });
  report(
    'Spills (aim: 100,000 rows under 150 ms)',
    race(
      spills.map((spill) => ({ ...spill, operations: 1 })),
      3,
    ),
  );
}
