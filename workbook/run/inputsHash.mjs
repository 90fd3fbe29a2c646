import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync } from 'node:fs';
import path from 'node:path';

const FOLDERS = ['core', 'functions', 'taskpane', 'workbook', 'manifest'];
const FILES = ['package.json', 'package-lock.json', 'tsconfig.json', 'tsconfig.lib.json', 'webpack.config.js'];

/** A hash of everything that a build is made of; any change of a name or a byte changes it. */
export function inputsHash(folder) {
  const hash = createHash('sha256');
  const add = (file) => {
    hash.update(`${file}\n`).update(
      createHash('sha256')
        .update(readFileSync(path.join(folder, file)))
        .digest(),
    );
  };
  for (const file of FILES) if (existsSync(path.join(folder, file))) add(file);
  for (const name of FOLDERS) for (const file of filesUnder(folder, name)) add(file);
  return hash.digest('hex');
}

function filesUnder(folder, name) {
  const at = path.join(folder, name);
  if (!existsSync(at)) return [];
  return readdirSync(at, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.relative(folder, path.join(entry.parentPath ?? entry.path, entry.name)).replaceAll('\\', '/'))
    .sort();
}
