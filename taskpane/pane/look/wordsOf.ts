import { Problem } from '../../../core/problem';
import { HostFailure } from '../../hosts/hostFailure';

/** The words of an expected failure; a defect is thrown on, never shown as if it were the person's fault. */
export function wordsOf(error: unknown): string {
  if (error instanceof Problem || error instanceof HostFailure) return error.message;
  throw error;
}
