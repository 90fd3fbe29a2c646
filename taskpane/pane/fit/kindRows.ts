import type { LatentKind } from '../../../core/answer';
import { valueAt } from '../../../core/evaluate';
import { Problem } from '../../../core/problem';
import type { Substance } from '../../../core/substance';
import { perMole } from '../../../core/units/perMole';
import { toSi } from '../../../core/units/toSi';
import { currentRegistry } from '../../../functions/house/currentRegistry';
import type { FitChoice } from './fitChoice';
import type { FitView } from './fitView';

const KINDS: readonly LatentKind[] = ['coexistence', 'isobaric', 'standard'];

/** One kind of slope, in the view's slope unit. */
export interface KindRow {
  readonly kind: LatentKind;
  /** True for the kind that the data are. */
  readonly own: boolean;
  /** Slope of the catalogue at the mean temperature, or why there is none. */
  readonly catalogue: number | string;
  /** The fitted slope carried to this kind by the catalogue's difference; undefined where the catalogue lacks one of them. */
  readonly fitted: number | undefined;
}

export interface Kinds {
  readonly rows: readonly KindRow[];
  /** The part of the slope along the line that is no heat capacity, or why it is not known. */
  readonly term: number | string;
}

/** The three kinds of slope side by side at the mean temperature of the data; undefined without a substance. */
export function kindRows(view: FitView, choice: FitChoice): Kinds | undefined {
  if (choice.substance === '') return undefined;
  const substance = currentRegistry().find(choice.substance);
  const { scale, offset } = toSi(view.units.temperature);
  const meanK = scale * view.fit.centre + offset;
  const fromMolar = 1 / (view.units.heatCapacity.factor * perMole(view.units.heatCapacity, substance.molarMass));
  const slope = (kind: LatentKind) =>
    inWords(
      () =>
        fromMolar *
        valueAt(substance.latentSlope(choice.change, kind, linePressure(substance, choice.change, meanK)), meanK),
    );
  const own = slope(choice.kind);
  const rows = KINDS.map((kind) => {
    const catalogue = slope(kind);
    const fitted =
      typeof own === 'number' && typeof catalogue === 'number'
        ? view.units.slopeFactor * view.fit.slope + catalogue - own
        : undefined;
    return { kind, own: kind === choice.kind, catalogue, fitted };
  });
  return { rows, term: inWords(() => fromMolar * valueAt(substance.coexistenceTerm(choice.change), meanK)) };
}

/** The isobaric kind is taken at the pressure where both phases meet; fusion at one atmosphere. */
function linePressure(substance: Substance, change: string, temperatureK: number): number | undefined {
  if (change === 'vaporization') return valueAt(substance.saturationPressure('liquid'), temperatureK);
  return change === 'sublimation' ? valueAt(substance.saturationPressure('ice'), temperatureK) : undefined;
}

function inWords(work: () => number): number | string {
  try {
    return work();
  } catch (error) {
    if (error instanceof Problem) return error.message;
    throw error;
  }
}
