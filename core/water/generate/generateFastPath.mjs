/**
 * Writes `core/water/fastPath.generated.ts`: Chebyshev pieces of the saturation and ice lines, fitted to the full
 * solution of the equations of state. Run with `--check` to compare with the committed file instead of writing it.
 */
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { build } from 'esbuild';
import { fitPieces } from './fitPieces.mjs';

const here = path.dirname(fileURLToPath(import.meta.url));
const root = path.resolve(here, '../../..');
const target = path.join(root, 'core/water/fastPath.generated.ts');

async function loadFullSolution() {
  const scratch = await mkdtemp(path.join(root, 'node_modules/.water-'));
  try {
    const outfile = path.join(scratch, 'full.mjs');
    const rooms = [
      'saturationLine',
      'iceEquilibriumLines',
      'lineTemperature',
      'phaseBranch',
      'iceState',
      'fluidCoefficients',
    ];
    const contents = [...rooms, 'saturationAuxiliary', 'chebyshevPieces', 'fastPathPlan', 'ranges']
      .map((name) => `export * from './core/water/${name}';`)
      .join('\n');
    await build({
      stdin: { contents, resolveDir: root, loader: 'ts' },
      bundle: true,
      platform: 'node',
      target: 'node20',
      format: 'esm',
      outfile,
      logLevel: 'warning',
    });
    return await import(pathToFileURL(outfile).href);
  } finally {
    await rm(scratch, { recursive: true, force: true });
  }
}

/** Every table: what it holds, where, on how many pieces of how many coefficients. Heats per mole, pressures as logarithms, temperatures inverse. */
function tablesOf(full) {
  const m = full.MOLAR_MASS;
  const heat = (t) => m * full.vaporizationHeat(t);
  const slope = (t) => m * full.vaporizationSlope(t);
  const lnLiquid = (t) => Math.log(full.liquidVapourPressure(t));
  const lnIce = (t) => Math.log(full.sublimationPressure(t));
  const liquid = full.phaseBranch('liquid', full.NORMAL_PRESSURE_PA);
  // the last piece ends above the melting point, where the equation of ice goes on smoothly
  const ice = (t) => full.iceState(t, full.NORMAL_PRESSURE_PA, full.emptyIceState());

  const { SUPERCOOLED_END_K, CRITICAL_TEMPERATURE_K, LN_PRESSURE_SCALE } = full;
  const fromCold = (f) => (distance) => f(SUPERCOOLED_END_K + distance);
  const fromCritical = (f) => (distance) => f(CRITICAL_TEMPERATURE_K - distance);
  const supercooled = { towardsEnd: full.SUPERCOOLED_PIECES };
  const critical = { towardsEnd: full.CRITICAL_PIECES };
  const middle = { range: [full.SUPERCOOLED_TO_K, full.CRITICAL_FROM_K], pieces: 10 };
  const sublimation = { range: [full.COLDEST_VAPOUR_K, full.TRIPLE_K], pieces: 10 };
  const melting = { range: [full.COLDEST_MELTING_K, full.TRIPLE_K], pieces: 8, terms: 11 };
  const lnCritical = Math.log(full.CRITICAL_PRESSURE_PA);
  return {
    SUPERCOOLED_HEAT: { ...supercooled, terms: 11, of: fromCold(heat) },
    SUPERCOOLED_SLOPE: { ...supercooled, terms: 12, of: fromCold(slope) },
    SUPERCOOLED_LN_PRESSURE: { ...supercooled, terms: 11, of: fromCold(lnLiquid) },
    VAPORIZATION_HEAT: { ...middle, terms: 12, of: heat },
    VAPORIZATION_SLOPE: { ...middle, terms: 13, of: slope },
    VAPORIZATION_LN_PRESSURE: { ...middle, terms: 12, of: lnLiquid },
    CRITICAL_HEAT: { ...critical, terms: 11, of: fromCritical(heat) },
    CRITICAL_SLOPE: { ...critical, terms: 11, of: fromCritical(slope) },
    CRITICAL_LN_PRESSURE: { ...critical, terms: 9, of: fromCritical(lnLiquid) },
    BOILING_INVERSE: {
      towardsEnd: full.BOILING_PIECES,
      terms: 10,
      of: (distance) => 1 / full.liquidVapourTemperature(Math.exp(lnCritical - distance / LN_PRESSURE_SCALE)),
    },
    SUPERCOOLED_INVERSE: {
      range: [
        lnLiquid(full.COLDEST_LIQUID_K),
        lnCritical - full.pieceTowardsEnd(full.BOILING_PIECES[1])[1] / LN_PRESSURE_SCALE,
      ],
      pieces: 8,
      terms: 12,
      of: (lnP) => 1 / full.liquidVapourTemperature(Math.exp(lnP)),
    },
    SUBLIMATION_HEAT: { ...sublimation, terms: 9, of: (t) => m * full.sublimationHeat(t) },
    SUBLIMATION_SLOPE: { ...sublimation, terms: 11, of: (t) => m * full.sublimationSlope(t) },
    SUBLIMATION_LN_PRESSURE: { ...sublimation, terms: 12, of: lnIce },
    FROST_INVERSE: {
      range: [lnIce(full.COLDEST_VAPOUR_K), lnIce(full.TRIPLE_K)],
      pieces: 6,
      terms: 12,
      of: (lnP) => 1 / full.sublimationTemperature(Math.exp(lnP)),
    },
    MELTING_HEAT: { ...melting, of: (t) => m * full.meltingHeat(t) },
    MELTING_SLOPE: { ...melting, of: (t) => m * full.meltingSlope(t) },
    FUSION_HEAT: { ...supercooled, terms: 11, of: fromCold((t) => m * (liquid.enthalpy(t) - ice(t).enthalpy)) },
    FUSION_SLOPE: { ...supercooled, terms: 12, of: fromCold((t) => m * (liquid.heatCapacity(t) - ice(t).cp)) },
  };
}

