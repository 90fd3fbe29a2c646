/**
 * Writes the numbers of a constant in a formula the one way that the formula engine takes for numbers;
 * texts in quotes stay as they are.
 * @example
 * plainNumbers('60.0') // => '60'
 * plainNumbers('{1.50,"1.50"}') // => '{1.5,"1.50"}'
 */
export function plainNumbers(token: string): string {
  const text = token.trim();
  if (text.startsWith('"')) return token;
  if (!text.startsWith('{')) return plainNumber(token);
  return text.replace(/"(?:[^"]|"")*"|[^{},;"]+/g, (piece) => (piece.startsWith('"') ? piece : plainNumber(piece)));
}

function plainNumber(text: string): string {
  if (!/^\s*[-+]?(?:\d+\.?\d*|\.\d+)(?:[eE][-+]?\d+)?\s*$/.test(text)) return text;
  const value = Number(text);
  return Number.isFinite(value) ? String(value) : text;
}
