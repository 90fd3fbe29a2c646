import { readFileSync } from 'node:fs';
import path from 'node:path';
import vm from 'node:vm';

type CellFunction = (...args: unknown[]) => unknown;

/** The built bundle in this process, its functions by id. */
export function loadFunctions(): Readonly<Record<string, CellFunction | undefined>> {
  const mappings: Record<string, CellFunction> = {};
  class HostError extends Error {
    constructor(
      readonly code: string,
      message?: string,
    ) {
      super(message);
    }
  }
  Object.assign(globalThis, {
    CustomFunctions: { associate: (id: string, fn: CellFunction) => void (mappings[id] = fn), Error: HostError },
  });
  vm.runInThisContext(readFileSync(path.join(import.meta.dirname, '../../dist/functions.js'), 'utf8'));
  Latentry.house.publish({ state: 'absent' });
  Latentry.settings.publish({ state: 'absent' });
  return mappings;
}
