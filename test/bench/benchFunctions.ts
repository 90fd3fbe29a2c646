import { DEFAULT_SETTINGS, settingsRows } from '../../functions/settings/settings';
import { loadFunctions } from './loadFunctions';
import { race, readable, report } from './measure';

const UNITS = settingsRows(DEFAULT_SETTINGS);

/** Cell functions of the built bundle: single calls, and spills that must be linear in their rows. */
export function benchFunctions(): void {
  const { LATENT } = loadFunctions();
  if (LATENT === undefined) throw new Error('LATENT is not in the bundle');
  const substance = [['water']];
  const change = [['vaporization']];
  const calls = 5000;
  const repeat = (settings: unknown) => (): unknown => {
    let last: unknown;
    for (let i = 0; i < calls; i++) last = LATENT(substance, change, [[20 + (i % 300)]], settings, {});
    return last;
  };
  report(
    'A scalar cell call (aim: under 1 µs)',
    race([
      { name: 'LATENT with the ambient settings', operations: calls, run: repeat(undefined) },
      { name: 'LATENT with the Units block', operations: calls, run: repeat([UNITS]) },
      { name: 'LATENT with a settings text', operations: calls, run: repeat([[['heat=kJ/mol']]]) },
    ]),
  );
  const spill = (rows: number) => {
    const column = Array.from({ length: rows }, (_, i) => [1 + (370 * i) / rows]);
    return { name: `${rows} rows`, operations: 1, run: () => LATENT(substance, change, column, [UNITS], {}) };
  };
  const results = race([spill(1_000), spill(10_000), spill(100_000)], 9);
  report('A LATENT spill (aim: 100,000 rows under 30 ms, linear in rows)', results);
  for (const [i, rows] of [1_000, 10_000, 100_000].entries()) {
    process.stdout.write(`  per row of ${rows}: ${readable((results[i]?.seconds ?? NaN) / rows)}\n`);
  }
}
