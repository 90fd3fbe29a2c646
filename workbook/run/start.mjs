import { createServer } from 'node:http';
import path from 'node:path';
import { parseArgs } from 'node:util';
import { listen } from './listen.mjs';
import { note } from './note.mjs';
import { openBrowser } from './openBrowser.mjs';
import { root } from './root.mjs';
import { servePage } from './servePage.mjs';

const DEFAULT_PORT = 8437;

/** Serves the local page until it is told to stop. */
export async function start(args, { folder = path.join(root, 'dist') } = {}) {
  const options = startOptions(args);
  if (typeof options === 'string') {
    note(options);
    return 2;
  }
  const server = createServer(servePage(folder));
  const port = await listen(server, options.port);
  const url = `http://127.0.0.1:${port}/`;
  if (options.port !== 0 && port !== options.port) note(`port ${options.port} is busy`);
  process.stdout.write(`Latentry is at ${url}\nCtrl+C stops it.\n`);
  if (options.open) openBrowser(url);
  await new Promise((resolve) => {
    for (const signal of ['SIGINT', 'SIGTERM']) process.once(signal, resolve);
  });
  server.closeAllConnections();
  await new Promise((resolve) => server.close(resolve));
  return 0;
}

/** The options of `start`, or what is wrong with them. */
export function startOptions(args) {
  try {
    const { values } = parseArgs({ args, options: { port: { type: 'string' }, 'no-open': { type: 'boolean' } } });
    const port = Number(values.port ?? DEFAULT_PORT);
    if (!Number.isInteger(port) || port < 0 || port > 65_535)
      return `--port: allowed 0 to 65535; received ${values.port}`;
    return { port, open: values['no-open'] !== true };
  } catch (thrown) {
    return `start: ${thrown.message}`;
  }
}
