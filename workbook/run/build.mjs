import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { inputsHash } from './inputsHash.mjs';
import { withLock } from './lock.mjs';
import { npm } from './npm.mjs';
import { root } from './root.mjs';
import { lockFolder, note } from './note.mjs';

const OUTPUTS = ['functions.js', 'functions.json', 'index.html', 'page.js', 'latentry.cjs'];

/** Whether dist/ was built from the sources as they are. */
export function isBuilt(folder) {
  const stamp = path.join(folder, 'dist/.stamp');
  if (!existsSync(stamp) || !OUTPUTS.every((file) => existsSync(path.join(folder, 'dist', file)))) return false;
  return readFileSync(stamp, 'utf8') === inputsHash(folder);
}

/** Builds, unless dist/ is up to date. */
export async function build() {
  if (isBuilt(root)) return;
  await withLock(
    lockFolder,
    'build',
    async () => {
      if (isBuilt(root)) return;
      note('building');
      const stamp = path.join(root, 'dist/.stamp');
      rmSync(stamp, { force: true });
      const inputs = inputsHash(root);
      const status = await npm(['run', '--silent', 'build']);
      if (status !== 0) throw new Error(`the build ended with ${status}`);
      mkdirSync(path.dirname(stamp), { recursive: true });
      writeFileSync(stamp, inputs);
    },
    (holder) => note(`waiting for process ${holder}, which builds`),
  );
}
