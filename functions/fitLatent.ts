import { latentFromFit } from '../core/fit/latentFromFit';
import { readFitTable, type FitFromTable } from '../core/fit/readFitTable';
import { Problem } from '../core/problem';
import { between } from '../core/units/linear';
import { parseQuantity } from '../core/units/parseQuantity';
import { unitOf } from '../core/units/unitOf';
import { answer } from './edge/answer';
import { requiredBlock, type Block } from './edge/block';
import { heatFactor } from './edge/fitUnits';
import { numberColumn } from './edge/numberColumn';
import { substanceKey } from './edge/keys';
import type { BlockwiseSpec, Table } from './edge/spec';
import type { Settings } from './settings/settings';

const spec: BlockwiseSpec = {
  family: 'blockwise',
  name: 'FITLATENT',
  args: [
    { name: 'fit', kind: 'block' },
    { name: 'temperature', kind: 'block' },
  ],
  options: ['substance'],
  run: ([fit, temperature], settings) =>
    table(requiredBlock('fit', fit), requiredBlock('temperature', temperature), settings),
};

function table(fitBlock: Block, temperatures: Block, settings: Settings): Table {
  const fit = inHeatPerDegree(readFitTable(fitBlock.cells));
  const name = settings.options['substance'] ?? fit.substance;
  const substance = name === undefined ? undefined : substanceKey(name);
  const factor = heatFactor(unitOf(fit.heatUnit, 'heat'), settings.units.heat, substance);
  const unit = unitOf(fit.temperatureUnit, 'temperature');
  const toFit = between(settings.units.temperature, unit);
  const kelvinToFit = between(unitOf('K'), unit);
  const { header, cells } = numberColumn(temperatures);
  const pairs: Table = Array.from(cells, (cell, i) => {
    if (cell === null) return ['', ''];
    let at: number;
    if (typeof cell === 'number') {
      at = cell * toFit.scale + toFit.offset;
    } else if (typeof cell === 'string') {
      at =
        parseQuantity(cell, 'temperature', settings, `temperature ${i + 1}`).si * kelvinToFit.scale +
        kelvinToFit.offset;
    } else {
      throw new Problem({
        code: 'argument',
        argument: `temperature ${i + 1}`,
        allowed: 'a temperature',
        received: 'no number',
      });
    }
    const { value, uLine } = latentFromFit(fit, at);
    return [value * factor, uLine === undefined ? '' : uLine * Math.abs(factor)];
  });
  if (header !== undefined) pairs.unshift([`latent heat / ${settings.units.heat.symbol}`, 'standard uncertainty']);
  return temperatures.rows === 1 && temperatures.columns > 1 ? turned(pairs) : pairs;
}

/** The table holds the slope in the heat-capacity unit; a prediction needs it in heat per degree of the table. */
function inHeatPerDegree(fit: FitFromTable): FitFromTable {
  const heat = unitOf(fit.heatUnit, 'heat').factor;
  const perDegree =
    (unitOf(fit.heatCapacityUnit, 'heatCapacity').factor * unitOf(fit.temperatureUnit, 'temperature').factor) / heat;
  const scaled = (value: number | undefined): number | undefined =>
    value === undefined ? undefined : value * perDegree;
  return { ...fit, slope: fit.slope * perDegree, uSlope: scaled(fit.uSlope), covariance: scaled(fit.covariance) };
}

function turned(pairs: Table): Table {
  return [pairs.map((pair) => pair[0] ?? ''), pairs.map((pair) => pair[1] ?? '')];
}

/**
 * Latent heat at a temperature from the table of FITDELTACP, with the standard uncertainty of the fitted line beside it.
 * @customfunction FITLATENT
 * @requiresParameterAddresses
 * @param fit The whole table that FITDELTACP spilled.
 * @param temperature One temperature, or a column or row of them, in the workbook's unit.
 * @param [settings] Latentry_units, or text as "heat=kJ/mol; substance=water".
 * @param invocation The call itself.
 * @returns Value and standard uncertainty, in the workbook's heat unit.
 */
export function fitLatent(
  fit: any[][],
  temperature: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [fit, temperature, settings, invocation]);
}
