import type { Evaluate } from './memoryWorkbook';

/** Knows `=A2*2` and `=Data!A2*2` only. */
export const doubling: Evaluate = (formula, at, cell) => {
  const match = /^=(?:(\w+)!)?([A-Z]+\d+)\*2$/.exec(formula);
  if (match === null) return { error: '#NAME?' };
  const value = cell({ sheet: match[1] ?? at.sheet, address: match[2] ?? '' });
  return typeof value === 'number' ? value * 2 : { error: '#VALUE!' };
};
