import { readFile } from 'node:fs/promises';
import path from 'node:path';
import { Script } from 'node:vm';
import type { LatentryBundle } from '../../functions/index';
import { createCustomFunctions, type CellFunction } from '../grid/customFunctions';
import type { FunctionList } from '../grid/functionList';

/** The functions bundle, evaluated: what it lists, what it associated, what it offers to hosts. */
export interface LoadedBundle {
  readonly list: FunctionList;
  readonly mappings: ReadonlyMap<string, CellFunction>;
  readonly latentry: LatentryBundle;
}

/**
 * Evaluates the functions bundle in this process; `functions.json` is read from beside it.
 * The bundle keeps looking up `CustomFunctions` when it throws, so that global stays. (In a context of its own
 * every call of Math would go through an interceptor, some two hundred times slower.)
 * @param bundlePath Path of `functions.js`.
 * @throws Error where the files are missing or are no such bundle.
 */
export async function loadBundle(bundlePath: string): Promise<LoadedBundle> {
  const [source, list] = await Promise.all([
    readFile(bundlePath, 'utf8'),
    readFile(path.join(path.dirname(bundlePath), 'functions.json'), 'utf8'),
  ]);
  const customFunctions = createCustomFunctions();
  Object.assign(globalThis, { CustomFunctions: customFunctions });
  new Script(source, { filename: bundlePath }).runInThisContext();
  const latentry = (globalThis as { Latentry?: LatentryBundle }).Latentry;
  if (latentry === undefined || customFunctions.mappings.size === 0) {
    throw new Error(`${bundlePath} is no functions bundle: it associated no functions`);
  }
  return { list: JSON.parse(list) as FunctionList, mappings: customFunctions.mappings, latentry };
}
