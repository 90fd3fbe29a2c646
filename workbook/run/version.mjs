import { readFileSync } from 'node:fs';

/** The edition of functions and data, as package.json says it. */
export const version = JSON.parse(readFileSync(new URL('../../package.json', import.meta.url), 'utf8')).version;
