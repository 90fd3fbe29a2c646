/** The host's `CustomFunctions` object, as small as the edge needs it, for tests without a browser. */
export class HostError extends Error {
  constructor(
    readonly code: string,
    message?: string,
  ) {
    super(message ?? '');
  }
}

Object.assign(globalThis, {
  CustomFunctions: {
    associate: () => undefined,
    Error: HostError,
    ErrorCode: { invalidValue: '#VALUE!', notAvailable: '#N/A' },
  },
});

/** Calls a cell function as a host does: every argument a matrix, settings as a list of matrices. */
export function call(
  // eslint-disable-next-line @typescript-eslint/no-explicit-any -- cell functions have signatures of any
  fn: (...args: any[]) => unknown,
  args: readonly unknown[],
  settings: readonly unknown[] = [],
): unknown {
  const matrix = (value: unknown): unknown => (value === undefined || Array.isArray(value) ? value : [[value]]);
  // Every cell function ends with the settings and the invocation.
  const positional = [...args.map(matrix), ...new Array<undefined>(Math.max(0, fn.length - 2 - args.length))];
  return fn(...positional, settings.map(matrix), {});
}

/** The single cell of a 1 × 1 result. */
export function cellOf(result: unknown): unknown {
  const table = result as unknown[][];
  if (table.length !== 1 || table[0]?.length !== 1) throw new Error(`expected one cell, got ${JSON.stringify(result)}`);
  return table[0][0];
}

/** The error that a call throws, as code and message. */
export function faultOf(run: () => unknown): { code: string; message: string } {
  try {
    const value = run();
    throw new Error(`expected an error, got ${JSON.stringify(value)}`);
  } catch (thrown) {
    if (thrown instanceof HostError) return { code: thrown.code, message: thrown.message };
    throw thrown;
  }
}
