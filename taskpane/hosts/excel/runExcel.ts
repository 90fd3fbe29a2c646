import type { HostError, Ref } from '../../port';
import { HostFailure } from '../hostFailure';

const REASONS: Readonly<Record<string, HostError['reason']>> = {
  AccessDenied: 'protected',
  InvalidOperationInCellEditMode: 'editing',
  ItemNotFound: 'no such sheet',
  InvalidArgument: 'bad reference',
  InvalidReference: 'bad reference',
  RequestPayloadSizeLimitExceeded: 'too large',
  ResponsePayloadSizeLimitExceeded: 'too large',
  RangeExceedsLimit: 'too large',
  RequestLimitExceeded: 'too large',
};

const NOWHERE: Ref = { sheet: '', address: 'A1' };

/** The platform's own code of an exception, or undefined for any other exception. */
export function excelCode(error: unknown): string | undefined {
  if (typeof error !== 'object' || error === null || !('code' in error)) return undefined;
  return typeof error.code === 'string' ? error.code : undefined;
}

/**
 * Runs one batch, waiting while a person edits a cell. What the platform reports in a known code becomes
 * a `HostFailure` at `ref`; everything else is thrown on as it is.
 */
export async function runExcel<T>(
  batch: (context: Excel.RequestContext) => Promise<T>,
  ref: Ref = NOWHERE,
  options: Excel.RunOptions = {},
): Promise<T> {
  try {
    return await Excel.run({ delayForCellEdit: true, ...options }, batch);
  } catch (error) {
    const reason = REASONS[excelCode(error) ?? ''];
    if (reason === undefined || error instanceof HostFailure) throw error;
    throw new HostFailure([{ reason, ref, text: error instanceof Error ? error.message : reason }]);
  }
}
