import type { Parts } from './parts';
import { childrenOf, xmlTree } from './xmlTree';

export interface Relation {
  readonly id: string;
  /** Last word of the type: `worksheet`, `styles`. */
  readonly type: string;
  /** Full name of the part it leads to. */
  readonly target: string;
}

/** The part that holds the relations of `part`; of the package itself for `''`. */
export function relationsPart(part: string): string {
  const slash = part.lastIndexOf('/');
  return `${part.slice(0, slash + 1)}_rels/${part.slice(slash + 1)}.rels`;
}

/**
 * Reads the relations of a part within the package; links that lead outside are left out.
 *
 * @param parts - the package
 * @param part - name of the part, or `''` for the package
 */
export function readRelations(parts: Pick<Parts, 'text'>, part: string): Relation[] {
  const place = relationsPart(part);
  return childrenOf(xmlTree(parts.text(place), place), 'Relationship')
    .filter((node) => node.attributes['TargetMode'] !== 'External')
    .map((node) => ({
      id: node.attributes['Id'] ?? '',
      type: (node.attributes['Type'] ?? '').replace(/^.*\//, ''),
      target: resolve(part, node.attributes['Target'] ?? ''),
    }));
}

function resolve(from: string, target: string): string {
  const names = target.startsWith('/') ? [] : from.split('/').slice(0, -1);
  for (const name of target.split('/')) {
    if (name === '..') names.pop();
    else if (name !== '.' && name !== '') names.push(name);
  }
  return names.join('/');
}
