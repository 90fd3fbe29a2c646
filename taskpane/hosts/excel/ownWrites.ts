import type { Ref } from '../../port';
import { parseArea } from '../address';

/** Excel reports a write well within this time. */
const FORGOTTEN_AFTER_MS = 15_000;

interface Entry {
  readonly sheet: string;
  readonly address: string;
  readonly at: number;
}

export interface OwnWrites {
  readonly expect: (ref: Ref) => void;
  /** True once for each write that was expected at that place. */
  readonly recognise: (ref: Ref) => boolean;
}

function inside(inner: string, outer: string): boolean {
  const a = parseArea(inner);
  const b = parseArea(outer);
  if (a === null || b === null) return inner === outer;
  return (
    a.top >= b.top && a.left >= b.left && a.top + a.rows <= b.top + b.rows && a.left + a.columns <= b.left + b.columns
  );
}

/** Remembers what this add-in is about to write, for hosts that do not say who wrote. */
export function ownWrites(now: () => number = Date.now): OwnWrites {
  let entries: Entry[] = [];
  return {
    expect(ref) {
      entries.push({ sheet: ref.sheet.toLowerCase(), address: ref.address, at: now() });
    },
    recognise(ref) {
      entries = entries.filter((entry) => now() - entry.at < FORGOTTEN_AFTER_MS);
      const hit = entries.findIndex(
        (entry) => entry.sheet === ref.sheet.toLowerCase() && inside(ref.address, entry.address),
      );
      if (hit < 0) return false;
      entries.splice(hit, 1);
      return true;
    },
  };
}
