/** What the host tells about the call itself. */
export interface Invocation {
  readonly address?: string;
  readonly parameterAddresses?: readonly (string | null | undefined)[];
}

export interface Received {
  /** Positional arguments with the invocation taken out; shorter than the signature when fewer were sent. */
  readonly args: readonly unknown[];
  readonly invocation: Invocation;
}

/**
 * The host pushes its invocation object after whatever arguments were sent, so with an older list of
 * functions it lands in the place of a later argument. Arguments are arrays or nothing: the one bare object is it.
 */
export function receive(raw: readonly unknown[]): Received {
  for (let i = raw.length - 1; i >= 0; i--) {
    const value = raw[i];
    if (typeof value === 'object' && value !== null && !Array.isArray(value) && !isCell(value)) {
      return { args: raw.slice(0, i), invocation: value };
    }
  }
  return { args: raw, invocation: {} };
}

/** Rich values and errors handed over bare (not in an array) are arguments. */
function isCell(value: object): boolean {
  return 'basicValue' in value || 'basicType' in value || 'code' in value;
}
