import { existsSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from '../workbook/run/build.mjs';

const dist = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../dist');
let ready: Promise<void> | undefined;

/**
 * The folder of the finished build, for tests that run what people run. `npm test` has built by then; a test run by
 * itself builds where files are missing, and otherwise takes the build as it is.
 * @param files Files that the test needs from it.
 */
export async function built(...files: readonly string[]): Promise<string> {
  if (!files.every((file) => existsSync(path.join(dist, file)))) await (ready ??= build());
  return dist;
}
