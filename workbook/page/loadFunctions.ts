import type { CellFunction, CustomFunctionsObject } from '../grid/customFunctions';
import type { FunctionList } from '../grid/functionList';

/** The cell functions: their list from `functions.json`, their code from the bundle that was loaded before. */
export async function loadFunctions(): Promise<{
  readonly list: FunctionList;
  readonly mappings: ReadonlyMap<string, CellFunction>;
}> {
  const response = await fetch('functions.json');
  if (!response.ok) throw new Error(`functions.json: the server answered ${response.status}`);
  const { CustomFunctions: shim } = globalThis as unknown as { CustomFunctions?: CustomFunctionsObject };
  if (shim === undefined) throw new Error('host-shim.js was not loaded');
  return { list: (await response.json()) as FunctionList, mappings: shim.mappings };
}
