import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

const STAMP = 'node_modules/.latentry-stamp';

/** What an installation depends on: the lock file, and the machine that its binaries are for. */
export function installStamp(folder) {
  const lock = readFileSync(path.join(folder, 'package-lock.json'));
  const machine = `${process.platform} ${process.arch} node ${process.versions.modules}`;
  return createHash('sha256').update(lock).update(machine).digest('hex');
}

/** Whether node_modules holds what the lock file says, by our stamp or by npm's own record. */
export function isInstalled(folder) {
  const stamp = path.join(folder, STAMP);
  if (existsSync(stamp)) return readFileSync(stamp, 'utf8') === installStamp(folder);
  if (!recordMatches(folder)) return false;
  writeInstallStamp(folder);
  return true;
}

export function writeInstallStamp(folder) {
  writeFileSync(path.join(folder, STAMP), installStamp(folder));
}

/** npm keeps a record of what it installed; a package left out (but for optional ones) or of another version tells. */
function recordMatches(folder) {
  const record = path.join(folder, 'node_modules/.package-lock.json');
  if (!existsSync(record)) return false;
  const wanted = JSON.parse(readFileSync(path.join(folder, 'package-lock.json'), 'utf8')).packages ?? {};
  const present = JSON.parse(readFileSync(record, 'utf8')).packages ?? {};
  return Object.entries(wanted).every(([place, { version, optional, devOptional, link }]) => {
    if (place === '' || link === true) return true;
    const found = present[place];
    return found === undefined ? optional === true || devOptional === true : found.version === version;
  });
}
