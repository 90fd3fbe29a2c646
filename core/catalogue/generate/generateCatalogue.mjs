/**
 * Writes `core/catalogue/fluids/fluids.generated.ts`: numbers fitted to the cited values in `records/fluids.json`.
 *
 * `--check` compares with the committed file instead of writing it; `--report` prints every residual, the disagreement of each fluid's
 * data, and what the fits give for values that they have not seen.
 */
import { readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { format, resolveConfig } from 'prettier';
import { makeCitations } from './citations.mjs';
import { fitAll } from './fitAll.mjs';
import { loadForHoldOut } from './holdOut.mjs';
import { loadModels } from './loadModels.mjs';
import { packFluid } from './packFluid.mjs';
import { report } from './report.mjs';
import { sameNumbers } from './sameNumbers.mjs';

const here = path.dirname(fileURLToPath(import.meta.url));
const target = path.resolve(here, '../fluids/fluids.generated.ts');

async function generated(fitted, sources, models) {
  const citations = makeCitations(sources);
  const packed = fitted.map((one) => packFluid(models, one, citations));
  const text = [
    '// Written by core/catalogue/generate/generateCatalogue.mjs from records/fluids.json there. Do not edit.',
    '/** Full citations, which the fluids name by their place. */',
    `export const fluidSources: readonly string[] = ${JSON.stringify(citations.texts)};`,
    '',
    '/** Fields between bars, as `unpackFluid` reads them. */',
    `export const packedFluids: readonly string[] = ${JSON.stringify(packed)};`,
  ].join('\n');
  return format(text, { ...(await resolveConfig(target)), parser: 'typescript' });
}

const reporting = process.argv.includes('--report');
const models = reporting ? await loadForHoldOut() : await loadModels();
const { fitted, sources } = await fitAll(models);
if (reporting) {
  process.stdout.write(await report(models, fitted));
} else {
  const text = await generated(fitted, sources, models);
  if (process.argv.includes('--check')) {
    if (!sameNumbers(await readFile(target, 'utf8'), text)) {
      throw new Error(`${path.basename(target)} is not what its generator writes: run npm run catalogue`);
    }
    process.stdout.write(`${path.basename(target)} is up to date\n`);
  } else {
    await writeFile(target, text);
    process.stdout.write(`${path.basename(target)}: ${fitted.length} fluids, ${text.length} characters\n`);
  }
}
