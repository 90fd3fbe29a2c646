import type { Settings } from '../../functions/settings/settingsType';
import type { BookCell, BookSheet } from '../book';
import { emptySheet } from '../emptySheet';
import { put, putFormula, putSpill } from './place';
import { UNITS_NAME, unitHead } from './unitHead';

interface Column {
  readonly words: string;
  /** The setting whose unit the heading shows, or a fixed unit. */
  readonly unit: { readonly key: string } | { readonly fixed: string };
  /** `T` stands for the column of temperatures. */
  readonly call: string;
  readonly format: string;
}

const HEAT = '#,##0.00';
const SLOPE = '0.0000';

const WATER_T = [5, 10, 20, 30, 40, 50, 60, 70, 80, 90, 100, 110, 120, 130];
const WATER: readonly Column[] = [
  {
    words: 'Vapour pressure',
    unit: { key: 'pressure' },
    call: `SATPRESSURE("water",T,${UNITS_NAME})`,
    format: '#,##0.0000',
  },
  {
    words: 'Latent heat of vaporization',
    unit: { key: 'heat' },
    call: `LATENT("water","vaporization",T,${UNITS_NAME})`,
    format: HEAT,
  },
  {
    words: 'Its slope along the line',
    unit: { key: 'heat_capacity' },
    call: `DELTACP("water","vaporization",T,${UNITS_NAME})`,
    format: SLOPE,
  },
  {
    words: 'Heat capacity, boiling liquid',
    unit: { key: 'heat_capacity' },
    call: `HEATCAP("water","liquid",T,,,${UNITS_NAME},"along=saturation")`,
    format: SLOPE,
  },
  {
    words: 'Heat capacity, saturated vapour',
    unit: { key: 'heat_capacity' },
    call: `HEATCAP("water","gas",T,,,${UNITS_NAME},"along=saturation")`,
    format: SLOPE,
  },
];

const ICE_T = [-60, -55, -50, -45, -40, -35, -30, -25, -20, -15, -10, -5, 0];
const ICE: readonly Column[] = [
  {
    words: 'Vapour pressure of ice',
    unit: { fixed: 'Pa' },
    call: `SATPRESSURE("water",T,${UNITS_NAME},"pressure=Pa; surface=ice")`,
    format: '#,##0.00',
  },
  {
    words: 'Latent heat of sublimation',
    unit: { key: 'heat' },
    call: `LATENT("water","sublimation",T,${UNITS_NAME})`,
    format: HEAT,
  },
  {
    words: 'Its slope along the line',
    unit: { key: 'heat_capacity' },
    call: `DELTACP("water","sublimation",T,${UNITS_NAME})`,
    format: SLOPE,
  },
  {
    words: 'Heat capacity of ice',
    unit: { key: 'heat_capacity' },
    call: `HEATCAP("water","solid",T,,,${UNITS_NAME})`,
    format: SLOPE,
  },
];

/**
 * Water for the evaporator and ice for the freeze-dryer, a spilled column a quantity.
 *
 * @param settings - those on the Units sheet, for what the headings show before the first calculation
 */
export function latentHeatSheet(settings: Settings): BookSheet {
  const cells: Record<string, BookCell> = {};
  const rowHeights: Record<string, number> = { '1': 34, '2': 34 };
  put(cells, 'A1', 'Latent heat by temperature', 'title');
  put(
    cells,
    'A2',
    'Type other temperatures into the warm cells, in the unit at the head of the column. Both phases stand on the two-phase line.',
    'subtitle',
  );
  const table = (top: number, name: string, temperatures: readonly number[], columns: readonly Column[]) => {
    const [head, first, last] = [top + 1, top + 2, top + 1 + temperatures.length];
    for (const letter of 'ABCDEF') put(cells, `${letter}${top}`, letter === 'A' ? name : null, 'section');
    rowHeights[String(top)] = 24;
    rowHeights[String(head)] = 48;
    const temperature = unitHead('Temperature', 'temperature', settings);
    putFormula(cells, `A${head}`, temperature.formula, 'columnHead', temperature.shown);
    temperatures.forEach((t, i) => put(cells, `A${first + i}`, t, 'input', '0.0'));
    columns.forEach(({ words, unit, call, format }, i) => {
      const letter = String.fromCharCode(66 + i);
      if ('fixed' in unit) put(cells, `${letter}${head}`, `${words}, ${unit.fixed}`, 'columnHead');
      else {
        const { formula, shown } = unitHead(words, unit.key, settings);
        putFormula(cells, `${letter}${head}`, formula, 'columnHead', shown);
      }
      const formula = `=LATENTRY.${call.replace(/\bT\b/, `A${first}:A${last}`)}`;
      putSpill(cells, `${letter}${first}:${letter}${last}`, formula, 'answer', format);
    });
    return last;
  };
  const end = table(4, 'Evaporator: water to vapour', WATER_T, WATER);
  const next = table(end + 2, 'Freeze-dryer: ice to vapour', ICE_T, ICE);
  put(
    cells,
    `A${next + 1}`,
    'Water and steam: IAPWS R6-95(2018). Ice: IAPWS R10-06(2009). More on any answer: =LATENTRY.SOURCE("water","sublimation").',
    'note',
  );
  rowHeights[String(next + 1)] = 32;
  return {
    ...emptySheet('Latent heat'),
    cells,
    columnWidths: { A: 18, B: 18, C: 20, D: 20, E: 20, F: 20 },
    rowHeights,
    merges: ['A2:F2', `A${next + 1}:F${next + 1}`],
    gridLines: false,
    print: { landscape: true, fitWidth: true },
  };
}
