import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { whyNot } from '../../manifest/excel.mjs';
import { pack } from '../../manifest/pack.mjs';
import { serveFolder } from '../../manifest/serveFolder.mjs';
import { hostBase, stampBase } from '../../manifest/stampBase.mjs';

const room = path.resolve(import.meta.dirname, '../../manifest');

describe('hostBase', () => {
  it('takes https folders and drops the closing slash', () => {
    expect(hostBase('https://host.example/path/')).toBe('https://host.example/path');
    expect(hostBase('https://host.example')).toBe('https://host.example');
  });

  it.each([
    'http://host.example',
    'host.example',
    'https://host.example/?a=1',
    'https://host.example/#a',
    'https://a@host.example',
  ])('refuses %s', (text) => {
    expect(() => hostBase(text)).toThrow(/allowed https.*received/);
  });
});

describe('stampBase', () => {
  it('moves every local address, and writes it as the kind of file needs it', () => {
    const base = 'https://host.example/a&b';
    expect(stampBase('{"helpUrl":"https://localhost:3000/help/x.html"}', base)).toBe(
      '{"helpUrl":"https://host.example/a&b/help/x.html"}',
    );
    expect(stampBase('<a b="https://localhost:3000/x"/>', base)).toBe('<a b="https://host.example/a&amp;b/x"/>');
  });
});

describe('pack', () => {
  let build: string;
  beforeAll(() => {
    build = mkdtempSync(path.join(os.tmpdir(), 'pack-'));
    mkdirSync(path.join(build, 'icons'));
    mkdirSync(path.join(build, 'lib'));
    const files = {
      'functions.js': 'code',
      'functions.json': '{"functions":[{"helpUrl":"https://localhost:3000/help/latent.html"}]}',
      'taskpane.js': 'code',
      'taskpane.html': '<html></html>',
      'latentry.cjs': 'not for a server',
      'icons/icon-16.png': 'picture',
      'lib/index.js': 'not for a server',
    };
    for (const [name, text] of Object.entries(files)) writeFileSync(path.join(build, name), text);
  });
  afterAll(() => {
    rmSync(build, { recursive: true });
  });

  it('makes a folder ready to serve, with no local address and nothing of an earlier pack left in it', () => {
    mkdirSync(path.join(build, 'addin'));
    writeFileSync(path.join(build, 'addin', 'old.js'), 'old');
    const target = pack('https://host.example/latentry', build);
    expect(target).toBe(path.join(build, 'addin'));
    expect(existsSync(path.join(target, 'old.js'))).toBe(false);
    const read = (name: string) => readFileSync(path.join(target, name), 'utf8');
    expect(read('manifest.xml')).toContain('https://host.example/latentry/taskpane.html');
    expect(read('functions.json')).toContain('https://host.example/latentry/help/latent.html');
    for (const name of ['manifest.xml', 'functions.json']) expect(read(name)).not.toContain('localhost');
    expect(read('icons/icon-16.png')).toBe('picture');
    expect(existsSync(path.join(target, 'latentry.cjs'))).toBe(false);
    expect(existsSync(path.join(target, 'lib'))).toBe(false);
    // The platform's script asks for these by name.
    for (const name of ['office.js', 'o15apptofilemappingtable.js', 'en-us/office_strings.js', 'LICENSE.md']) {
      expect(existsSync(path.join(target, 'office', name)), name).toBe(true);
    }
    for (const name of ['excel-web-16.00.js', 'excel-win32-16.01.js', 'excel-mac-16.00.js']) {
      expect(existsSync(path.join(target, 'office', name)), name).toBe(true);
    }
  });

  it('says what a build lacks', () => {
    const empty = mkdtempSync(path.join(os.tmpdir(), 'pack-'));
    expect(() => pack('https://host.example', empty)).toThrow('the build lacks functions.js');
    rmSync(empty, { recursive: true });
  });

  it('says how to use it, with exit code 2', () => {
    const run = spawnSync(process.execPath, [path.join(room, 'pack.mjs')], { encoding: 'utf8' });
    expect(run.status).toBe(2);
    expect(run.stdout).toBe('');
    expect(run.stderr).toContain('usage: node manifest/pack.mjs https://host/path');
  });
});

describe('npm run excel', () => {
  it('says on other systems than Windows and macOS what to do instead', () => {
    expect(whyNot('win32')).toBeNull();
    expect(whyNot('darwin')).toBeNull();
    expect(whyNot('linux')).toContain('needs Excel on Windows or macOS; this is linux');
    expect(whyNot('linux')).toContain('npm start');
  });

  it.skipIf(whyNot(process.platform) === null)('ends with exit code 1 there and changes nothing', () => {
    const run = spawnSync(process.execPath, [path.join(room, 'excel.mjs')], { encoding: 'utf8' });
    expect(run.status).toBe(1);
    expect(run.stderr).toContain('needs Excel on Windows or macOS');
  });
});

describe('serveFolder', () => {
  let server: Server;
  let base: string;
  let outside: string;
  beforeAll(async () => {
    outside = mkdtempSync(path.join(os.tmpdir(), 'serve-'));
    const folder = path.join(outside, 'dist');
    mkdirSync(folder);
    writeFileSync(path.join(folder, 'taskpane.html'), 'pane');
    writeFileSync(path.join(folder, 'functions.json'), '{}');
    writeFileSync(path.join(outside, 'secret.txt'), 'secret');
    const serve = serveFolder(folder);
    server = createServer((request, response) => void serve(request, response));
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    base = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  });
  afterAll(async () => {
    await new Promise((resolve) => server.close(resolve));
    rmSync(outside, { recursive: true });
  });

  it('gives files with their type, to other origins too', async () => {
    const answer = await fetch(`${base}/functions.json?v=1`);
    expect(answer.status).toBe(200);
    expect(answer.headers.get('content-type')).toContain('application/json');
    expect(answer.headers.get('access-control-allow-origin')).toBe('*');
    expect(await (await fetch(base)).text()).toBe('pane');
  });

  it.each(['/none.js', '/..%2fsecret.txt', '/%2e%2e/secret.txt', '/%00', '/%zz', '/'.repeat(2) + 'secret.txt'])(
    'gives nothing for %s',
    async (address) => {
      const answer = await fetch(base + address);
      expect(answer.status).toBeGreaterThanOrEqual(400);
      expect(await answer.text()).not.toContain('secret');
    },
  );
});
