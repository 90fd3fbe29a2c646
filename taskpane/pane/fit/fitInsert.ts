import { fitTable } from '../../../core/fit/fitTable';
import { latentFromFit } from '../../../core/fit/latentFromFit';
import { differenceUnit } from '../../../core/units/differenceUnit';
import { withSlopeUnit } from '../../../functions/edge/fitUnits';
import type { Settings } from '../../../functions/settings/settings';
import { parseArea } from '../../hosts/address';
import type { FitInsert } from '../../plan/planFit';
import { within } from '../../plan/unitsBlock';
import type { Cell, Ref } from '../../port';
import type { FitChoice } from './fitChoice';
import type { FitView } from './fitView';
import type { FitData } from './useFitData';

/** What goes into the workbook for a fit that is shown. */
export function fitInsert(at: Ref, data: FitData, view: FitView, choice: FitChoice, workbook: Settings): FitInsert {
  const { fit, units, settings } = view;
  const { value, uLine } = latentFromFit(fit, fit.reference);
  return {
    at,
    temperatures: refOf(data, choice.temperature),
    latents: refOf(data, choice.latent),
    settings: [...unitTexts(settings, workbook), ...optionTexts(view, choice)].join('; '),
    table: tableOf(view, choice),
    example: {
      temperature: fit.reference,
      temperatureUnit: units.temperature.symbol,
      heatUnit: units.heat.symbol,
      latent: value,
      uncertainty: uLine,
      settings: unitTexts({ ...settings, units: { ...settings.units, heat: units.heat } }, workbook).join('; '),
    },
  };
}

/** The same cells that FITDELTACP spills. */
function tableOf({ fit, units }: FitView, choice: FitChoice): Cell[][] {
  const table = fitTable(fit, {
    temperatureUnit: units.temperature.symbol,
    heatUnit: units.heat.symbol,
    heatCapacityUnit: units.heatCapacity.symbol,
    curvatureUnit: `${units.heatCapacity.symbol} / ${differenceUnit(units.temperature).symbol}`,
    kind: choice.kind,
    substance: choice.substance === '' ? undefined : choice.substance,
  });
  const slopes = withSlopeUnit(table, units.slopeFactor);
  return slopes.map((row) => row.map((cell) => (typeof cell === 'number' || typeof cell === 'string' ? cell : null)));
}

/** The cell beside the data: one column of air, then the first free column to the right of the ranges. */
export function besideData(data: FitData): Ref | undefined {
  let best: { ref: Ref; right: number } | undefined;
  for (const ref of data.refs) {
    const area = parseArea(ref.address);
    if (area === null) continue;
    const right = area.left + area.columns;
    if (best === undefined || right > best.right) best = { ref: within(ref, 0, area.columns + 1), right };
  }
  return best?.ref;
}

function refOf(data: FitData, place: number | undefined): Ref {
  const column = place === undefined ? undefined : data.found.columns[place];
  if (column === undefined) throw new TypeError('a fit without its columns');
  return column.ref;
}

function unitTexts(settings: Settings, workbook: Settings): string[] {
  return (['temperature', 'heat'] as const).flatMap((kind) => {
    const { symbol } = settings.units[kind];
    return symbol === workbook.units[kind].symbol ? [] : [`${kind}=${symbol}`];
  });
}

function optionTexts({ settings, fit, units }: FitView, choice: FitChoice): string[] {
  const typed = Number(fit.reference.toPrecision(12)).toString().replace('.', settings.decimal);
  const reference =
    choice.reference.trim() === '' ? '298.15 K'.replace('.', settings.decimal) : `${typed} ${units.temperature.symbol}`;
  const substance = choice.substance === '' ? [] : [`substance=${choice.substance}`];
  return [`reference=${reference}`, `kind=${choice.kind}`, ...substance];
}
