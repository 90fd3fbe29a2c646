import { UNITS_NAME } from '../boot/readSnapshot';
import { formatReference } from '../hosts/address';
import type { Cell, Change, Ref } from '../port';
import { within } from './unitsBlock';

/** A fit to be put into the workbook. */
export interface FitInsert {
  /** First cell of the place for it. */
  readonly at: Ref;
  /** Columns of the data, headers included. */
  readonly temperatures: Ref;
  readonly latents: Ref;
  /** Settings of the fit beside the Units block, as `reference=25 degC; kind=coexistence`. */
  readonly settings: string;
  /** The table of the fit, row by row. */
  readonly table: readonly (readonly Cell[])[];
  /** Latent heat at one temperature from that table. */
  readonly example: {
    readonly temperature: number;
    readonly temperatureUnit: string;
    readonly heatUnit: string;
    readonly latent: number;
    readonly uncertainty: number | undefined;
    /** Settings of its formula beside the Units block; empty where the block says it all. */
    readonly settings: string;
  };
}

/** As formulas that follow the data, or as the values of this moment. */
export type InsertAs = 'formulas' | 'values';

/**
 * Plans the writing of a fit: a heading, the table, and below it the latent heat at one temperature.
 *
 * As formulas it is one FITDELTACP, whose spill the plan covers, and one FITLATENT that reads the table and a
 * temperature cell. Both pass the Units block; the uncertainty columns, which a line does not use, stay empty arguments.
 *
 * @param insert where, from what, and the numbers of the fit
 * @param as formulas or values
 */
export function planFit(insert: FitInsert, as: InsertAs): Change[] {
  const { at, table, example } = insert;
  const height = table.length;
  const width = table[0]?.length ?? 1;
  const place = within(at, 1, 0, height, width);
  const below = height + 2;
  const temperature = within(at, below + 1, 0);
  const answer = within(at, below + 1, 1, 1, 2);
  return [
    { kind: 'cells', ref: at, values: [[titleOf(insert, as)]], format: 'heading' },
    as === 'values'
      ? { kind: 'cells', ref: place, values: table, format: 'plain' }
      : { kind: 'cells', ref: place, formulas: spilling(fitFormula(insert), height, width), format: 'answer' },
    {
      kind: 'cells',
      ref: within(at, below, 0, 1, 3),
      values: [[`T / ${example.temperatureUnit}`, `ΔH / ${example.heatUnit}`, 'standard uncertainty']],
      format: 'heading',
    },
    { kind: 'cells', ref: temperature, values: [[example.temperature]], format: as === 'values' ? 'plain' : 'input' },
    as === 'values'
      ? { kind: 'cells', ref: answer, values: [[example.latent, example.uncertainty ?? '']], format: 'plain' }
      : {
          kind: 'cells',
          ref: answer,
          formulas: spilling(exampleFormula(insert, place, temperature), 1, 2),
          format: 'answer',
        },
  ];
}

function titleOf({ temperatures, latents }: FitInsert, as: InsertAs): string {
  const title = `ΔCp fit: ${formatReference(latents)} against ${formatReference(temperatures)}`;
  return as === 'values' ? `${title}, values` : title;
}

function fitFormula({ temperatures, latents, settings }: FitInsert): string {
  return formula('FITDELTACP', [formatReference(temperatures), formatReference(latents), '', ''], settings);
}

function exampleFormula({ example }: FitInsert, table: Ref, temperature: Ref): string {
  return formula('FITLATENT', [table.address, temperature.address], example.settings);
}

function formula(name: string, args: readonly string[], settings: string): string {
  const last = settings === '' ? [] : [`"${settings.replace(/"/g, '""')}"`];
  return `=LATENTRY.${name}(${[...args, UNITS_NAME, ...last].join(',')})`;
}

/** A formula in the first cell of the place that it will fill. */
function spilling(text: string, height: number, width: number): string[][] {
  return Array.from({ length: height }, (_, r) =>
    Array.from({ length: width }, (__, c) => (r === 0 && c === 0 ? text : '')),
  );
}
