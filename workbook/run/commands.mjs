import path from 'node:path';
import { build } from './build.mjs';
import { install } from './install.mjs';
import { node, npm } from './npm.mjs';
import { note } from './note.mjs';
import { root } from './root.mjs';
import { start } from './start.mjs';

const at = (file) => path.join(root, file);

const COMMANDS = {
  start,
  latentry: (args) => node([at('dist/latentry.cjs'), ...args]),
  test,
  excel: (args) => node([at('manifest/excel.mjs'), ...args]),
  bench: (args) => node([at('test/bench/bench.mjs'), ...args]),
};

/** Runs one command of the project; gives its exit code. */
export async function run([name, ...args]) {
  const command = Object.hasOwn(COMMANDS, name ?? '') ? COMMANDS[name] : undefined;
  if (command === undefined) {
    note(`no command ${name ?? ''}; allowed ${Object.keys(COMMANDS).join(', ')}`);
    return 2;
  }
  try {
    await install();
    await build();
    return await command(args);
  } catch (thrown) {
    note(thrown.message);
    return 3;
  }
}

/** Everything that a change has to pass, or only the parts that are named. */
async function test(parts) {
  for (const part of parts.length === 0 ? ['check'] : parts) {
    const status = await npm(['run', '--silent', part], withoutNodeEnv(), 'inherit');
    if (status !== 0) return status;
  }
  return 0;
}

/** Tests run the development side of libraries, whatever the shell says. */
function withoutNodeEnv() {
  const { NODE_ENV: _left, ...rest } = process.env;
  return rest;
}
