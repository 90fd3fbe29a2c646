import { readFileSync } from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';

const dist = path.join(import.meta.dirname, '../../dist');

function kilobytes(files: readonly string[]): string {
  const bytes = files.reduce((sum, file) => sum + gzipSync(readFileSync(path.join(dist, file))).length, 0);
  return `${(bytes / 1000).toFixed(1)} kB gzip`;
}

/** Sizes of what a host loads. */
export function benchSizes(): void {
  process.stdout.write('\nSizes\n');
  process.stdout.write(`  functions.js (aim: at most 100 kB)                        ${kilobytes(['functions.js'])}\n`);
  process.stdout.write(`  page.js, the grid and the local page                      ${kilobytes(['page.js'])}\n`);
  process.stdout.write(`  latentry.cjs, command and headless engine                 ${kilobytes(['latentry.cjs'])}\n`);
}
