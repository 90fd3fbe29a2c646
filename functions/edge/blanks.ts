/**
 * Some hosts hand blank cells over as 0 or null. Where one can say which cells of a range are truly empty,
 * an exact 0 is checked against the sheet before it is believed.
 */
export type BlankReader = (address: string) => Promise<readonly (readonly boolean[])[]>;

let reader: BlankReader | undefined;

/** Installs the host's reader; `undefined` takes it away. Hosts that hand over null for a blank need none. */
export function setBlankReader(next: BlankReader | undefined): void {
  reader = next;
}

/** True when `cells` holds a value that a blank could hide behind and the host can tell. */
export function needsBlankCheck(
  cells: readonly (readonly unknown[])[],
  address: string | undefined,
): address is string {
  if (reader === undefined || address === undefined) return false;
  for (const row of cells) for (const cell of row) if (cell === 0 || cell === null) return true;
  return false;
}

/** The same cells with every truly empty one as null. */
export async function withBlanks(cells: readonly (readonly unknown[])[], address: string): Promise<unknown[][]> {
  if (reader === undefined) return cells.map((row) => [...row]);
  const empty = await reader(address);
  return cells.map((row, r) => row.map((cell, c) => (cell === 0 && empty[r]?.[c] === true ? null : cell)));
}
