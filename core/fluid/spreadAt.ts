/** A value between nodes, on straight lines; the end values beyond them. */
export function spreadAt(nodes: readonly number[], values: readonly number[], x: number): number {
  const last = nodes.length - 1;
  let i = 1;
  while (i < last && (nodes[i] ?? Infinity) < x) i++;
  const [x0 = 0, x1 = 1] = [nodes[i - 1], nodes[i]];
  const [y0 = 0, y1 = 0] = [values[i - 1], values[i]];
  const share = Math.min(1, Math.max(0, (x - x0) / (x1 - x0)));
  return y0 + share * (y1 - y0);
}
