import { buildSync, transformSync } from 'esbuild';
import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import vm from 'node:vm';
import { describe, expect, it } from 'vitest';

const root = path.resolve(import.meta.dirname, '../..');

/** Every TypeScript source of the core. */
function sources(folder: string): string[] {
  return readdirSync(path.join(root, folder), { withFileTypes: true }).flatMap((entry) => {
    const file = `${folder}/${entry.name}`;
    if (entry.isDirectory()) return sources(file);
    return file.endsWith('.ts') && !file.endsWith('.generated.ts') ? [file] : [];
  });
}

/** The bodies of the `@example` tags of a source file. */
function examples(text: string): string[] {
  return [...text.matchAll(/\/\*\*[\s\S]*?\*\//g)].flatMap(([comment]) => {
    const plain = comment.replace(/^\s*\/\*\*|\*\/\s*$/g, '').replace(/^[ \t]*\* ?/gm, '');
    return [...plain.matchAll(/^@example\s*([\s\S]*?)(?=^@|(?![\s\S]))/gm)].map((match) => match[1] ?? '');
  });
}

interface Claim {
  readonly shown: string;
  readonly value: unknown;
  readonly claimed: unknown;
}

/** The library, bundled once. */
const library = buildSync({
  entryPoints: [path.join(root, 'core/index.ts')],
  bundle: true,
  write: false,
  format: 'iife',
  globalName: 'latentry',
  target: 'node20',
}).outputFiles[0]?.text;

/** Runs an example, whose names are the library's, with every `expression // => value` line turned into a claim. */
function run(example: string): Claim[] {
  const code = example
    .split('\n')
    .filter((line) => !/^import .* from 'latentry';\s*$/.test(line))
    .map((line) => {
      const claim = /^(.*?);?\s*\/\/ => (.*)$/.exec(line);
      return claim === null ? line : `claim(${JSON.stringify(claim[1])}, (${claim[1] ?? ''}), (${claim[2] ?? ''}));`;
    })
    .join('\n');
  const claims: Claim[] = [];
  const claim = (shown: string, value: unknown, claimed: unknown): void => void claims.push({ shown, value, claimed });
  const context = vm.createContext({ claim });
  vm.runInContext(`${library ?? ''}; Object.assign(globalThis, latentry);`, context);
  vm.runInContext(transformSync(code, { loader: 'ts' }).code, context);
  return claims;
}

/** A number agrees when it rounds to the digits the page prints; everything else must be equal. */
function agrees(value: unknown, claimed: unknown): boolean {
  if (typeof value !== 'number' || typeof claimed !== 'number')
    return JSON.stringify(value) === JSON.stringify(claimed);
  const digits = String(claimed)
    .replace(/e.*$/, '')
    .replace(/^-?0?\.?0*/, '')
    .replace('.', '').length;
  return (
    Math.abs(value - claimed) <=
    0.5000001 * 10 ** (Math.floor(Math.log10(Math.abs(claimed) || 1)) - Math.max(digits, 1) + 1)
  );
}

const found = sources('core').flatMap((file) =>
  examples(readFileSync(path.join(root, file), 'utf8')).map((example) => ({ file, example })),
);

describe('examples in doc comments', () => {
  it('exist', () => {
    expect(found.length).toBeGreaterThan(5);
  });

  it.each(found)('$file', ({ example }) => {
    const claims = run(example);
    expect(claims.length, 'an example without a claim shows nothing').toBeGreaterThan(0);
    for (const { shown, value, claimed } of claims) {
      expect(
        agrees(value, claimed),
        `${shown} is ${JSON.stringify(value)}, the page says ${JSON.stringify(claimed)}`,
      ).toBe(true);
    }
  });
});
