import { Button } from '@fluentui/react-components';
import { SETTINGS } from '../../../functions/settings/schema';
import type { StoreState } from '../../../functions/settings/store';
import { formatReference } from '../../hosts/address';
import { unitsRows, within } from '../../plan/unitsBlock';
import type { Block } from '../../port';
import { Notice } from '../look/Notice';
import { checkDraft, draftOf } from './draft';

export interface UnitsStateProps {
  readonly state: StoreState;
  readonly block: Block | null;
  readonly onRepairValue: (key: string, value: string) => void;
  readonly onRepairAll: () => void;
}

/** Says whether the workbook has its units, and offers the repair where they can't be read. */
export function UnitsState({ state, block, onRepairValue, onRepairAll }: UnitsStateProps) {
  switch (state.state) {
    case 'unread':
      return <Notice>The workbook has not been read yet. Its settings are shown as soon as it has.</Notice>;
    case 'absent':
      return (
        <Notice tone="caution">
          This workbook has no Units sheet yet. Its formulas use the settings below; create the sheet to keep them with
          the file.
        </Notice>
      );
    case 'broken':
      return (
        <Notice tone="error">
          <span>
            {block === null ? state.cell : formatReference({ sheet: block.ref.sheet, address: state.cell })} holds “
            {state.text}”, which can’t be read. Until it is repaired, formulas answer #VALUE! instead of guessing.
            Allowed: {state.message}.
          </span>
          {block !== null && <Repair block={block} onRepairValue={onRepairValue} onRepairAll={onRepairAll} />}
        </Notice>
      );
    case 'ready':
      return null;
  }
}

/** One button for each value that can't be read, or one for the whole block where a label is at fault. */
function Repair({
  block,
  onRepairValue,
  onRepairAll,
}: Omit<UnitsStateProps, 'state' | 'block'> & { readonly block: Block }) {
  const rows = unitsRows(block);
  if (block.values.some((row) => row.length !== 2)) {
    return <span>The name Latentry_units must cover two columns, label and value: point it at them again.</span>;
  }
  if (rows.some(({ key }) => key === undefined)) {
    return (
      <Button size="small" type="button" onClick={onRepairAll}>
        Write the whole block anew
      </Button>
    );
  }
  const { errors } = checkDraft(draftOf(block));
  return rows.map(({ key, row, value }) => {
    const schema = SETTINGS.find((one) => one.key === key);
    if (key === undefined || schema === undefined || (errors[key] === undefined && value !== '')) return null;
    return (
      <Button key={key} size="small" type="button" onClick={() => onRepairValue(key, schema.default)}>
        Write {schema.default} in {formatReference(within(block.ref, row, 1))}
      </Button>
    );
  });
}
