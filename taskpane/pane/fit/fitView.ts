import { fitDeltaCp } from '../../../core/fit/fitDeltaCp';
import { convertLine } from '../../../core/fit/convertLine';
import type { LineFit } from '../../../core/fit/fitTypes';
import { readRows } from '../../../core/fit/readRows';
import { Problem } from '../../../core/problem';
import { fromSi } from '../../../core/units/fromSi';
import { parseQuantity } from '../../../core/units/parseQuantity';
import type { Unit } from '../../../core/units/unit';
import { unitOf } from '../../../core/units/unitOf';
import { currentRegistry } from '../../../functions/house/currentRegistry';
import { fitUnits, type FitUnits } from '../../../functions/edge/fitUnits';
import type { Settings } from '../../../functions/settings/settings';
import type { DataColumn } from '../../plan/findColumns';
import type { FitChoice } from './fitChoice';

/** Where a unit came from: the header of the column, the person's choice, the settings of the workbook. */
export interface ChosenUnit {
  readonly unit: Unit;
  readonly from: 'header' | 'choice' | 'settings';
}

/** A fit with all that is needed to show it. Temperatures and latent heats of `fit` are in the units of the answer. */
export interface FitView {
  readonly fit: LineFit;
  /** Rows used, in the units of the answer. */
  readonly temperatures: Float64Array;
  readonly latents: Float64Array;
  readonly units: FitUnits;
  /** Settings that the fit was made under: the workbook's, with the units that were chosen for columns without any. */
  readonly settings: Settings;
}

/** 25 °C, which most tables refer to. */
const REFERENCE_K = 298.15;

/** The unit of a column: its header's where it has one, else the one chosen, else the workbook's. */
export function chosenUnit(
  column: DataColumn | undefined,
  kind: 'temperature' | 'heat',
  chosen: string,
  settings: Settings,
): ChosenUnit {
  if (column?.header?.unread !== undefined) throw column.header.unread;
  const stated = column?.header?.unit;
  if (stated?.kind === kind) return { unit: stated, from: 'header' };
  if (chosen !== '') return { unit: unitOf(chosen, kind), from: 'choice' };
  return { unit: settings.units[kind], from: 'settings' };
}

/** The reference temperature in the unit of the data. */
export function referenceOf(text: string, unit: Unit, settings: Settings): number {
  const { scale, offset } = fromSi(unit);
  if (text.trim() === '') return scale * REFERENCE_K + offset;
  const written = /[a-zA-Z°℃℉]/.test(text.replace(/\de[+-]?\d/gi, '')) ? text : `${text} ${unit.symbol}`;
  return scale * parseQuantity(written, 'temperature', settings, 'reference temperature').si + offset;
}

/** Settings with the units chosen for columns whose header has none. */
export function withChosenUnits(columns: readonly DataColumn[], choice: FitChoice, settings: Settings): Settings {
  const unit = (part: 'temperature' | 'latent', kind: 'temperature' | 'heat', chosen: string): Unit => {
    const found = chosenUnit(placed(columns, choice[part]), kind, chosen, settings);
    return found.from === 'choice' ? found.unit : settings.units[kind];
  };
  const temperature = unit('temperature', 'temperature', choice.temperatureUnit);
  const heat = unit('latent', 'heat', choice.latentUnit);
  return { ...settings, units: { ...settings.units, temperature, heat } };
}

/** Fits the chosen columns. @throws Problem where the data or a choice can't be used */
export function fitView(columns: readonly DataColumn[], choice: FitChoice, workbook: Settings): FitView {
  const x = columnOf(columns, choice.temperature, 'temperatures');
  const y = columnOf(columns, choice.latent, 'latents');
  refuseHalfTitled(x, y);
  const settings = withChosenUnits(columns, choice, workbook);
  const substance = choice.substance === '' ? undefined : currentRegistry().find(choice.substance);
  const units = fitUnits(x.header, y.header, settings, substance);
  const rows = readRows(x.values, y.values, x.firstRow);
  const reference = referenceOf(choice.reference, x.header?.unit ?? settings.units.temperature, settings);
  const own = fitDeltaCp(rows.temperatures, rows.latents, { reference, leftOut: rows.leftOut });
  const { factor, offset } = units.temperatureChange;
  return {
    fit: convertLine(own, units.temperatureChange, units.latentFactor),
    temperatures: rows.temperatures.map((t) => factor * t + offset),
    latents: rows.latents.map((latent) => units.latentFactor * latent),
    units,
    settings,
  };
}

function placed(columns: readonly DataColumn[], place: number | undefined): DataColumn | undefined {
  return place === undefined ? undefined : columns[place];
}

function columnOf(columns: readonly DataColumn[], place: number | undefined, argument: string): DataColumn {
  const column = placed(columns, place);
  if (column !== undefined) return column;
  throw new Problem({ code: 'argument', argument, allowed: 'a column with numbers', received: 'none found' });
}

/** A header above one column only shifts the rows of a cell function against each other. */
function refuseHalfTitled(x: DataColumn, y: DataColumn): void {
  if ((x.header === undefined) === (y.header === undefined)) return;
  throw new Problem({
    code: 'argument',
    argument: 'headers',
    allowed: 'one above each column, or none',
    received: `one in ${(x.header === undefined ? y : x).label} only`,
  });
}
