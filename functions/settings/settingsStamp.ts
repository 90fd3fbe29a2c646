import { settingsRows } from './settingsRows';
import type { Settings } from './settingsType';

/**
 * A short text that changes when the unit settings or the edition do: 64 bits of FNV-1a in hexadecimal.
 *
 * @param settings the unit settings; options of single formulas don't count
 * @param edition edition of the functions and of their data
 * @source G. Fowler, L. C. Noll, K.-P. Vo, FNV-1a, IETF draft-eastlake-fnv
 */
export function settingsStamp(settings: Settings, edition: string): string {
  const text = JSON.stringify([settingsRows(settings), edition]);
  let hash = 0xcbf29ce484222325n;
  for (let i = 0; i < text.length; i++) {
    const unit = text.charCodeAt(i);
    for (const byte of [unit & 0xff, unit >> 8]) hash = BigInt.asUintN(64, (hash ^ BigInt(byte)) * 0x100000001b3n);
  }
  return hash.toString(16).padStart(16, '0');
}
