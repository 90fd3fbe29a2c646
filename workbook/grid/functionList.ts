/** `functions.json`, as far as grid and engine read it. */
export interface FunctionList {
  readonly functions: readonly FunctionEntry[];
}

export interface FunctionEntry {
  readonly id: string;
  readonly name: string;
  readonly description?: string;
  readonly helpUrl?: string;
  readonly parameters: readonly ParameterEntry[];
  readonly options?: { readonly requiresAddress?: boolean; readonly requiresParameterAddresses?: boolean };
}

export interface ParameterEntry {
  readonly name: string;
  readonly description?: string;
  readonly dimensionality?: string;
  readonly optional?: boolean;
  readonly repeating?: boolean;
}

/** Every cell function is called `LATENTRY.` and its id. */
export const NAMESPACE = 'LATENTRY';

/** The full name of a function in a cell. */
export function cellName(entry: FunctionEntry): string {
  return `${NAMESPACE}.${entry.id}`;
}
