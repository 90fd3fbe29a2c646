import type { QuantityWriter } from '../../../../core/problem';
import { fromMolar } from '../../../../core/units/fromMolar';
import { fromSi } from '../../../../core/units/fromSi';
import type { Linear } from '../../../../core/units/linear';
import type { Unit } from '../../../../core/units/unit';
import { unitOf } from '../../../../core/units/unitOf';
import type { Settings } from '../../../../functions/settings/settings';
import { number, prettyUnit } from '../../look/number';
import { roundToUncertainty } from '../../look/roundToUncertainty';

/** A conversion from SI and the unit it leads to, as a person reads it. */
export interface Scale extends Linear {
  readonly unit: string;
}

/** From SI to the workbook's units, for one substance. */
export interface UnitWriter {
  readonly temperature: Scale;
  readonly pressure: Scale;
  readonly heat: Scale;
  readonly heatCapacity: Scale;
  readonly decimal: '.' | ',';
  /** Unit settings that a formula needs beside the workbook's, where a material without a molar mass can't follow those. */
  readonly ownUnits: { readonly heat?: string; readonly heatCapacity?: string };
  /** Writes temperatures and pressures inside the words of a refusal. */
  readonly words: QuantityWriter;
}

/**
 * Compiles the conversions.
 *
 * @param settings the workbook's
 * @param molarMass kg/mol; NaN for a material without one, which is counted per kilogram whatever the workbook says
 */
export function unitWriter(settings: Settings, molarMass: number): UnitWriter {
  const { decimal } = settings;
  const ownUnits = Number.isNaN(molarMass) ? perKilogram(settings) : {};
  const units = {
    ...settings.units,
    ...(ownUnits.heat === undefined ? {} : { heat: unitOf(ownUnits.heat, 'heat') }),
    ...(ownUnits.heatCapacity === undefined ? {} : { heatCapacity: unitOf(ownUnits.heatCapacity, 'heatCapacity') }),
  };
  const scaled = (linear: Linear, { symbol }: Unit): Scale => ({ ...linear, unit: prettyUnit(symbol) });
  const temperature = scaled(fromSi(units.temperature), units.temperature);
  const pressure = scaled(fromSi(units.pressure, settings.barometerPa), units.pressure);
  return {
    temperature,
    pressure,
    heat: scaled(fromMolar(units.heat, molarMass), units.heat),
    heatCapacity: scaled(fromMolar(units.heatCapacity, molarMass), units.heatCapacity),
    decimal,
    ownUnits,
    words: {
      temperature: (kelvin) => written(kelvin, temperature, decimal),
      pressure: (pascal) => written(pascal, pressure, decimal),
    },
  };
}

function perKilogram({ units }: Settings): UnitWriter['ownUnits'] {
  return {
    ...(units.heat.basis === 'mole' ? { heat: 'kJ/kg' } : {}),
    ...(units.heatCapacity.basis === 'mole' ? { heatCapacity: 'kJ/(kg K)' } : {}),
  };
}

/** An SI value with its unit, six significant digits. */
export function written(si: number, scale: Scale, decimal: '.' | ','): string {
  return `${number(onScale(si, scale), decimal)} ${scale.unit}`;
}

/** A temperature to two decimals, for labels. */
export function roundTemperature(kelvin: number, scale: Scale, decimal: '.' | ','): string {
  return `${number(Number(onScale(kelvin, scale).toFixed(2)) + 0, decimal)} ${scale.unit}`;
}

export function onScale(si: number, { scale, offset }: Linear): number {
  return scale * si + offset;
}

/**
 * The scale that a number of the core is shown on; `undefined` for units that have no setting. Only a material without a
 * molar mass is given per kilogram, and its writer counts so.
 */
export function scaleFor(unit: string, writer: UnitWriter): Scale | undefined {
  switch (unit) {
    case 'J/mol':
    case 'J/kg':
      return writer.heat;
    case 'J/(mol K)':
    case 'J/(kg K)':
      return writer.heatCapacity;
    case 'Pa':
      return writer.pressure;
    case 'K':
      return writer.temperature;
    case 'kg/mol':
      return { scale: 1000, offset: 0, unit: 'g/mol' };
    default:
      return undefined;
  }
}

/** A value as it is shown, with two digits of its standard uncertainty where it has one, and all its digits. */
export interface WrittenValue {
  readonly text: string;
  readonly unit: string;
  readonly full: string;
}

/** Writes an SI value and its standard uncertainty in the workbook's units. */
export function writeValue(
  si: { readonly value: number; readonly unit: string; readonly uncertainty?: number | undefined },
  writer: UnitWriter,
): WrittenValue {
  const scale = scaleFor(si.unit, writer) ?? { scale: 1, offset: 0, unit: si.unit === '1' ? '' : si.unit };
  const u = si.uncertainty === undefined ? undefined : Math.abs(scale.scale) * si.uncertainty;
  const { text, full } = roundToUncertainty(onScale(si.value, scale), u);
  const plusMinus = u === undefined || !(u > 0) ? '' : ` ± ${roundToUncertainty(u, u).text}`;
  const local = (digits: string) => (writer.decimal === ',' ? digits.replace(/\./g, ',') : digits);
  return { text: local(text + plusMinus), unit: prettyUnit(scale.unit), full: local(full) };
}
