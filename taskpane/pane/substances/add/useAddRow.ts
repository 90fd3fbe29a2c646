import { useState } from 'react';
import type { HouseColumn } from '../../../../core/house/houseRow';
import type { Decimal } from '../../../../core/units/parseNumber';
import { SUBSTANCES_NAME } from '../../../boot/readSnapshot';
import { formatReference } from '../../../hosts/address';
import { planSubstanceRow } from '../../../plan/planSubstance';
import { within } from '../../../plan/unitsBlock';
import type { Block, WorkbookHost } from '../../../port';
import { wordsOf } from '../../look/wordsOf';
import { draftRow, type RowDraft } from './draftRow';
import { rowFaults, type RowFaults } from './rowFaults';

export type AddOutcome =
  | { readonly state: 'refused'; readonly errors: RowFaults['errors'] }
  | { readonly state: 'failed'; readonly text: string }
  | { readonly state: 'done'; readonly substance: string; readonly at: string; readonly warnings: readonly string[] };

export interface Adding {
  readonly outcome: AddOutcome | undefined;
  readonly errors: Readonly<Partial<Record<HouseColumn, string>>>;
  /** Checks the row and, where nothing is wrong with it, writes it; says whether it did. */
  readonly add: (draft: RowDraft) => Promise<AddOutcome>;
  /** Forgets what was said of a field that is being changed. */
  readonly forget: () => void;
}

/** Adding of one row to the team's own substances. */
export function useAddRow(host: WorkbookHost, decimal: Decimal): Adding {
  const [outcome, setOutcome] = useState<AddOutcome>();
  return {
    outcome,
    errors: outcome?.state === 'refused' ? outcome.errors : {},
    add: async (draft) => {
      const next = await written(host, draft, decimal);
      setOutcome(next);
      return next;
    },
    forget: () => setOutcome(undefined),
  };
}

async function written(host: WorkbookHost, draft: RowDraft, decimal: Decimal): Promise<AddOutcome> {
  try {
    const found = await readBlock(host);
    if (found === 'broken') {
      return { state: 'failed', text: `the name ${SUBSTANCES_NAME} leads to no cells: point it at the rows again` };
    }
    const row = draftRow(draft, decimal);
    const { errors, warnings } = rowFaults(found, row, decimal);
    if (Object.keys(errors).length > 0) return { state: 'refused', errors };
    const changes = planSubstanceRow(found, [row]);
    const inTheWay = await host.check(changes);
    if (inTheWay.length > 0) return { state: 'failed', text: inTheWay.map(({ text }) => text).join('; ') };
    await host.apply(changes, 'substance');
    const cells = changes.find((change) => change.kind === 'cells' && change.format === 'input');
    const at = cells?.kind === 'cells' ? formatReference(within(cells.ref, 0, 0, 1, cells.values?.[0]?.length)) : '';
    return { state: 'done', substance: draft.substance.trim(), at, warnings };
  } catch (error) {
    return { state: 'failed', text: wordsOf(error) };
  }
}

async function readBlock(host: WorkbookHost): Promise<Block | 'broken' | undefined> {
  const named = [...(await host.names(SUBSTANCES_NAME))].find(
    ([name]) => name.toLowerCase() === SUBSTANCES_NAME.toLowerCase(),
  );
  const ref = named?.[1];
  if (ref === undefined || ref === 'broken') return ref;
  const [block] = await host.read([ref]);
  return block ?? 'broken';
}
