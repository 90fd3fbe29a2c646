import type { House } from '../../core/house/house';

/** What is known of the workbook's own substances. */
export type HouseState =
  | { readonly state: 'unread' }
  /** Read, and there is no block of substances. */
  | { readonly state: 'absent' }
  /** The name of the block leads to no cells. */
  | { readonly state: 'broken'; readonly text: string }
  /** `stamp` tells one state of the rows from another. */
  | { readonly state: 'ready'; readonly house: House; readonly stamp: string };

export interface HouseStore {
  current(): HouseState;
  /** Counts the changes: what was made from an earlier version may be out of date. */
  version(): number;
  /** Takes a new state over; says whether it differs from the last, and only then tells the subscribers. */
  publish(state: HouseState): boolean;
  /** Calls `listener` at each change; the result ends it. */
  subscribe(listener: (state: HouseState) => void): () => void;
}

/** A store of its own; the bundle has one, `houseStore`. */
export function createHouseStore(): HouseStore {
  let state: HouseState = { state: 'unread' };
  let version = 0;
  const listeners = new Set<(state: HouseState) => void>();
  return {
    current: () => state,
    version: () => version,
    publish(next) {
      if (sameState(state, next)) return false;
      state = next;
      version += 1;
      for (const listener of [...listeners]) listener(next);
      return true;
    },
    subscribe(listener) {
      // A wrapper of its own, so that the same listener can come twice.
      const own = (next: HouseState): void => {
        listener(next);
      };
      listeners.add(own);
      return () => void listeners.delete(own);
    },
  };
}

function sameState(a: HouseState, b: HouseState): boolean {
  if (a.state === 'ready' && b.state === 'ready') return a.stamp === b.stamp;
  if (a.state === 'broken' && b.state === 'broken') return a.text === b.text;
  return a.state === b.state;
}

/** The substances of the open workbook, shared by functions and pane. */
export const houseStore: HouseStore = createHouseStore();
