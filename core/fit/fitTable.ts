import type { LatentKind } from '../answer';
import type { Interval, LineFit } from './fitTypes';
import type { LeftOut } from './leftOut';

/** Units and kind as they stand in the table. */
export interface FitLabels {
  readonly temperatureUnit: string;
  readonly heatUnit: string;
  readonly heatCapacityUnit: string;
  /** Heat-capacity unit per kelvin, for the bend. */
  readonly curvatureUnit?: string | undefined;
  readonly kind?: LatentKind | undefined;
  readonly substance?: string | undefined;
}

/** Names of the rows: what `readFitTable` looks for, so they never change. */
export const FIT_ROWS = {
  method: 'method',
  substance: 'substance',
  kind: 'kind of latent heat and slope',
  slope: 'slope of latent heat',
  latent: 'latent heat at reference',
  reference: 'reference temperature',
  covariance: 'covariance of the two',
  intercept: 'latent heat at zero of the scale',
  residualSd: 'scatter about the fit',
  degreesOfFreedom: 'degrees of freedom',
  coverage: 'coverage of intervals',
  coverageFactor: 'coverage factor',
  rSquared: 'R squared',
  pSlope: 'p of the slope',
  bend: 'curvature',
  pBend: 'p of the curvature',
  used: 'rows used',
  leftOut: 'rows left out',
  lowest: 'lowest temperature',
  highest: 'highest temperature',
} as const;

/** Heading row; a cell that does not apply holds an empty text. */
export const FIT_COLUMNS = ['fit', 'value', 'standard uncertainty', 'lower', 'upper', 'unit', 'note'] as const;

type Cell = string | number;

/**
 * A fit as a labelled table: one row a result, seven columns, the same rows for every method.
 *
 * @param fit from `fitDeltaCp`
 * @param labels units and kind, as text
 * @returns heading and rows: label, value, standard uncertainty, lower, upper, unit, note
 * @example
 * import { fitDeltaCp, fitTable } from 'latentry';
 * const fit = fitDeltaCp([0, 10, 20, 30, 40], [2500.8, 2477.3, 2453.76, 2429.82, 2405.12]);
 * fitTable(fit, { temperatureUnit: 'degC', heatUnit: 'kJ/kg', heatCapacityUnit: 'kJ/(kg K)' })[4][0] // => 'slope of latent heat'
 */
export function fitTable(fit: LineFit, labels: FitLabels): Cell[][] {
  const { temperatureUnit, heatUnit, heatCapacityUnit } = labels;
  const bend = fit.curvature();
  const exact = fit.degreesOfFreedom === 0 ? 'two rows: the exact line, no scatter to judge it by' : '';
  return [
    [...FIT_COLUMNS],
    row(FIT_ROWS.method, { value: fit.method, note: 'straight line, ordinary least squares' }),
    row(FIT_ROWS.substance, { value: labels.substance ?? 'not stated' }),
    row(FIT_ROWS.kind, { value: labels.kind ?? 'not stated', note: kindNote(labels.kind) }),
    row(FIT_ROWS.slope, {
      value: fit.slope,
      u: fit.uSlope,
      interval: fit.slopeInterval,
      unit: heatCapacityUnit,
      note: exact === '' ? slopeNote(labels.kind) : exact,
    }),
    row(FIT_ROWS.latent, { value: fit.latent, u: fit.uLatent, interval: fit.latentInterval, unit: heatUnit }),
    row(FIT_ROWS.reference, { value: fit.reference, unit: temperatureUnit }),
    row(FIT_ROWS.covariance, { value: fit.covariance, unit: `${heatUnit} · ${heatCapacityUnit}` }),
    row(FIT_ROWS.intercept, {
      value: fit.intercept,
      u: fit.uIntercept,
      interval: fit.interceptInterval,
      unit: heatUnit,
      note: `at 0 ${temperatureUnit}`,
    }),
    row(FIT_ROWS.residualSd, { value: fit.residualSd, unit: heatUnit, note: 'standard deviation of one observation' }),
    row(FIT_ROWS.degreesOfFreedom, { value: fit.degreesOfFreedom }),
    row(FIT_ROWS.coverage, { value: fit.coverage }),
    row(FIT_ROWS.coverageFactor, { value: fit.coverageFactor, note: 'Student t' }),
    row(FIT_ROWS.rSquared, { value: fit.rSquared }),
    row(FIT_ROWS.pSlope, { value: fit.pSlope, note: 'chance of such a slope from scatter alone' }),
    row(FIT_ROWS.bend, {
      value: bend?.coefficient,
      u: bend?.uncertainty,
      unit: labels.curvatureUnit ?? '',
      note:
        bend === undefined ? 'needs 4 rows and 3 temperatures' : 'coefficient of the squared distance from the mean',
    }),
    row(FIT_ROWS.pBend, { value: bend?.probability, note: 'F test; chance of such a bend from scatter alone' }),
    row(FIT_ROWS.used, { value: fit.count }),
    row(FIT_ROWS.leftOut, { value: fit.leftOut.length, note: reasons(fit.leftOut) }),
    row(FIT_ROWS.lowest, { value: fit.lowest, unit: temperatureUnit }),
    row(FIT_ROWS.highest, { value: fit.highest, unit: temperatureUnit }),
  ];
}

interface RowParts {
  readonly value: Cell | undefined;
  readonly u?: number | undefined;
  readonly interval?: Interval | undefined;
  readonly unit?: string;
  readonly note?: string;
}

function row(label: string, { value, u, interval, unit, note }: RowParts): Cell[] {
  return [label, value ?? '', u ?? '', interval?.lower ?? '', interval?.upper ?? '', unit ?? '', note ?? ''];
}

function kindNote(kind: LatentKind | undefined): string {
  switch (kind) {
    case 'coexistence':
      return 'slope along the two-phase line, not a difference of heat capacities';
    case 'isobaric':
      return 'difference of the heat capacities of the real phases at one pressure';
    case 'standard':
      return 'heat capacity of the ideal gas less that of the condensed phase';
    case undefined:
      return 'the kind of the latent heats that were fitted';
  }
}

function slopeNote(kind: LatentKind | undefined): string {
  if (kind === undefined) return 'ΔCp where the latent heats are isobaric or standard';
  return kind === 'coexistence' ? 'along the two-phase line: not ΔCp' : 'ΔCp';
}

/** The rows of each reason, the first few by number. */
function reasons(leftOut: readonly LeftOut[]): string {
  const rows = new Map<string, number[]>();
  for (const { row: number, reason } of leftOut) {
    const numbers = rows.get(reason);
    if (numbers === undefined) rows.set(reason, [number]);
    else numbers.push(number);
  }
  return [...rows].map(([reason, numbers]) => `${reason}: row ${shortList(numbers)}`).join('; ');
}

function shortList(numbers: readonly number[]): string {
  const shown = numbers.slice(0, 8).join(', ');
  return numbers.length > 8 ? `${shown} and ${numbers.length - 8} more` : shown;
}
