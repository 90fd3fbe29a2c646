import type { LatentKind } from '../answer';
import { Problem } from '../problem';
import { FIT_ROWS } from './fitTable';
import type { FitBasis } from './fitTypes';

/** What a table of a fit says: enough to predict from it, with its units and kind as text. */
export interface FitFromTable extends FitBasis {
  readonly method: string;
  readonly kind: LatentKind | undefined;
  readonly substance: string | undefined;
  readonly temperatureUnit: string;
  readonly heatUnit: string;
  readonly heatCapacityUnit: string;
}

const KINDS: readonly LatentKind[] = ['coexistence', 'isobaric', 'standard'];

/**
 * Reads a fit back from the cells of its table.
 *
 * Rows are found by their labels in the first column, so rows added above, below or between do no harm.
 *
 * @param values the cells, row by row: label, value, standard uncertainty, lower, upper, unit, note
 * @returns what `latentFromFit` needs, with units and kind
 * @throws Problem of code `argument` naming the row that is missing or does not hold a number
 * @example
 * import { fitDeltaCp, fitTable, latentFromFit, readFitTable } from 'latentry';
 * const fit = fitDeltaCp([0, 10, 20, 30, 40], [2500.8, 2477.3, 2453.76, 2429.82, 2405.12]);
 * const table = fitTable(fit, { temperatureUnit: 'degC', heatUnit: 'kJ/kg', heatCapacityUnit: 'kJ/(kg K)' });
 * latentFromFit(readFitTable(table), 25).value // => 2441.42
 */
export function readFitTable(values: readonly (readonly unknown[])[]): FitFromTable {
  const rows = new Map<string, readonly unknown[]>();
  for (const cells of values) {
    const label = plain(cells[0]);
    if (label !== '' && !rows.has(label)) rows.set(label, cells);
  }
  const kind = text(rows, FIT_ROWS.kind, 1);
  const substance = text(rows, FIT_ROWS.substance, 1);
  return {
    method: text(rows, FIT_ROWS.method, 1),
    kind: KINDS.find((known) => known === kind),
    substance: substance === '' || substance === 'not stated' ? undefined : substance,
    reference: number(rows, FIT_ROWS.reference, 1),
    latent: number(rows, FIT_ROWS.latent, 1),
    uLatent: numberOrBlank(rows, FIT_ROWS.latent, 2),
    slope: number(rows, FIT_ROWS.slope, 1),
    uSlope: numberOrBlank(rows, FIT_ROWS.slope, 2),
    covariance: numberOrBlank(rows, FIT_ROWS.covariance, 1),
    degreesOfFreedom: number(rows, FIT_ROWS.degreesOfFreedom, 1),
    residualSd: numberOrBlank(rows, FIT_ROWS.residualSd, 1),
    coverage: number(rows, FIT_ROWS.coverage, 1),
    coverageFactor: numberOrBlank(rows, FIT_ROWS.coverageFactor, 1),
    lowest: number(rows, FIT_ROWS.lowest, 1),
    highest: number(rows, FIT_ROWS.highest, 1),
    temperatureUnit: text(rows, FIT_ROWS.reference, 5),
    heatUnit: text(rows, FIT_ROWS.latent, 5),
    heatCapacityUnit: text(rows, FIT_ROWS.slope, 5),
  };
}

type Rows = ReadonlyMap<string, readonly unknown[]>;

function cell(rows: Rows, label: string, column: number): unknown {
  const cells = rows.get(label.toLowerCase());
  if (cells === undefined) throw refused(`the table of a fit, all its rows`, `no row "${label}"`);
  return cells[column];
}

function number(rows: Rows, label: string, column: number): number {
  const value = cell(rows, label, column);
  if (typeof value === 'number' && Number.isFinite(value)) return value;
  throw refused(`a number in row "${label}"`, shown(value));
}

function numberOrBlank(rows: Rows, label: string, column: number): number | undefined {
  const value = cell(rows, label, column);
  if (value === null || value === undefined || (typeof value === 'string' && value.trim() === '')) return undefined;
  return number(rows, label, column);
}

function text(rows: Rows, label: string, column: number): string {
  const value = cell(rows, label, column);
  return typeof value === 'string' ? value.trim() : '';
}

function plain(value: unknown): string {
  return typeof value === 'string' ? value.trim().toLowerCase().replace(/\s+/g, ' ') : '';
}

function shown(value: unknown): string {
  return typeof value === 'string' && value.trim() !== '' ? JSON.stringify(value) : 'no number';
}

function refused(allowed: string, received: string): Problem {
  return new Problem({ code: 'argument', argument: 'fit', allowed, received });
}
