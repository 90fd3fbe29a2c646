import { entries } from '../../../../core/catalogue/entries';
import type { HouseFault } from '../../../../core/house/house';
import { HOUSE_HEADS, type HouseColumn } from '../../../../core/house/houseRow';
import { readHouse } from '../../../../core/house/readHouse';
import type { Decimal } from '../../../../core/units/parseNumber';
import { parseArea } from '../../../hosts/address';
import { planSubstanceRow, type SubstanceRow } from '../../../plan/planSubstance';
import type { Block, Cell } from '../../../port';

/** What is wrong with a row that would be added, by column, and what only needs a second look. */
export interface RowFaults {
  readonly errors: Readonly<Partial<Record<HouseColumn, string>>>;
  readonly warnings: readonly string[];
}

/**
 * Reads the sheet as it would be with the row in it, and keeps what the reader says of that row.
 * @param block the block of substances, or undefined where the workbook has none
 */
export function rowFaults(block: Block | undefined, row: SubstanceRow, decimal: Decimal): RowFaults {
  const planned = planSubstanceRow(block, [row]).find((change) => change.kind === 'cells' && change.format === 'input');
  const area = planned?.kind === 'cells' ? parseArea(planned.ref.address) : null;
  const lines = planned?.kind === 'cells' ? planned.values : undefined;
  if (area === null || lines === undefined) throw new TypeError('a row that is planned nowhere');
  const above = block === undefined ? [HOUSE_HEADS] : block.values;
  const firstRow = block === undefined ? area.top : (parseArea(block.ref.address)?.top ?? 0) + 1;
  const own = area.top + 1;
  const values: (readonly Cell[])[] = [...above];
  for (const [i, line] of lines.entries()) values[own - firstRow + i] = line;
  const faults = readHouse(values, { decimal, firstRow, builtIn: entries }).faults.filter((fault) => fault.row === own);
  return {
    errors: Object.fromEntries(
      faults.filter(({ severity }) => severity === 'error').map((fault) => [fault.column, words(fault)]),
    ),
    warnings: faults.filter(({ severity }) => severity === 'warning').map(words),
  };
}

/** Without the row and column, which the form shows by the place of the message, and with the nearest word first. */
function words({ message, column }: HouseFault): string {
  const start = message.indexOf(`${column}: `);
  const text = start < 0 ? message : message.slice(start + column.length + 2);
  const [, all = text, near] = /^(.*); nearest: (.*)$/.exec(text) ?? [];
  const sentence = all.charAt(0).toUpperCase() + all.slice(1);
  return near === undefined ? sentence : `Perhaps ${near}? ${sentence}`;
}
