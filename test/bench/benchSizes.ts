import { buildSync } from 'esbuild';
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';

const root = path.join(import.meta.dirname, '../..');

const shown = (bytes: number): string => `${(bytes / 1000).toFixed(1)} kB gzip`;

function distSize(file: string): string {
  return shown(gzipSync(readFileSync(path.join(root, 'dist', file))).length);
}

/** What the pane needs before its first paint: its entry and everything imported with it, not what it loads later. */
function firstPaint(): { first: number; later: number } {
  const { outputFiles, metafile } = buildSync({
    entryPoints: [path.join(root, 'taskpane/pane/mount.tsx')],
    bundle: true,
    splitting: true,
    format: 'esm',
    minify: true,
    jsx: 'automatic',
    target: 'es2020',
    legalComments: 'none',
    define: { 'process.env.NODE_ENV': '"production"' },
    outdir: path.join(root, 'dist/bench'),
    metafile: true,
    write: false,
  });
  const outputs = new Map(Object.entries(metafile.outputs));
  const needed = new Set<string>();
  const visit = (name: string): void => {
    if (needed.has(name)) return;
    needed.add(name);
    for (const { path: next, kind } of outputs.get(name)?.imports ?? []) if (kind === 'import-statement') visit(next);
  };
  const entry = [...outputs].find(([, output]) => output.entryPoint?.endsWith('mount.tsx'))?.[0];
  if (entry === undefined) throw new Error('no bundle of the pane');
  visit(entry);
  let first = 0;
  let later = 0;
  for (const file of outputFiles) {
    const size = gzipSync(file.contents).length;
    if (needed.has(path.relative(process.cwd(), file.path))) first += size;
    else later += size;
  }
  return { first, later };
}

/** Sizes of what a host loads. */
export function benchSizes(): void {
  const { first, later } = firstPaint();
  const rows = [
    ['functions.js (aim: at most 160 kB with the catalogue)', distSize('functions.js')],
    ['pane, first paint with React (aim: at most 300 kB)', shown(first)],
    ['pane, loaded later (plot)', shown(later)],
    ['page.js, the grid and the local page', distSize('page.js')],
    ['latentry.cjs, command and headless engine', distSize('latentry.cjs')],
  ] as const;
  process.stdout.write('\nSizes\n');
  for (const [name, size] of rows) process.stdout.write(`  ${name.padEnd(58)} ${size}\n`);
}
