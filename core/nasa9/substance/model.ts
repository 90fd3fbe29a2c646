import { Problem } from '../../problem';
import type { Change } from '../../substance';
import { NASA9_SOURCE } from '../nasa9Source';
import { speciesSource } from '../speciesWords';
import type { Nasa9Species } from '../nasa9Types';
import { formsOf, METASTABLE_PART, type CondensedForm } from './forms';
import type { CondensedRecord } from './record';
import { LEAST_PRESSURE_PA, saturationLine, type SaturationLine } from './saturation';
import { makeVapour, type Vapour } from './vapour';

/** Above this pressure the volumes that the data set lacks would be felt: 50 cm³/mol · 10 MPa = 0.5 kJ/mol. */
export const HIGHEST_PRESSURE_PA = 1e7;

/** What a substance of the condensed data set is made of. */
export interface CondensedModel {
  readonly record: CondensedRecord;
  readonly forms: readonly CondensedForm[];
  readonly solids: readonly CondensedForm[];
  readonly liquid?: CondensedForm;
  /** Melting temperature, K. */
  readonly meltingK?: number;
  readonly vapour?: Vapour;
  /** Vapour over the solid up to the melting temperature, and over the liquid. Absent where only the standard kind is given. */
  readonly overSolid?: SaturationLine;
  readonly overLiquid?: SaturationLine;
  readonly sources: readonly string[];
}

export function makeModel(record: CondensedRecord): CondensedModel {
  const forms = formsOf(record);
  const solids = forms.filter(({ phase }) => phase === 'solid');
  const liquid = forms.find(({ phase }) => phase === 'liquid');
  const vapour = record.vapour === undefined ? undefined : makeVapour(record.vapour);
  const species = [...forms.map((form) => form.species), ...(vapour?.species ?? [])];
  const model = {
    record,
    forms,
    solids,
    ...(liquid === undefined ? {} : { liquid }),
    ...(liquid === undefined || solids.length === 0 ? {} : { meltingK: liquid.fromK }),
    ...(vapour === undefined ? {} : { vapour }),
    sources: [NASA9_SOURCE, ...species.map(speciesSource)],
  };
  if (vapour === undefined || record.vapour === undefined || record.vapour.lacking !== undefined) return model;
  const highestPa = record.vapour.highestPa;
  const first = solids[0];
  const last = solids[solids.length - 1];
  const lines: { overSolid?: SaturationLine } = {};
  if (first !== undefined && last !== undefined) {
    const line = saturationLine(vapour, (t) => solidAt(solids, t).species, [first.fromK, last.toK], highestPa);
    if (line.toK > line.fromK) lines.overSolid = line;
  }
  if (liquid !== undefined) {
    const range = [liquid.fromK * (1 - METASTABLE_PART), liquid.toK] as const;
    const line = saturationLine(vapour, () => liquid.species, range, highestPa);
    const shortened = { ...liquid, toK: line.toK, highK: line.toK };
    return {
      ...model,
      ...lines,
      overLiquid: line,
      liquid: shortened,
      forms: [...solids, shortened],
    };
  }
  return { ...model, ...lines };
}

/** The crystal form that is stable at a temperature; the colder one at a transition, the last one above all. */
export function solidAt(solids: readonly CondensedForm[], temperatureK: number): CondensedForm {
  let index = 0;
  while (index < solids.length - 1 && temperatureK > (solids[index]?.toK ?? Infinity)) index++;
  const form = solids[index];
  if (form === undefined) throw new Error('no crystal form');
  return form;
}

/** The species that is stable under its own vapour or at one atmosphere, as if it had no vapour. */
export function stableSpecies({ solids, liquid, meltingK }: CondensedModel, temperatureK: number): Nasa9Species {
  if (liquid !== undefined && (meltingK === undefined || temperatureK > meltingK)) return liquid.species;
  return solidAt(solids, temperatureK).species;
}

export function missing(subject: string, reason: string): Problem {
  return new Problem({ code: 'missing', subject, reason });
}

export function noSuchChange({ record }: CondensedModel, change: Change): Problem {
  return missing(`${change} of ${record.name}`, 'no such transition in the catalogue');
}

/** Why there is no two-phase line with the vapour. */
export function noLine(model: CondensedModel, change: Change): Problem {
  const { record, overLiquid } = model;
  if (change !== 'sublimation' || overLiquid === undefined) return noVapour(model);
  const reason = `the vapour pressure of the solid stays below ${LEAST_PRESSURE_PA} Pa; kind=standard is there`;
  return missing(`sublimation of ${record.name} along its line`, reason);
}

/** What is said of the vapour where it is asked for and not there. */
export function noVapour({ record }: CondensedModel): Problem {
  return missing(`vapour of ${record.name}`, vapourWords(record));
}

export function vapourWords({ vapour, end }: CondensedRecord): string {
  if (vapour?.lacking !== undefined) return vapour.lacking;
  return end === undefined ? 'no data in the catalogue' : `no data in the catalogue; ${end.why}`;
}

/** Refuses a pressure at which neglecting the volumes of the condensed phases is no longer defensible. */
export function checkPressure({ record }: CondensedModel, pressurePa: number, highestPa = HIGHEST_PRESSURE_PA): void {
  if (pressurePa >= 0 && pressurePa <= highestPa) return;
  throw new Problem({
    code: 'range',
    argument: 'pressure',
    quantity: 'pressure',
    received: pressurePa,
    from: 0,
    to: highestPa,
    subject: `${record.name}: the data set has no volumes`,
  });
}