/** Pieces of equal width, or numbered pieces that widen with the distance from a singular end. */
function boundsOf({ range, pieces, towardsEnd }, full) {
  if (towardsEnd !== undefined) {
    const [first, last] = towardsEnd;
    return Array.from({ length: last - first + 1 }, (_, i) => full.pieceTowardsEnd(first + i));
  }
  const [from, to] = range;
  const at = (i) => from + ((to - from) * i) / pieces;
  return Array.from({ length: pieces }, (_, i) => [at(i), i + 1 === pieces ? to : at(i + 1)]);
}

export async function generateFastPath(report = () => {}) {
  const full = await loadFullSolution();
  const lines = [];
  for (const [name, table] of Object.entries(tablesOf(full))) {
    const bounds = boundsOf(table, full);
    const { step, counts, worst } = fitPieces(table.of, bounds, table.terms);
    report(
      `${name}: ${bounds.length} pieces of ${table.terms}, worst deviation ${worst.toExponential(1)} of its value`,
    );
    const [from, to] = table.towardsEnd ?? table.range;
    lines.push(
      `export const ${name}: ChebyshevData = { from: ${from}, to: ${to}, terms: ${table.terms}, step: ${step}, counts: [`,
      `${counts.join(',')}] };`,
    );
  }
  return `// Generated by core/water/generate/generateFastPath.mjs from the full solution: do not edit by hand.
import type { ChebyshevData } from './chebyshevPieces';

${lines.join('\n')}
`;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const text = await generateFastPath((line) => process.stderr.write(`${line}\n`));
  if (!process.argv.includes('--check')) await writeFile(target, text);
  else if ((await readFile(target, 'utf8')) !== text) {
    process.stderr.write(
      'core/water/fastPath.generated.ts is not what the equations give: run npm run generate:water\n',
    );
    process.exitCode = 1;
  }
}
