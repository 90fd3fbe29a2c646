import type { IncomingMessage, ServerResponse } from 'node:http';
export function serveFolder(folder: string): (request: IncomingMessage, response: ServerResponse) => Promise<void>;
