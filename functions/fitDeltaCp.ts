import { refused } from '../core/catalogue/find';
import { convertLine } from '../core/fit/convertLine';
import { fitDeltaCp as fitLine, type FitOptions } from '../core/fit/fitDeltaCp';
import { fitTable } from '../core/fit/fitTable';
import type { LineFit } from '../core/fit/fitTypes';
import { readRows } from '../core/fit/readRows';
import { Problem } from '../core/problem';
import { differenceUnit } from '../core/units/differenceUnit';
import { between } from '../core/units/linear';
import { parseQuantity } from '../core/units/parseQuantity';
import type { Unit } from '../core/units/unit';
import { unitOf } from '../core/units/unitOf';
import { answer } from './edge/answer';
import { requiredBlock, shapeOf, type Block } from './edge/block';
import { fitUnits, withSlopeUnit } from './edge/fitUnits';
import { kindOption, substanceKey } from './edge/keys';
import { isDense, numberColumn, type NumberColumn } from './edge/numberColumn';
import type { BlockwiseSpec, Table } from './edge/spec';
import type { Settings } from './settings/settings';

/** Reference temperature of thermochemical tables, K. */
const STANDARD_TEMPERATURE_K = 298.15;

const spec: BlockwiseSpec = {
  family: 'blockwise',
  name: 'FITDELTACP',
  args: [
    { name: 'temperatures', kind: 'block' },
    { name: 'latents', kind: 'block' },
    { name: 'u_latents', kind: 'block', optional: true },
    { name: 'u_temperatures', kind: 'block', optional: true },
  ],
  options: ['method', 'reference', 'kind', 'substance', 'coverage'],
  run: ([temperatures, latents, uLatents, uTemperatures], settings) => {
    refuseUncertainties(uLatents ?? uTemperatures);
    return table(requiredBlock('temperatures', temperatures), requiredBlock('latents', latents), settings);
  },
};

function table(temperatures: Block, latents: Block, settings: Settings): Table {
  const method = settings.options['method'] ?? 'line';
  if (method.trim().toLowerCase() !== 'line') throw refused('method', method, ['line']);
  const name = settings.options['substance'];
  const substance = name === undefined ? undefined : substanceKey(name);
  const kind = kindOption(settings, undefined);
  const x = numberColumn(temperatures);
  const y = numberColumn(latents);
  const units = fitUnits(x.header, y.header, settings, substance);
  const reference = referenceOf(settings, units.dataTemperature);
  const fit = convertLine(
    fitColumns(x, y, { reference, coverage: coverageOf(settings.options['coverage']) }),
    units.temperatureChange,
    units.latentFactor,
  );
  const lines = fitTable(fit, {
    temperatureUnit: units.temperature.symbol,
    heatUnit: units.heat.symbol,
    heatCapacityUnit: units.heatCapacity.symbol,
    curvatureUnit: `${units.heatCapacity.symbol} / ${differenceUnit(units.temperature).symbol}`,
    kind,
    substance: substance?.name,
  });
  return withSlopeUnit(lines, units.slopeFactor);
}

/** Numbers go to the fit as they are; anything else is sorted into rows to use and rows to leave out. */
function fitColumns(x: NumberColumn, y: NumberColumn, options: FitOptions): LineFit {
  if (isDense(x.cells) && isDense(y.cells) && x.firstRow === y.firstRow) return fitLine(x.cells, y.cells, options);
  if (x.firstRow !== y.firstRow) {
    throw new Problem({
      code: 'argument',
      argument: 'latents',
      allowed: 'a header in both ranges or in neither',
      received: `a header in ${x.firstRow > 1 ? 'temperatures' : 'latents'} only`,
    });
  }
  const { temperatures, latents, leftOut } = readRows(Array.from(x.cells), Array.from(y.cells), x.firstRow);
  return fitLine(temperatures, latents, { ...options, leftOut });
}

/** `reference=`, 298.15 K when left out, in the temperature unit of the data. */
function referenceOf(settings: Settings, unit: Unit): number {
  const text = settings.options['reference'];
  const kelvin =
    text === undefined ? STANDARD_TEMPERATURE_K : parseQuantity(text, 'temperature', settings, 'reference').si;
  const { scale, offset } = between(unitOf('K'), unit);
  return kelvin * scale + offset;
}

function coverageOf(text: string | undefined): number {
  if (text === undefined) return 0.95;
  const value = parseQuantity(
    text,
    'share',
    { decimal: text.includes(',') ? ',' : '.', barometerPa: 0 },
    'coverage',
  ).si;
  if (value > 0 && value < 1) return value;
  throw new Problem({
    code: 'argument',
    argument: 'coverage',
    allowed: 'a probability inside (0, 1), as 0.95 or 95 %',
    received: text,
  });
}

function refuseUncertainties(block: Block | undefined): void {
  if (block === undefined) return;
  throw new Problem({
    code: 'argument',
    argument: block.name,
    allowed: 'nothing with method=line, which weighs all rows alike',
    received: `a range of ${shapeOf(block)}`,
  });
}

/**
 * ΔCp and the latent heat at a reference temperature from ΔH–T data, with standard errors, intervals and diagnostics.
 * The slope is of the kind that the data are: along saturation it is not a heat-capacity difference.
 * @customfunction FITDELTACP
 * @requiresParameterAddresses
 * @param temperatures Column of temperatures; a header with a unit, as "T / K", wins over the settings.
 * @param latents Column of latent heats beside them; a header as "ΔH (kJ mol⁻¹)" wins over the settings.
 * @param [u_latents] Left empty: method=line weighs all rows alike.
 * @param [u_temperatures] Left empty: method=line weighs all rows alike.
 * @param [settings] Latentry_units, or text as "reference=298.15 K; kind=coexistence; substance=water; coverage=0.95".
 * @param invocation The call itself.
 * @returns A labelled table that FITLATENT reads.
 */
export function fitDeltaCp(
  temperatures: any[][],
  latents: any[][],
  u_latents?: any[][],
  u_temperatures?: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [temperatures, latents, u_latents, u_temperatures, settings, invocation]);
}
