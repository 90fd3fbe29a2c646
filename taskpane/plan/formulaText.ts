import type { LatentKind } from '../../core/answer';
import { SUBSTANCES_NAME, UNITS_NAME } from '../boot/readSnapshot';

/** `pressure` is left out at one standard atmosphere, `stated pressure` never is. */
export type FormulaArgument = { readonly text: string } | 'temperature' | 'pressure' | 'stated pressure' | 'blank';

/** What a formula asks for, apart from where it stands and at which temperature. */
export interface FormulaAsk {
  readonly name: 'LATENT' | 'DELTACP' | 'HEATCAP' | 'SATPRESSURE' | 'SATTEMPERATURE' | 'ENTHALPY' | 'CONSTANT';
  readonly arguments: readonly FormulaArgument[];
  /** Written as `kind=…`; left out where it is the kind that the function takes by itself. */
  readonly kind?: LatentKind;
  /** True where the pressure belongs into the options, as `at_pressure=…`. */
  readonly atPressure?: boolean;
}

/** What the formula is asked at. */
export interface FormulaAt {
  /** True for a substance of the workbook's own: its rows become an argument, so that the formula follows them. */
  readonly house?: boolean;
  /** A number in the workbook's unit, or a cell that holds one. */
  readonly temperature: number | string;
  readonly pressure: {
    /** In the workbook's unit. */
    readonly value: number;
    /** The same with its unit. */
    readonly text: string;
    /** True for one standard atmosphere, which functions take by themselves. */
    readonly usual: boolean;
  };
  /** Units that answers need beside the workbook's: a material without a molar mass is counted in mass. */
  readonly units?: { readonly heat?: string; readonly heatCapacity?: string };
}

/**
 * The text of a formula; it always passes the Units block, so that it follows the workbook's units.
 * @example formulaText({ name: 'SATPRESSURE', arguments: [{ text: 'water' }, 'temperature'] }, at)
 * // with the temperature in A2 => '=LATENTRY.SATPRESSURE("water",A2,Latentry_units)'
 */
export function formulaText(ask: FormulaAsk, at: FormulaAt): string {
  const written = ask.arguments.map((argument) => argumentText(argument, at));
  const kind = ask.kind === undefined ? [] : [`kind=${ask.kind}`];
  const pressure = ask.atPressure === true && !at.pressure.usual ? [`at_pressure=${at.pressure.text}`] : [];
  const options = [...unitOptions(ask, at), ...kind, ...pressure].join('; ');
  const rows = at.house === true ? [SUBSTANCES_NAME] : [];
  const last = options === '' ? [] : [quoted(options)];
  return `=LATENTRY.${ask.name}(${[...written, UNITS_NAME, ...rows, ...last].join(',')})`;
}

function unitOptions({ name }: FormulaAsk, { units }: FormulaAt): string[] {
  if (name === 'LATENT' || name === 'ENTHALPY') return units?.heat === undefined ? [] : [`heat=${units.heat}`];
  if (name !== 'DELTACP' && name !== 'HEATCAP') return [];
  return units?.heatCapacity === undefined ? [] : [`heat_capacity=${units.heatCapacity}`];
}

function argumentText(argument: FormulaArgument, { temperature, pressure }: FormulaAt): string {
  if (argument === 'blank') return '';
  if (argument === 'stated pressure') return plainNumber(pressure.value);
  if (argument === 'pressure') return pressure.usual ? '' : plainNumber(pressure.value);
  if (argument === 'temperature') return typeof temperature === 'number' ? plainNumber(temperature) : temperature;
  return quoted(argument.text);
}

/** Twelve digits: what unit conversion leaves behind the last printed digit does not show. */
function plainNumber(value: number): string {
  return Number(value.toPrecision(12)).toString();
}

function quoted(text: string): string {
  return `"${text.replace(/"/g, '""')}"`;
}
