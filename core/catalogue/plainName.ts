/** Case, spaces, hyphens and underscores do not matter in a name. */
export function plainName(text: string): string {
  return text.toLowerCase().replace(/[\s\-_]+/g, '');
}
