import { buildSync } from 'esbuild';
import path from 'node:path';
import { createRequire } from 'node:module';
import { fileURLToPath } from 'node:url';
import vm from 'node:vm';

/** Bundles the benchmark in memory and runs it: `npm run bench`, or `npm run bench -- core` for one part. */
const here = path.dirname(fileURLToPath(import.meta.url));
const { outputFiles } = buildSync({
  entryPoints: [path.join(here, 'bench.ts')],
  bundle: true,
  write: false,
  format: 'cjs',
  platform: 'node',
  target: 'node20',
  loader: { '.css': 'empty' },
  external: ['esbuild', 'mathjs', 'simple-statistics', 'ml-regression-simple-linear', 'playwright-core'],
  define: { 'import.meta.dirname': JSON.stringify(here) },
});
const run = vm.runInThisContext(`(function (require, module, exports) {${outputFiles[0].text}\n})`, {
  filename: 'bench.js',
});
const module = { exports: {} };
run(createRequire(import.meta.url), module, module.exports);
await module.exports.bench(process.argv.slice(2));
