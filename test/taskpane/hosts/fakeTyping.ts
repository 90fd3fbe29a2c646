import type { Cell } from '../../../taskpane/port';

/** What Excel makes of something typed or written: null keeps the cell, text is read as if typed. */
export function asTyped(input: unknown): Cell | { readonly formula: string } | undefined {
  if (input === null || input === undefined) return undefined;
  if (typeof input === 'number' || typeof input === 'boolean') return input;
  if (typeof input !== 'string') throw new Error('fake Excel: a cell takes text, number or truth value');
  if (input === '') return null;
  if (input.startsWith("'")) return input.slice(1);
  if (input.startsWith('=')) return { formula: input };
  if (/^(true|false)$/i.test(input)) return input.toLowerCase() === 'true';
  if (/^\d+\/\d+$/.test(input)) return 45_000; // a date
  if (/^-?\d+(\.\d+)?%?$/.test(input)) return input.endsWith('%') ? Number(input.slice(0, -1)) / 100 : Number(input);
  if (input === '#N/A' || input === '#VALUE!') return { error: input };
  return input;
}

export function shownValue(value: Cell): string | number | boolean {
  if (value === null) return '';
  return typeof value === 'object' ? value.error : value;
}

export function valueType(value: Cell): string {
  if (value === null) return 'Empty';
  if (typeof value === 'object') return 'Error';
  return { string: 'String', number: 'Double', boolean: 'Boolean' }[typeof value as 'string' | 'number' | 'boolean'];
}
