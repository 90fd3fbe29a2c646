import { useSyncExternalStore } from 'react';
import type { CellInfo } from './cellInfo';

export interface CellLineStore {
  readonly current: () => CellInfo;
  readonly subscribe: (changed: () => void) => () => void;
}

/** One line below the formula bar about the active cell; errors and notes are read out. */
export function CellLine({ store }: { readonly store: CellLineStore }) {
  const { tone, text } = useSyncExternalStore(store.subscribe, store.current);
  return (
    <section className={`cell-line ${tone}`} aria-label="About the active cell">
      <p role="status" id="cell-status">
        {tone === 'plain' ? '' : text}
      </p>
      <p>{tone === 'plain' ? text : ''}</p>
    </section>
  );
}
