import { cpSync, existsSync, mkdirSync, readdirSync } from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';

/** Excel's part of the platform script, for every platform, without its debug builds. */
const SCRIPTS =
  /^(?:office|o15apptofilemappingtable|custom-functions-runtime|excel(?:webapp)?-[a-z0-9]+-?[0-9.]*(?:-core)?)\.js$/;
const LANGUAGE = /^[a-z]{2,3}(?:-[a-z0-9]+)+$/;

/** Copies the platform's own scripts, unchanged and with their licence, to `office/` of a folder that is served. */
export function copyOfficeFiles(folder) {
  const home = path.dirname(createRequire(import.meta.url).resolve('@microsoft/office-js/package.json'));
  const from = path.join(home, 'dist');
  const to = path.join(folder, 'office');
  mkdirSync(to, { recursive: true });
  for (const entry of readdirSync(from, { withFileTypes: true })) {
    const strings = path.join(entry.name, 'office_strings.js');
    if (entry.isFile() && SCRIPTS.test(entry.name)) cpSync(path.join(from, entry.name), path.join(to, entry.name));
    else if (entry.isDirectory() && LANGUAGE.test(entry.name) && existsSync(path.join(from, strings))) {
      cpSync(path.join(from, strings), path.join(to, strings));
    }
  }
  cpSync(path.join(from, 'telemetry', 'oteljs_agave.js'), path.join(to, 'telemetry', 'oteljs_agave.js'));
  cpSync(path.join(home, 'LICENSE.md'), path.join(to, 'LICENSE.md'));
}
