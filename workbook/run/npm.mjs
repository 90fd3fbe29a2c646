import { spawn } from 'node:child_process';
import path from 'node:path';
import { root } from './root.mjs';

/** Runs npm itself, the one that runs us where there is one; what it prints goes to standard error unless told. */
export function npm(args, env = process.env, stdio = ['ignore', 2, 2]) {
  const own = process.env.npm_execpath ?? '';
  const isNpm = path.basename(own) === 'npm-cli.js';
  if (isNpm) return exitCode(spawn(process.execPath, [own, ...args], { cwd: root, env, stdio }));
  const windows = process.platform === 'win32';
  const command = windows ? 'npm.cmd' : 'npm';
  return exitCode(spawn(command, args, { cwd: root, env, stdio, shell: windows }));
}

/** Runs a script of ours or of a package with this Node; input and output are ours. */
export function node(args, env = process.env, stdio = 'inherit') {
  return exitCode(spawn(process.execPath, args, { cwd: root, env, stdio }));
}

/** @returns {Promise<number>} */
export function exitCode(child) {
  const pass = (signal) => () => child.kill(signal);
  const handlers = ['SIGINT', 'SIGTERM', 'SIGHUP'].map((signal) => [signal, pass(signal)]);
  for (const [signal, handler] of handlers) process.on(signal, handler);
  return new Promise((resolve, reject) => {
    child.on('error', reject);
    child.on('close', (code, signal) => {
      for (const [name, handler] of handlers) process.off(name, handler);
      resolve(code ?? (signal === 'SIGINT' ? 130 : 1));
    });
  });
}
