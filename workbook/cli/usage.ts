/** The command was called wrongly: what is wrong, and how to see what is right. */
export class Usage extends Error {
  /** @param help The help that tells more. */
  constructor(
    message: string,
    readonly help: string = 'latentry --help',
  ) {
    super(message);
    this.name = 'Usage';
  }
}

/** How a run of the command ended. */
export const EXIT = { fine: 0, formulaError: 1, usage: 2, defect: 3 } as const;

export type Exit = (typeof EXIT)[keyof typeof EXIT];
