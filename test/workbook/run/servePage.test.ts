import { mkdir, mkdtemp, symlink, writeFile } from 'node:fs/promises';
import { createServer, request as httpRequest, type IncomingHttpHeaders, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { brotliDecompressSync, gunzipSync } from 'node:zlib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { CONTENT_POLICY, servePage } from '../../../workbook/run/servePage.mjs';

let server: Server;
let port = 0;
const script = `// ${'x'.repeat(5000)}\n`;

beforeAll(async () => {
  const parent = await mkdtemp(path.join(tmpdir(), 'latentry-serve-'));
  const folder = path.join(parent, 'dist');
  await mkdir(path.join(folder, 'icons'), { recursive: true });
  await writeFile(path.join(parent, 'secret.txt'), 'outside');
  await writeFile(path.join(folder, '.stamp'), 'hidden');
  await writeFile(path.join(folder, 'index.html'), '<!doctype html><title>page</title>');
  await writeFile(path.join(folder, 'page.js'), script);
  await writeFile(path.join(folder, 'chunk-pane-0123abcd.js'), script);
  await writeFile(path.join(folder, 'latentry.cjs'), 'command');
  await writeFile(path.join(folder, 'icons/icon-16.png'), Buffer.from([0x89, 0x50]));
  await symlink(path.join(parent, 'secret.txt'), path.join(folder, 'link.txt'));
  server = createServer((incoming, response) => void servePage(folder)(incoming, response));
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  port = (server.address() as AddressInfo).port;
});

afterAll(() => {
  server.closeAllConnections();
  server.close();
});

interface Answer {
  readonly status: number | undefined;
  readonly headers: IncomingHttpHeaders;
  readonly body: Buffer;
}

/** Sends the path as it is: no client tidies it up first. */
function get(target: string, headers: Record<string, string> = {}, method = 'GET'): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const sent = httpRequest({ host: '127.0.0.1', port, path: target, method, headers }, (response) => {
      const chunks: Buffer[] = [];
      response.on('data', (chunk: Buffer) => chunks.push(chunk));
      response.on('end', () =>
        resolve({ status: response.statusCode, headers: response.headers, body: Buffer.concat(chunks) }),
      );
    });
    sent.on('error', reject);
    sent.end();
  });
}

describe('servePage', () => {
  it('gives files with their types, index.html for the root, queries left aside', async () => {
    const page = await get('/');
    expect([page.status, page.headers['content-type']]).toEqual([200, 'text/html; charset=utf-8']);
    expect(page.body.toString()).toContain('<title>page</title>');
    expect((await get('/page.js?v=1')).headers['content-type']).toBe('text/javascript; charset=utf-8');
    expect((await get('/icons/icon-16.png')).headers['content-type']).toBe('image/png');
  });

  it('sends the content policy with every answer, without unsafe-eval', async () => {
    expect(CONTENT_POLICY).not.toContain('unsafe-eval');
    expect(CONTENT_POLICY).toContain("frame-ancestors 'none'");
    for (const target of ['/', '/page.js', '/nothing.js']) {
      const { headers } = await get(target);
      expect(headers['content-security-policy']).toBe(CONTENT_POLICY);
      expect(headers['x-content-type-options']).toBe('nosniff');
    }
  });

  it.each([
    '/../secret.txt',
    '/%2e%2e/secret.txt',
    '/..%2fsecret.txt',
    '/icons/../../secret.txt',
    '/..%5csecret.txt',
    '//etc/passwd.txt',
    '/link.txt',
    '/.stamp',
    '/icons',
    '/latentry.cjs',
    '/%zz',
    '/page.js%00.png',
    '/nothing.html',
  ])('gives nothing for %s', async (target) => {
    const { status, body } = await get(target);
    expect(status).toBe(404);
    expect(body.toString()).toBe('not found');
  });

  it('compresses texts as asked, and what comes out is the file', async () => {
    const br = await get('/page.js', { 'accept-encoding': 'gzip, deflate, br' });
    expect(br.headers['content-encoding']).toBe('br');
    expect(brotliDecompressSync(br.body).toString()).toBe(script);
    const gz = await get('/page.js', { 'accept-encoding': 'gzip' });
    expect(gunzipSync(gz.body).toString()).toBe(script);
    const plain = await get('/page.js');
    expect(plain.headers['content-encoding']).toBeUndefined();
    expect(plain.body.toString()).toBe(script);
    expect(new Set([br, gz, plain].map(({ headers }) => headers.etag)).size).toBe(3);
  });

  it('asks to look again, except where the name tells the content', async () => {
    const first = await get('/page.js');
    expect(first.headers['cache-control']).toBe('no-cache');
    const again = await get('/page.js', { 'if-none-match': String(first.headers.etag) });
    expect([again.status, again.body.length]).toEqual([304, 0]);
    expect((await get('/chunk-pane-0123abcd.js')).headers['cache-control']).toContain('immutable');
  });

  it('answers HEAD without a body, refuses other methods and foreign names', async () => {
    const head = await get('/page.js', {}, 'HEAD');
    expect([head.status, head.body.length, head.headers['content-length']]).toEqual([200, 0, String(script.length)]);
    const post = await get('/', {}, 'POST');
    expect([post.status, post.headers.allow]).toEqual([405, 'GET, HEAD']);
    expect((await get('/', { host: 'rebound.example' })).status).toBe(403);
    expect((await get('/', { host: `localhost:${port}` })).status).toBe(200);
  });
});
