import { spawn } from 'node:child_process';
import { mkdtemp, writeFile } from 'node:fs/promises';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { expect, it } from 'vitest';

it('serves on the next port where its own is busy, prints where, and ends when told', { timeout: 60_000 }, async () => {
  const folder = await mkdtemp(path.join(tmpdir(), 'latentry-start-'));
  await writeFile(path.join(folder, 'index.html'), '<!doctype html><title>page</title>');
  const busy = createServer();
  await new Promise<void>((resolve) => busy.listen(0, '127.0.0.1', resolve));
  const { port } = busy.address() as AddressInfo;

  const module = pathToFileURL(path.resolve('workbook/run/start.mjs')).href;
  const script = `import { start } from ${JSON.stringify(module)};
    process.exitCode = await start(['--no-open', '--port', '${port}'], { folder: ${JSON.stringify(folder)} });`;
  const child = spawn(process.execPath, ['--input-type=module', '-e', script]);
  const ended = new Promise<number | null>((resolve) => child.on('close', resolve));
  let err = '';
  child.stderr.setEncoding('utf8').on('data', (chunk: string) => (err += chunk));
  const url = await new Promise<string>((resolve) => {
    let out = '';
    child.stdout.setEncoding('utf8').on('data', (chunk: string) => {
      out += chunk;
      const found = /http:\/\/127\.0\.0\.1:\d+\//.exec(out);
      if (found !== null && out.includes('Ctrl+C')) resolve(found[0]);
    });
  });

  expect(Number(new URL(url).port)).toBeGreaterThan(port);
  expect(err).toBe(`latentry: port ${port} is busy\n`);
  expect(await (await fetch(url)).text()).toContain('<title>page</title>');
  child.kill('SIGINT');
  expect(await ended).toBe(0);
  busy.close();
});
