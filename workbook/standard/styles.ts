import type { BookStyle } from '../book';

const KELP = '1F4D43';
const SHORE = '3C7365';
const INK = '24323A';
const SLATE = '5A6A71';
const TIDE = 'C9D8D1';
const FOAM = 'E6EFEB';
const SAND = 'FFF5E0';
const SAND_LINE = 'E2C08F';
const AMBER = '6B4106';
const CORAL = 'FBE8DF';
const RUST = '8A3413';

/** How each sort of cell looks in the standard workbook: kelp green and slate, warm where a person types. */
export const standardStyles = {
  title: { bold: true, size: 20, color: KELP, valign: 'center' },
  subtitle: { size: 12, color: SLATE, wrap: true, valign: 'top' },
  section: { bold: true, size: 13, color: SHORE, under: TIDE, valign: 'center' },
  heading: { bold: true, color: INK, fill: FOAM, under: SHORE, wrap: true, valign: 'center' },
  columnHead: { bold: true, color: INK, fill: FOAM, under: SHORE, wrap: true, align: 'right', valign: 'center' },
  label: { color: INK, valign: 'center' },
  input: { color: AMBER, fill: SAND, box: SAND_LINE, valign: 'center' },
  limit: { color: AMBER, fill: SAND, box: SAND_LINE, align: 'center', valign: 'center' },
  answer: { color: KELP, under: FOAM, align: 'right', valign: 'center' },
  data: { color: INK, under: FOAM, align: 'right', valign: 'center' },
  text: { color: INK, wrap: true, valign: 'top' },
  note: { italic: true, color: SLATE, wrap: true, valign: 'top' },
  remark: { italic: true, color: SLATE, valign: 'center' },
  caution: { color: RUST, fill: CORAL, wrap: true, valign: 'center' },
} as const satisfies Record<string, BookStyle>;

export type StandardStyle = keyof typeof standardStyles;
