import type { HostError } from '../port';

/** What a host's methods reject with when the workbook stands in the way. */
export class HostFailure extends Error {
  readonly errors: readonly HostError[];

  constructor(errors: readonly HostError[]) {
    super(errors.map((error) => error.text).join('; '));
    this.name = 'HostFailure';
    this.errors = errors;
  }
}
