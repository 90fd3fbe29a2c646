import { Button } from '@fluentui/react-components';
import { formatReference } from '../../../hosts/address';
import { Notice } from '../../look/Notice';
import { useLook } from '../../look/useLook';
import type { InsertOutcome, Inserting } from './useInsert';

/** What became of the last insertion, with the choices that are left where a cell was not empty. */
export function InsertNotice({
  outcome,
  inserting,
}: {
  readonly outcome: InsertOutcome;
  readonly inserting: Inserting;
}) {
  const look = useLook();
  switch (outcome.state) {
    case 'failed':
      return <Notice tone="error">Nothing was written: {outcome.text}.</Notice>;
    case 'done':
      return (
        <Notice>
          <span role="status">
            In {formatReference(outcome.at)} now: <code>{outcome.formula}</code>
          </span>
          <Button size="small" type="button" onClick={() => void inserting.show(outcome.at)}>
            Show this cell
          </Button>
        </Notice>
      );
    case 'occupied': {
      const { errors, insert, replaceable, free } = outcome;
      return (
        <Notice tone="error">
          <span>Nothing was written: {errors.map(({ text }) => text).join('; ')}.</span>
          <span className={look.row}>
            {free !== undefined && (
              <Button size="small" type="button" onClick={() => void inserting.settle({ ...insert, cell: free })}>
                Use the free cell {formatReference(free)}
              </Button>
            )}
            {replaceable && (
              <Button size="small" type="button" onClick={() => void inserting.settle(insert)}>
                Write over {formatReference(insert.cell)}
              </Button>
            )}
          </span>
        </Notice>
      );
    }
  }
}
