import type { CellFormat } from '../../port';

interface Look {
  readonly bold: boolean;
  readonly italic: boolean;
  readonly color: string;
  /** Null clears the fill. */
  readonly fill: string | null;
}

/** How the port's formats look on a sheet; dark on light, 7:1 or better. */
export const FORMATS: Readonly<Record<CellFormat, Look>> = {
  plain: { bold: false, italic: false, color: '#000000', fill: null },
  heading: { bold: true, italic: false, color: '#12333F', fill: '#DCE9EC' },
  input: { bold: false, italic: false, color: '#123A8C', fill: '#FFF8E1' },
  answer: { bold: false, italic: false, color: '#000000', fill: '#EEF5EA' },
  note: { bold: false, italic: true, color: '#404040', fill: null },
};

/** Queues a format for cells. */
export function queueFormat(range: Excel.Range, format: CellFormat): void {
  const { bold, italic, color, fill } = FORMATS[format];
  range.format.font.bold = bold;
  range.format.font.italic = italic;
  range.format.font.color = color;
  if (fill === null) range.format.fill.clear();
  else range.format.fill.color = fill;
}
