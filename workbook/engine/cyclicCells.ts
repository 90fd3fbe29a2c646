import type { IFormulaDependencyTreeJson } from '@univerjs/engine-formula';

/**
 * The formulas that depend on themselves, directly or through each other: strongly connected parts of the
 * dependency graph, after R. Tarjan, SIAM Journal on Computing 1 (1972) 146, without recursion.
 */
export function cyclicCells(trees: readonly IFormulaDependencyTreeJson[]): IFormulaDependencyTreeJson[] {
  const byId = new Map(trees.map((tree) => [tree.treeId, tree]));
  const order = new Map<number, number>();
  const low = new Map<number, number>();
  const open: number[] = [];
  const isOpen = new Set<number>();
  const cyclic: IFormulaDependencyTreeJson[] = [];

  const close = (root: number): void => {
    const members = open.splice(open.lastIndexOf(root));
    for (const id of members) {
      isOpen.delete(id);
      const tree = byId.get(id);
      if (tree !== undefined && (members.length > 1 || tree.children.includes(id))) cyclic.push(tree);
    }
  };

  for (const start of byId.keys()) {
    if (order.has(start)) continue;
    const path = [{ id: start, next: 0 }];
    while (path.length > 0) {
      const step = path[path.length - 1];
      if (step === undefined) break;
      const { id } = step;
      if (step.next === 0) {
        order.set(id, order.size);
        low.set(id, order.size - 1);
        open.push(id);
        isOpen.add(id);
      }
      const child = byId.get(id)?.children[step.next];
      step.next += 1;
      if (child !== undefined) {
        if (!order.has(child)) path.push({ id: child, next: 0 });
        else if (isOpen.has(child)) low.set(id, Math.min(low.get(id) ?? 0, order.get(child) ?? 0));
        continue;
      }
      path.pop();
      if (low.get(id) === order.get(id)) close(id);
      const parent = path.at(-1)?.id;
      if (parent !== undefined) low.set(parent, Math.min(low.get(parent) ?? 0, low.get(id) ?? 0));
    }
  }
  return cyclic;
}
