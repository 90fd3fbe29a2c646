import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import webpack from 'webpack';
import { enumLists } from './enumLists.mjs';
import { helpPages } from './helpPages.mjs';

const here = path.dirname(fileURLToPath(import.meta.url));
const functionsRoom = path.dirname(here);

/** Every file of the room that defines a cell function: one function a file. */
export const functionFiles = readdirSync(functionsRoom)
  .filter((name) => name.endsWith('.ts'))
  .map((name) => path.join(functionsRoom, name))
  .filter((file) => readFileSync(file, 'utf8').includes('@customfunction'))
  .sort();

/** The ids that were ever released, in the order of their release: the list only grows. */
const released = JSON.parse(readFileSync(path.join(here, 'releasedIds.json'), 'utf8'));

/** Where help pages live; the packer stamps the host's address over the local one. */
const HELP_ROOT = 'https://localhost:3000/help/';

/**
 * Finishes functions.json after the metadata generator: lets error cells through, adds autocomplete lists, help
 * addresses and the help pages themselves, sorts by id, and refuses a function whose result is no matrix or whose id vanished.
 */
export class FunctionListPlugin {
  apply(compiler) {
    compiler.hooks.compilation.tap('FunctionListPlugin', (compilation) => {
      compilation.hooks.processAssets.tap(
        { name: 'FunctionListPlugin', stage: webpack.Compilation.PROCESS_ASSETS_STAGE_ADDITIONS },
        () => {
          const asset = compilation.getAsset('functions.json');
          if (asset === undefined) return;
          const list = JSON.parse(asset.source.source().toString());
          const { finished, errors } = finishFunctionList(list, released, enumLists());
          for (const error of errors) compilation.errors.push(new webpack.WebpackError(`functions.json: ${error}`));
          compilation.updateAsset('functions.json', new webpack.sources.RawSource(JSON.stringify(finished, null, 1)));
          for (const [name, html] of helpPages(finished))
            compilation.emitAsset(name, new webpack.sources.RawSource(html));
        },
      );
    });
  }
}

/** The pure part, for the tests. */
export function finishFunctionList(list, releasedIds, lists) {
  const errors = [];
  const functions = [...list.functions].sort((a, b) => (a.id < b.id ? -1 : 1));
  const ids = new Set(functions.map((f) => f.id));
  for (const id of releasedIds) if (!ids.has(id)) errors.push(`${id} was released and is gone`);
  for (const id of ids)
    if (!releasedIds.includes(id)) errors.push(`${id} is not in functions/build/releasedIds.json; append it`);
  const used = new Set();
  for (const f of functions) {
    if (f.result?.dimensionality !== 'matrix') errors.push(`${f.id}: the result is not a matrix`);
    if (!/^[A-Z][A-Z0-9]*$/.test(f.id)) errors.push(`${f.id}: ids are capital letters without a dot`);
    for (const parameter of f.parameters) {
      const words = lists[parameter.name];
      if (words === undefined) continue;
      parameter.customEnumId = words.id;
      parameter.type = 'string';
      used.add(parameter.name);
    }
    f.helpUrl = `${HELP_ROOT}${f.id.toLowerCase()}.html`;
  }
  const finished = { allowCustomDataForDataTypeAny: true, allowErrorForDataTypeAny: true, functions };
  if (used.size > 0) finished.enums = [...used].map((name) => lists[name]);
  return { finished, errors };
}
