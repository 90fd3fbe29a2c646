import path from 'node:path';
import { createRequire } from 'node:module';
import { fileURLToPath } from 'node:url';
import vm from 'node:vm';
import { buildSync } from 'esbuild';

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');

/** Loads one TypeScript module of the project, bundled in memory. */
export function loadModule(file) {
  const { outputFiles } = buildSync({
    entryPoints: [path.join(root, file)],
    bundle: true,
    write: false,
    format: 'cjs',
    platform: 'node',
    target: 'node20',
    logLevel: 'silent',
  });
  const module = { exports: {} };
  vm.runInThisContext(`(function (module, exports, require) {${outputFiles[0].text}\n})`)(
    module,
    module.exports,
    createRequire(import.meta.url),
  );
  return module.exports;
}

const list = (id, words) => ({
  id,
  type: 'string',
  values: words.map(([word, tooltip]) => ({ name: word, stringValue: word, tooltip })),
});

/** Changes between crystal forms, each with the substances that have it. */
function solidChanges(entries) {
  const owners = new Map();
  for (const entry of entries) {
    for (const change of entry.make().changes.filter((name) => name.includes('-'))) {
      owners.set(change, [...(owners.get(change) ?? []), entry.name]);
    }
  }
  return [...owners].sort(([a], [b]) => (a < b ? -1 : 1)).map(([change, names]) => [change, names.join(', ')]);
}

/** Autocomplete lists by parameter name, made from the catalogue at each build. */
export function enumLists() {
  const { catalogue, changeWords } = loadModule('core/catalogue/find.ts');
  const { methodNames } = loadModule('functions/estimating/methods.ts');
  const direction = { condensation: 'heat given up', freezing: 'heat given up', deposition: 'heat given up' };
  return {
    substance: list(
      'SUBSTANCE',
      catalogue.entries.map((s) => [s.name, `${s.formula}, CAS ${s.cas}`]),
    ),
    change: list('CHANGE', [
      ...changeWords.map((word) => [word, direction[word] ?? 'heat taken up']),
      ...solidChanges(catalogue.entries),
    ]),
    method: list(
      'METHOD',
      methodNames.map((name) => [name, 'an estimate with its typical error']),
    ),
    phase: list('PHASE', [
      ['solid', 'ice and other solids'],
      ['liquid', 'liquid'],
      ['gas', 'vapour'],
    ]),
  };
}
