declare const LATENTRY_EDITION: string | undefined;

/** Version of the functions; stamped by the build, `dev` where the sources run without one. */
export const EDITION: string = typeof LATENTRY_EDITION === 'string' ? LATENTRY_EDITION : 'dev';

/** Version of the built-in data: it changes with every number that an answer rests on. */
export const DATA_EDITION = '2026-12-01';
