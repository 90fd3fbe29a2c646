import { createHash } from 'node:crypto';
import { readFile, realpath, stat } from 'node:fs/promises';
import path from 'node:path';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';

const TYPES = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.json': 'application/json; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.svg': 'image/svg+xml',
  '.png': 'image/png',
  '.woff2': 'font/woff2',
  '.txt': 'text/plain; charset=utf-8',
  '.xlsx': 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
};

/** Scripts come from here and from nowhere else, and no text becomes code; the grid and the pane write style elements. */
export const CONTENT_POLICY = [
  "default-src 'none'",
  "script-src 'self'",
  "style-src 'self' 'unsafe-inline'",
  "img-src 'self' data: blob:",
  "font-src 'self' data:",
  "connect-src 'self'",
  "worker-src 'self' blob:",
  "frame-ancestors 'none'",
  "base-uri 'none'",
  "form-action 'none'",
].join('; ');

const HEADERS = {
  'Content-Security-Policy': CONTENT_POLICY,
  'X-Content-Type-Options': 'nosniff',
  'Referrer-Policy': 'no-referrer',
  'Cross-Origin-Opener-Policy': 'same-origin',
};

const compress = {
  br: (bytes) => promisify(brotliCompress)(bytes, { params: { [constants.BROTLI_PARAM_QUALITY]: 5 } }),
  gzip: promisify(gzip),
};

/** Smaller files are not worth it. */
const LEAST_COMPRESSED_BYTES = 1024;

/** A request handler for the local page: the files of one folder and nothing outside it, to this computer only. */
export function servePage(folder) {
  /** Files as sent, by path and encoding, while the file on disk is the same. */
  const cache = new Map();

  const load = async (file, encoding) => {
    const { mtimeMs, size } = await stat(file);
    const key = `${file}\n${encoding}`;
    const known = cache.get(key);
    if (known?.mtimeMs === mtimeMs && known.size === size) return known;
    const bytes = await readFile(file);
    const etag = `"${createHash('sha256').update(bytes).digest('base64url').slice(0, 22)}-${encoding}"`;
    const body = encoding === 'identity' ? bytes : await compress[encoding](bytes);
    const entry = { mtimeMs, size, etag, body };
    cache.set(key, entry);
    return entry;
  };

  return async (request, response) => {
    const refuse = (status, words, more = {}) => {
      response.writeHead(status, { ...HEADERS, ...more, 'Content-Type': TYPES['.txt'], 'Cache-Control': 'no-store' });
      response.end(request.method === 'HEAD' ? undefined : words);
    };
    try {
      // A foreign site's name that resolves to this computer gets nothing.
      if (!isLocal(request.headers.host)) return refuse(403, 'this page is for this computer only');
      if (request.method !== 'GET' && request.method !== 'HEAD')
        return refuse(405, 'GET or HEAD', { Allow: 'GET, HEAD' });
      const file = await fileOf(folder, request.url ?? '/');
      if (file === null) return refuse(404, 'not found');
      const type = TYPES[path.extname(file)];
      const { size } = await stat(file);
      const encoding =
        size < LEAST_COMPRESSED_BYTES || !isText(type) ? 'identity' : wanted(request.headers['accept-encoding']);
      const { body, etag } = await load(file, encoding);
      const headers = {
        ...HEADERS,
        'Content-Type': type,
        ETag: etag,
        Vary: 'Accept-Encoding',
        'Cache-Control': isHashed(file) ? 'public, max-age=31536000, immutable' : 'no-cache',
        ...(encoding === 'identity' ? {} : { 'Content-Encoding': encoding }),
      };
      if (request.headers['if-none-match'] === etag) {
        response.writeHead(304, headers);
        response.end();
        return undefined;
      }
      response.writeHead(200, { ...headers, 'Content-Length': body.length });
      response.end(request.method === 'HEAD' ? undefined : body);
      return undefined;
    } catch (thrown) {
      return response.headersSent ? response.destroy(thrown) : refuse(500, 'the file could not be read');
    }
  };
}

/** The file for an address; null for what is outside the folder, hidden, of no known type, or not there. */
async function fileOf(folder, url) {
  let name;
  try {
    name = decodeURIComponent(url.replace(/[?#].*$/s, ''));
  } catch {
    return null;
  }
  const parts = name.split('/').filter((part) => part !== '');
  if (name.includes('\0') || name.includes('\\') || parts.some((part) => part.startsWith('.'))) return null;
  const file = path.join(folder, ...(parts.length === 0 ? ['index.html'] : parts));
  if (TYPES[path.extname(file)] === undefined) return null;
  try {
    const [inside, real] = await Promise.all([realpath(folder), realpath(file)]);
    return real.startsWith(inside + path.sep) && (await stat(real)).isFile() ? real : null;
  } catch {
    return null;
  }
}

function isLocal(host = '') {
  return /^(?:127\.0\.0\.1|localhost|\[::1\])(?::\d+)?$/i.test(host);
}

function isText(type) {
  return /^text\/|json|svg/.test(type);
}

function isHashed(file) {
  return /^chunk-.+-[0-9a-f]{8}\.js$/.test(path.basename(file));
}

function wanted(accepted = '') {
  const names = accepted.split(',').map((part) => part.trim().replace(/;.*$/, ''));
  return names.includes('br') ? 'br' : names.includes('gzip') ? 'gzip' : 'identity';
}
