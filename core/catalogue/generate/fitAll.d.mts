import type { Models } from './holdOut.mjs';

export function fitAll(models: Models): Promise<{ readonly fitted: readonly unknown[] }>;
