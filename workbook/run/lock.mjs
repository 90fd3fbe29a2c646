import { mkdirSync, readFileSync, renameSync, rmSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';

const POLL_MS = 200;
/** A lock without a process id in it is being written, unless it is older than this. */
const WRITING_MS = 5_000;

/**
 * Works while no other process holds the lock of that name; waits for its turn. The lock of a process that is gone
 * is taken over.
 * @param {string} folder Where locks are kept.
 * @param {string} name
 * @param {() => Promise<T>} work
 * @param {(holder: number) => void} [onWait] Told once which process is waited for.
 * @returns {Promise<T>}
 * @template T
 */
export async function withLock(folder, name, work, onWait = () => undefined) {
  mkdirSync(folder, { recursive: true });
  const file = path.join(folder, `${name}.lock`);
  for (let told = false; !take(file);) {
    const holder = holderOf(file);
    if (holder === 'gone') {
      removeStale(file);
      continue;
    }
    if (!told && typeof holder === 'number') {
      onWait(holder);
      told = true;
    }
    await new Promise((resolve) => setTimeout(resolve, POLL_MS));
  }
  try {
    return await work();
  } finally {
    rmSync(file, { force: true });
  }
}

function take(file) {
  try {
    writeFileSync(file, String(process.pid), { flag: 'wx' });
    return true;
  } catch (thrown) {
    if (thrown.code === 'EEXIST') return false;
    throw thrown;
  }
}

/** The process that holds the lock, `gone` where it ended without letting go, null where nobody can say yet. */
function holderOf(file) {
  try {
    const id = Number(readFileSync(file, 'utf8'));
    if (id > 0) return isAlive(id) ? id : 'gone';
    return Date.now() - statSync(file).mtimeMs > WRITING_MS ? 'gone' : null;
  } catch (thrown) {
    if (thrown.code === 'ENOENT') return null;
    throw thrown;
  }
}

function isAlive(id) {
  try {
    process.kill(id, 0);
    return true;
  } catch (thrown) {
    return thrown.code === 'EPERM';
  }
}

/** Two processes may find the same stale lock: only one renames it, and none removes a lock that is alive. */
function removeStale(file) {
  const aside = `${file}.${process.pid}`;
  try {
    renameSync(file, aside);
  } catch (thrown) {
    if (thrown.code === 'ENOENT') return;
    throw thrown;
  }
  if (holderOf(aside) === 'gone') rmSync(aside, { force: true });
  else renameSync(aside, file);
}
