import type { Settings } from './settingsType';

/** What is known of the workbook's own settings. */
export type StoreState =
  | { readonly state: 'unread' }
  /** Read, and there is no Units block: the defaults hold. */
  | { readonly state: 'absent' }
  | { readonly state: 'ready'; readonly settings: Settings; readonly stamp: string }
  /** A setting can't be read: where, what stands there, and what is allowed. */
  | { readonly state: 'broken'; readonly cell: string; readonly text: string; readonly message: string };

export interface SettingsStore {
  current(): StoreState;
  /** Takes a new state over; says whether it differs from the last, and only then tells the subscribers. */
  publish(state: StoreState): boolean;
  /** Calls `listener` at each change; the result ends it. */
  subscribe(listener: (state: StoreState) => void): () => void;
  /** The first state that is not `unread`, or `unread` once `timeoutMs` have passed. */
  whenRead(timeoutMs: number): Promise<StoreState>;
}

/** A store of its own; the bundle has one, `settingsStore`. */
export function createSettingsStore(): SettingsStore {
  let state: StoreState = { state: 'unread' };
  const listeners = new Set<(state: StoreState) => void>();
  const subscribe = (listener: (state: StoreState) => void): (() => void) => {
    // A wrapper of its own, so that the same listener can come twice.
    const own = (next: StoreState): void => {
      listener(next);
    };
    listeners.add(own);
    return () => void listeners.delete(own);
  };
  return {
    current: () => state,
    publish(next) {
      if (sameState(state, next)) return false;
      state = next;
      for (const listener of [...listeners]) listener(next);
      return true;
    },
    subscribe,
    whenRead: (timeoutMs) =>
      new Promise((resolve) => {
        // A host without timers gets what is known.
        if (state.state !== 'unread' || typeof setTimeout !== 'function') {
          resolve(state);
          return;
        }
        const finish = (): void => {
          stop();
          clearTimeout(timer);
          resolve(state);
        };
        const stop = subscribe((next) => {
          if (next.state !== 'unread') finish();
        });
        const timer = setTimeout(finish, timeoutMs);
      }),
  };
}

function sameState(a: StoreState, b: StoreState): boolean {
  if (a.state === 'ready' && b.state === 'ready') return a.stamp === b.stamp;
  if (a.state === 'broken' && b.state === 'broken') {
    return a.cell === b.cell && a.text === b.text && a.message === b.message;
  }
  return a.state === b.state;
}

/** The settings of the open workbook, shared by functions and pane. */
export const settingsStore: SettingsStore = createSettingsStore();
