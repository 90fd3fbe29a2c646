/** The codes that a cell function may answer with; only `#VALUE!` and `#N/A` carry words. */
export const ERROR_CODES = {
  divisionByZero: '#DIV/0!',
  invalidName: '#NAME?',
  invalidNumber: '#NUM!',
  invalidReference: '#REF!',
  invalidValue: '#VALUE!',
  notAvailable: '#N/A',
  nullReference: '#NULL!',
} as const;

export type FunctionErrorCode = (typeof ERROR_CODES)[keyof typeof ERROR_CODES];

/** What a cell function throws, or puts into its result, to show an error in the cell. */
export class FunctionError extends Error {
  constructor(
    readonly code: FunctionErrorCode,
    message?: string,
  ) {
    super(message ?? '');
    this.name = 'CustomFunctions.Error';
  }
}

/** A cell function as the bundle associates it: arguments as Excel hands them over, then the invocation. */
export type CellFunction = (...args: unknown[]) => unknown;

/** The small part of the platform's `CustomFunctions` object that the functions bundle uses. */
export interface CustomFunctionsObject {
  associate(id: string, implementation: CellFunction): void;
  associate(implementations: Readonly<Record<string, CellFunction>>): void;
  readonly Error: typeof FunctionError;
  readonly ErrorCode: typeof ERROR_CODES;
  /** What was associated, by id in capital letters. */
  readonly mappings: ReadonlyMap<string, CellFunction>;
}

/**
 * Makes the `CustomFunctions` object that stands in for the platform's own where there is no Excel.
 * @example
 * const customFunctions = createCustomFunctions();
 * customFunctions.associate('TWICE', (x) => 2 * Number(x));
 * customFunctions.mappings.has('TWICE') // => true
 */
export function createCustomFunctions(): CustomFunctionsObject {
  const mappings = new Map<string, CellFunction>();
  return {
    associate(idOrMany: string | Readonly<Record<string, CellFunction>>, implementation?: CellFunction) {
      if (typeof idOrMany !== 'string') {
        for (const [id, each] of Object.entries(idOrMany)) mappings.set(id.toUpperCase(), each);
      } else if (implementation !== undefined) {
        mappings.set(idOrMany.toUpperCase(), implementation);
      }
    },
    Error: FunctionError,
    ErrorCode: ERROR_CODES,
    mappings,
  };
}
