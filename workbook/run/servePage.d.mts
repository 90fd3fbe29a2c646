import type { IncomingMessage, ServerResponse } from 'node:http';
export const CONTENT_POLICY: string;
export function servePage(folder: string): (request: IncomingMessage, response: ServerResponse) => Promise<void>;
