import { FIT_ROWS } from '../../core/fit/fitTable';
import { Problem } from '../../core/problem';
import type { Substance } from '../../core/substance';
import { between } from '../../core/units/linear';
import { checkedMolarMass } from '../../core/units/perMole';
import { unitOf } from '../../core/units/unitOf';
import type { Header } from '../../core/units/readHeader';
import type { Unit, UnitKind } from '../../core/units/unit';
import type { Settings } from '../settings/settings';
import type { Table } from './spec';

/** Units that a fit is answered in, and how the data's own units lead there. */
export interface FitUnits {
  /** Temperature unit of the data. */
  readonly dataTemperature: Unit;
  readonly temperature: Unit;
  readonly heat: Unit;
  readonly heatCapacity: Unit;
  /** Data temperature to answer temperature. */
  readonly temperatureChange: { readonly factor: number; readonly offset: number };
  /** Data latent heat to answer latent heat. */
  readonly latentFactor: number;
  /** Answer heat per answer temperature to the heat-capacity unit. */
  readonly slopeFactor: number;
}

/** Header units win over the settings; the answer is in the workbook's units where the basis allows, else in the data's. */
export function fitUnits(
  temperatureHeader: Header | undefined,
  latentHeader: Header | undefined,
  settings: Settings,
  substance: Substance | undefined,
): FitUnits {
  const fromT = headerUnit('temperatures', temperatureHeader, 'temperature') ?? settings.units.temperature;
  const fromH = headerUnit('latents', latentHeader, 'heat') ?? settings.units.heat;
  const temperature = settings.units.temperature;
  const sameBasis = fromH.basis === settings.units.heat.basis;
  const heat = sameBasis || substance !== undefined ? settings.units.heat : fromH;
  const heatCapacity =
    settings.units.heatCapacity.basis === heat.basis
      ? settings.units.heatCapacity
      : unitOf(heat.basis === 'mole' ? 'J/(mol K)' : 'kJ/(kg K)');
  const { scale, offset } = between(fromT, temperature);
  return {
    dataTemperature: fromT,
    temperature,
    heat,
    heatCapacity,
    temperatureChange: { factor: scale, offset },
    latentFactor: heatFactor(fromH, heat, substance),
    slopeFactor: heat.factor / temperature.factor / heatCapacity.factor,
  };
}

function headerUnit(argument: string, header: Header | undefined, kind: UnitKind): Unit | undefined {
  if (header === undefined) return undefined;
  if (header.unread !== undefined) throw header.unread;
  if (header.unit === undefined || header.unit.kind === kind) return header.unit;
  throw new Problem({
    code: 'argument',
    argument: `header of ${argument}`,
    allowed: `a unit of ${kind === 'heat' ? 'heat per amount' : 'temperature'}`,
    received: `"${header.name}" in ${header.unit.symbol}`,
  });
}

/** Factor from one unit of heat per amount to another; between bases by the molar mass. */
export function heatFactor(from: Unit, to: Unit, substance: Substance | undefined): number {
  if (from.basis === to.basis) return between(from, to).scale;
  if (substance === undefined) {
    throw new Problem({
      code: 'argument',
      argument: 'substance',
      allowed: `substance= in the settings: ${from.symbol} against ${to.symbol} needs a molar mass`,
      received: 'none',
    });
  }
  const molar = checkedMolarMass(substance.molarMass, 'to go between mass and moles');
  return (from.factor / to.factor) * (from.basis === 'mass' ? molar : 1 / molar);
}

/** Writes the slope rows of a fit's table in the heat-capacity unit. */
export function withSlopeUnit(table: Table, slopeFactor: number): Table {
  const columns: Readonly<Record<string, readonly number[]>> = {
    [FIT_ROWS.slope]: [1, 2, 3, 4],
    [FIT_ROWS.covariance]: [1],
    [FIT_ROWS.bend]: [1, 2],
  };
  return table.map((row) => {
    const scaled = columns[typeof row[0] === 'string' ? row[0] : ''];
    return scaled === undefined
      ? row
      : row.map((cell, c) => (typeof cell === 'number' && scaled.includes(c) ? cell * slopeFactor : cell));
  });
}
