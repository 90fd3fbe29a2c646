import type { Ref } from '../../port';
import { parseReference } from '../address';

/** Names of workbook scope that start with `prefix`, as Excel compares names: without regard to case. */
export async function readNames(context: Excel.RequestContext, prefix: string): Promise<Map<string, Ref | 'broken'>> {
  const items = context.workbook.names.load('items/name,items/formula,items/value,items/scope');
  await context.sync();
  const found = new Map<string, Ref | 'broken'>();
  for (const { name, formula, value, scope } of items.items) {
    if (scope !== Excel.NamedItemScope.workbook || !name.toLowerCase().startsWith(prefix.toLowerCase())) continue;
    found.set(name, parseReference(String(formula)) ?? parseReference(String(value)) ?? 'broken');
  }
  return found;
}
