import { Button } from '@fluentui/react-components';
import { useState, useSyncExternalStore } from 'react';
import { recalculateStale } from '../../boot/recalculateStale';
import { staleness } from '../../boot/staleness';
import type { WorkbookHost } from '../../port';
import { Notice } from './Notice';
import { wordsOf } from './wordsOf';

const subscribe = (changed: () => void) => staleness.subscribe(changed);

/** Says that the values come from another edition, and computes them anew when asked to. */
export function StaleNotice({ host }: { readonly host: WorkbookHost }) {
  const state = useSyncExternalStore(subscribe, staleness.current);
  const [failure, setFailure] = useState<string>();
  if (state.state === 'fresh') return null;
  return (
    <Notice tone="caution">
      <span>
        The values in this workbook were computed by {state.from}; this is {state.to}. They stay as they are until you
        recalculate them.
      </span>
      <Button
        size="small"
        onClick={() => {
          recalculateStale(host).then(
            () => setFailure(undefined),
            (error: unknown) => setFailure(wordsOf(error)),
          );
        }}
      >
        Recalculate with this edition
      </Button>
      {failure !== undefined && <span role="alert">Not recalculated: {failure}.</span>}
    </Notice>
  );
}
