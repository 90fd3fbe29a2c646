import { Problem } from '../../problem';
import type { Gap, Ladder, Rung } from '../../substance';
import { nasa9Enthalpy } from '../nasa9Enthalpy';
import type { CondensedForm } from './forms';
import { checkPressure, HIGHEST_PRESSURE_PA, type CondensedModel } from './model';
import { vapourBoundary } from './vapourBoundary';

/** Every phase, form and transition met at one pressure, from cold to hot. */
export function condensedLadder(model: CondensedModel, pressurePa: number): Ladder {
  checkPressure(model, pressurePa);
  const { record, vapour } = model;
  const gas = gasFrom(model, pressurePa);
  const limitK = gas?.fromK ?? dryEnd(model, pressurePa);
  const rungs: Rung[] = [];
  const gaps: Gap[] = [];
  for (const form of model.forms) {
    const below = rungs[rungs.length - 1];
    if (below !== undefined && form.fromK >= limitK) break;
    const toK = Math.min(form.toK, limitK);
    const rung = condensedRung(form, toK);
    if (below !== undefined) gaps.push(gapBetween(model, below, rung));
    rungs.push(rung);
  }
  const last = rungs[rungs.length - 1];
  if (gas !== undefined && last !== undefined && vapour !== undefined) {
    rungs.push(gas);
    gaps.push({
      change: gas.change,
      temperatureK: gas.fromK,
      below: last.enthalpy(gas.fromK),
      above: gas.enthalpy(gas.fromK),
    });
  }
  return {
    pressurePa,
    rungs,
    gaps,
    sources: model.sources,
    missingBelow: `heat capacity of solid ${record.name} below ${model.forms[0]?.fromK ?? 0} K`,
    ...(gas === undefined ? { missingAbove: aboveWords(model, pressurePa) } : {}),
  };
}

function aboveWords(model: CondensedModel, pressurePa: number): string {
  const { record, overLiquid, overSolid } = model;
  const line = overLiquid ?? overSolid;
  if (line !== undefined && pressurePa > line.toPa) return `vapour of ${record.name} above ${Math.round(line.toPa)} Pa`;
  const why = record.vapour?.lacking ?? record.end?.why;
  // what is lacking stands in front of a colon, so that a remark from memory is one in brackets
  const remark = why === undefined ? '' : ` (${why.replace(' (from memory)', ', from memory')})`;
  return `vapour of ${record.name}${remark}`;
}

function condensedRung({ phase, form, species, fromK }: CondensedForm, toK: number): Rung {
  return {
    phase,
    ...(form === undefined ? {} : { form }),
    fromK,
    toK,
    enthalpy: (t) => nasa9Enthalpy(species, t),
  };
}

function gapBetween({ forms }: CondensedModel, below: Rung, above: Rung): Gap {
  const form = forms.find(({ toK, changeAbove }) => toK === below.toK && changeAbove !== undefined);
  const high = above.enthalpy(above.fromK);
  return {
    change: form?.changeAbove ?? '',
    temperatureK: above.fromK,
    // no latent heat at a second-order point: what rounding of the coefficients leaves is not shown as one
    below: form?.secondOrder === true ? high : below.enthalpy(below.toK),
    above: high,
  };
}

/** Where a path ends without vapour: the end of the last phase, or of the solid where it does not melt at this pressure. */
function dryEnd({ record }: CondensedModel, pressurePa: number): number {
  const sublimes = record.meltsAbovePa !== undefined && pressurePa < record.meltsAbovePa;
  return sublimes ? (record.end?.kelvin ?? Infinity) : Infinity;
}

interface GasRung extends Rung {
  readonly change: 'vaporization' | 'sublimation';
}

function gasFrom(model: CondensedModel, pressurePa: number): GasRung | undefined {
  const { vapour, overSolid, overLiquid, record } = model;
  const coldest = overSolid ?? overLiquid;
  if (vapour === undefined || coldest === undefined) return undefined;
  if (pressurePa < coldest.fromPa) {
    throw new Problem({
      code: 'range',
      argument: 'pressure',
      quantity: 'pressure',
      received: pressurePa,
      from: coldest.fromPa,
      to: HIGHEST_PRESSURE_PA,
      subject: `heating paths of ${record.name}`,
    });
  }
  const boundary = vapourBoundary(model, pressurePa);
  if (boundary === undefined) return undefined;
  return {
    phase: 'gas',
    change: boundary.change,
    fromK: boundary.temperatureK,
    toK: vapour.toK,
    enthalpy: (t) => vapour.at(t, pressurePa).enthalpy,
  };
}
