/** Whether saved values come from another edition of functions or data than the one that runs. */
export type Staleness =
  { readonly state: 'fresh' } | { readonly state: 'stale'; readonly from: string; readonly to: string };

let current: Staleness = { state: 'fresh' };
const listeners = new Set<() => void>();

/** The pane reads this to say so; values of another edition are never replaced in silence. */
export const staleness = {
  current: (): Staleness => current,
  publish(next: Staleness): void {
    if (JSON.stringify(next) === JSON.stringify(current)) return;
    current = next;
    for (const listener of [...listeners]) listener();
  },
  subscribe(listener: () => void): () => void {
    listeners.add(listener);
    return () => {
      listeners.delete(listener);
    };
  },
};
