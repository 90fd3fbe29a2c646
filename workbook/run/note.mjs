import path from 'node:path';
import { root } from './root.mjs';

/** Where locks are kept: outside node_modules, which npm empties. */
export const lockFolder = path.join(root, '.latentry');

/** Says on standard error what goes on. */
export function note(text) {
  process.stderr.write(`latentry: ${text}\n`);
}
