import { readFile } from 'node:fs/promises';
import path from 'node:path';

const TYPES = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.json': 'application/json; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.xml': 'application/xml; charset=utf-8',
  '.svg': 'image/svg+xml',
  '.png': 'image/png',
  '.md': 'text/plain; charset=utf-8',
};

/** A request handler that gives the files of one folder and nothing outside it. */
export function serveFolder(folder) {
  const root = path.resolve(folder) + path.sep;
  return async (request, response) => {
    const answer = (status, type, body) => {
      response.writeHead(status, {
        'Content-Type': type,
        'Cache-Control': 'no-cache',
        'X-Content-Type-Options': 'nosniff',
        // Excel on the web reads the function list from its own origin.
        'Access-Control-Allow-Origin': '*',
      });
      response.end(request.method === 'HEAD' ? undefined : body);
    };
    let file;
    try {
      const { pathname } = new URL(`https://localhost${request.url ?? '/'}`);
      file = path.resolve(root, `.${decodeURIComponent(pathname === '/' ? '/taskpane.html' : pathname)}`);
    } catch {
      answer(400, TYPES['.md'], 'bad address');
      return;
    }
    if (!file.startsWith(root)) {
      answer(404, TYPES['.md'], 'not found');
      return;
    }
    try {
      answer(200, TYPES[path.extname(file)] ?? 'application/octet-stream', await readFile(file));
    } catch {
      answer(404, TYPES['.md'], 'not found');
    }
  };
}
