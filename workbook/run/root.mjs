import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder that holds package.json. */
export const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');
