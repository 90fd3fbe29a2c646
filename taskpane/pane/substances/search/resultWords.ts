import type { Hit } from './searchEntries';

/** What a search gave, for those who hear it: how many, the first of them, or what was probably meant. */
export function resultWords(typed: string, hits: readonly Hit[], nearestName: string | undefined): string {
  const text = typed.trim();
  const [first] = hits;
  if (first === undefined) {
    return nearestName === undefined
      ? `Nothing is called “${text}” here, nor nearly so.`
      : `Nothing is called “${text}” here. Nearest: ${nearestName}.`;
  }
  if (text === '') return `${hits.length} substances.`;
  return hits.length === 1 ? `One match: ${first.entry.name}.` : `${hits.length} matches, first ${first.entry.name}.`;
}
