import { spawnSync } from 'node:child_process';
import path from 'node:path';
import { createRequire } from 'node:module';
import { fileURLToPath } from 'node:url';
import { buildSync } from 'esbuild';

/** Builds the library: `core/` as one ES module with its type declarations. */
const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');

buildSync({
  entryPoints: [path.join(root, 'core/index.ts')],
  outfile: path.join(root, 'dist/lib/latentry.js'),
  bundle: true,
  format: 'esm',
  target: 'es2020',
  minify: false,
  logLevel: 'warning',
});

const tsc = createRequire(import.meta.url).resolve('typescript/bin/tsc');
const declarations = ['-p', path.join(root, 'tsconfig.lib.json')];
const { status } = spawnSync(process.execPath, [tsc, ...declarations], { stdio: ['ignore', 2, 2] });
process.exitCode = status ?? 1;
