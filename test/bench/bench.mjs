import { build } from 'esbuild';
import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import vm from 'node:vm';

/** Bundles the benchmark in memory and runs it: `npm run bench`, or `npm run bench -- core` for one part. */
const here = path.dirname(fileURLToPath(import.meta.url));

/** Each source keeps its own folder, as it would unbundled. */
const ownFolder = {
  name: 'own-folder',
  setup({ onLoad }) {
    onLoad({ filter: /[\\/](test|workbook)[\\/].*\.(ts|mjs)$/ }, async ({ path: file }) => {
      const text = await readFile(file, 'utf8');
      const contents = text
        .replaceAll('import.meta.dirname', JSON.stringify(path.dirname(file)))
        .replaceAll('import.meta.url', JSON.stringify(`file://${file}`));
      return { contents, loader: file.endsWith('.ts') ? 'ts' : 'js' };
    });
  },
};

const { outputFiles } = await build({
  entryPoints: [path.join(here, 'bench.ts')],
  bundle: true,
  write: false,
  format: 'cjs',
  platform: 'node',
  target: 'node20',
  loader: { '.css': 'empty' },
  plugins: [ownFolder],
  external: ['esbuild', 'mathjs', 'simple-statistics', 'ml-regression-simple-linear', 'playwright-core'],
});
const run = vm.runInThisContext(`(function (require, module, exports) {${outputFiles[0].text}\n})`, {
  filename: 'bench.js',
  importModuleDynamically: vm.constants?.USE_MAIN_CONTEXT_DEFAULT_LOADER,
});
const module = { exports: {} };
run(createRequire(import.meta.url), module, module.exports);
await module.exports.bench(process.argv.slice(2));
