import { mkdtemp, rm } from 'node:fs/promises';
import path from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { build } from 'esbuild';

const here = path.dirname(fileURLToPath(import.meta.url));
const root = path.resolve(here, '../../..');

export const MODELS = [
  'fluid/constants',
  'fluid/gasFromPoints',
  'fluid/latentLine',
  'fluid/leeKesler',
  'fluid/liquidLine',
  'fluid/liquidVolume',
  'fluid/unpackFluid',
  'fluid/vapourModel',
  'fluid/wagner',
  'nasa9/nasa9Cp',
  'nasa9/nasa9Enthalpy',
  'nasa9/nasa9Source',
  'nasa9/nasa9Species',
];

/** The models of `core/fluid`, so that fit and product compute with the same equations. */
export async function loadModels(names = MODELS) {
  const scratch = await mkdtemp(path.join(root, 'node_modules/.catalogue-'));
  try {
    const outfile = path.join(scratch, 'models.mjs');
    await build({
      stdin: {
        contents: names.map((name) => `export * from './core/${name}';`).join('\n'),
        resolveDir: root,
        loader: 'ts',
      },
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
