import { useState } from 'react';
import { formulaText, type FormulaAsk, type FormulaAt } from '../../../plan/formulaText';
import { planFormula, type FormulaInsert } from '../../../plan/planFormula';
import { UNITS_SHEET, within } from '../../../plan/unitsBlock';
import type { HostError, Ref, WorkbookHost } from '../../../port';
import { wordsOf } from '../../look/wordsOf';
import { cellArgument, insertTarget } from './insertTarget';

export type InsertOutcome =
  | { readonly state: 'done'; readonly at: Ref; readonly formula: string }
  | { readonly state: 'failed'; readonly text: string }
  | {
      readonly state: 'occupied';
      readonly errors: readonly HostError[];
      readonly insert: FormulaInsert;
      /** True where what stands in the way is the cell itself, which may be written over. */
      readonly replaceable: boolean;
      readonly free: Ref | undefined;
    };

/** The last insertion: which line it was asked from, and what became of it. */
export interface LastInsert {
  readonly name: string;
  readonly outcome: InsertOutcome;
}

export interface Inserting {
  readonly last: LastInsert | undefined;
  /** Puts a formula into the selected cell, with the shown temperature or a cell as `A2`. */
  readonly insert: (name: string, ask: FormulaAsk) => Promise<void>;
  /** Answers what stood in the way: takes another cell, or writes over it. */
  readonly settle: (insert: FormulaInsert) => Promise<void>;
  readonly show: (at: Ref) => Promise<void>;
}

/** How often a free cell is looked for, one to the right each time. */
const TRIES = 12;

/** Insertion of single formulas into the workbook; nothing is written over without a word. */
export function useInsert(host: WorkbookHost, at: FormulaAt, cell: string, withoutUnits: boolean): Inserting {
  const [last, setLast] = useState<LastInsert>();

  const attempt = async (name: string, work: () => Promise<InsertOutcome>): Promise<void> => {
    try {
      setLast({ name, outcome: await work() });
    } catch (error) {
      setLast({ name, outcome: { state: 'failed', text: wordsOf(error) } });
    }
  };
  const write = async (insert: FormulaInsert): Promise<InsertOutcome> => {
    await host.apply(planFormula(insert, withoutUnits), 'formula');
    return { state: 'done', at: insert.cell, formula: formulaText(insert.ask, insert.at) };
  };
  return {
    last,
    insert: (name, ask) =>
      attempt(name, async () => {
        const target = insertTarget(await host.selection());
        const temperature = cell.trim() === '' ? at.temperature : cellArgument(cell, target);
        const insert = { cell: target, ask, at: { ...at, temperature } };
        const check = (one: FormulaInsert) => host.check(planFormula(one, withoutUnits));
        const errors = await check(insert);
        if (errors.length === 0) return write(insert);
        return {
          state: 'occupied',
          errors,
          insert,
          replaceable: errors.every((error) => error.reason === 'occupied' && isAt(error, target)),
          free: await freeCell(insert, check),
        };
      }),
    settle: (insert) => attempt(last?.name ?? '', () => write(insert)),
    show: (ref) =>
      host.reveal(ref).catch((error: unknown) => {
        setLast({ name: last?.name ?? '', outcome: { state: 'failed', text: wordsOf(error) } });
      }),
  };
}

function isAt({ ref }: HostError, cell: Ref): boolean {
  return ref.sheet.toLowerCase() === cell.sheet.toLowerCase() && ref.address === cell.address;
}

/** The first free cell to the right, if there is one near. */
async function freeCell(
  insert: FormulaInsert,
  check: (insert: FormulaInsert) => Promise<HostError[]>,
): Promise<Ref | undefined> {
  for (let right = 1; right <= TRIES; right++) {
    const cell = within(insert.cell, 0, right);
    const errors = await check({ ...insert, cell });
    if (errors.length === 0) return cell;
    if (errors.some(({ reason, ref }) => reason !== 'occupied' || ref.sheet === UNITS_SHEET)) return undefined;
  }
  return undefined;
}
