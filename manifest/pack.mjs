// Makes a folder that any HTTPS server can serve: node manifest/pack.mjs https://host/path
import { cpSync, existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { copyOfficeFiles } from './officeFiles.mjs';
import { hostBase, stampBase } from './stampBase.mjs';

const here = path.dirname(fileURLToPath(import.meta.url));
const dist = path.join(path.dirname(here), 'dist');

/** What a build holds beside the files of the add-in. */
const NOT_SERVED = new Set(['addin', 'office', 'lib', 'latentry.cjs', '.stamp']);
const NEEDED = ['functions.js', 'functions.json', 'taskpane.js', 'taskpane.html', 'icons'];

/**
 * Packs a build into `target`: every address in the manifest and the function list leads to `base`.
 * @param {string} base address of the host folder, https
 * @param {string} [from] the build
 * @param {string} [target] the folder to make anew
 */
export function pack(base, from = dist, target = path.join(from, 'addin')) {
  const missing = NEEDED.filter((name) => !existsSync(path.join(from, name)));
  if (missing.length > 0) throw new Error(`the build lacks ${missing.join(', ')}; run: npm run build`);
  rmSync(target, { recursive: true, force: true });
  mkdirSync(target, { recursive: true });
  for (const name of readdirSync(from)) {
    if (!NOT_SERVED.has(name)) cpSync(path.join(from, name), path.join(target, name), { recursive: true });
  }
  copyOfficeFiles(target);
  const list = path.join(target, 'functions.json');
  writeFileSync(list, stampBase(readFileSync(list, 'utf8'), base));
  writeFileSync(
    path.join(target, 'manifest.xml'),
    stampBase(readFileSync(path.join(here, 'manifest.xml'), 'utf8'), base),
  );
  return target;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  try {
    if (process.argv.length !== 3) throw new Error('usage: node manifest/pack.mjs https://host/path');
    const base = hostBase(process.argv[2]);
    const target = pack(base);
    console.error(`Packed into ${path.relative(process.cwd(), target)}. Serve it at ${base}/ with the header`);
    console.error('  Access-Control-Allow-Origin: *');
    console.error('(Excel on the web reads functions.json from another origin), and give people its manifest.xml.');
  } catch (error) {
    console.error(error.message);
    process.exitCode = 2;
  }
}
