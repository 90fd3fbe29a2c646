/** A cut into a text: what stands between `start` and `end` gives way to `text`. */
export interface TextEdit {
  readonly start: number;
  readonly end: number;
  readonly text: string;
}

/**
 * Applies edits that don't overlap; edits at one place keep their order.
 *
 * @param source - the text
 * @param edits - in any order
 * @returns the text with all edits made
 * @example
 * applyEdits('abc', [{ start: 1, end: 2, text: 'X' }]) // => 'aXc'
 */
export function applyEdits(source: string, edits: readonly TextEdit[]): string {
  const pieces: string[] = [];
  let at = 0;
  for (const edit of [...edits].sort((a, b) => a.start - b.start || a.end - b.end)) {
    pieces.push(source.slice(at, edit.start), edit.text);
    at = Math.max(at, edit.end);
  }
  pieces.push(source.slice(at));
  return pieces.join('');
}
