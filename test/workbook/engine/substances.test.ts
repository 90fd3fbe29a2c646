import { beforeAll, describe, expect, it } from 'vitest';
import type { Book, BookCell } from '../../../workbook/book';
import { emptySheet } from '../../../workbook/emptySheet';
import { openEngine, type Engine } from '../../../workbook/engine/openEngine';
import { smallBundle } from './smallBundle';

let engine: Engine;

beforeAll(async () => {
  engine = await openEngine({ bundlePath: await smallBundle() });
});

function bookOf(cells: Record<string, BookCell>, formula = 'Substances!$A$4:$B$5'): Book {
  return {
    sheets: [{ ...emptySheet('Substances'), cells }],
    names: [{ name: 'Latentry_substances', formula }],
    styles: {},
    properties: {},
  };
}

function parsed(cell: unknown): unknown {
  return JSON.parse(typeof cell === 'string' ? cell : 'null');
}

/** What the functions were told, as the small bundle echoes it. */
async function told(book: Book | undefined, unitsText?: string): Promise<unknown> {
  const options = { ...(book === undefined ? {} : { book }), ...(unitsText === undefined ? {} : { unitsText }) };
  const [result] = await engine.evaluate(['=LATENTRY.HOUSE()'], options);
  return parsed(result?.values[0]?.[0]);
}

describe('the substances of a book', () => {
  const cells = { A4: { value: 'Substance' }, B4: { value: 'Property' }, A5: { value: 'brine' }, B5: { value: 3 } };

  it('reach the functions before the first calculation, with their place on the sheet', async () => {
    expect(await told(bookOf(cells))).toMatchObject({
      state: 'ready',
      house: {
        firstRow: 4,
        decimal: '.',
        values: [
          ['Substance', 'Property'],
          ['brine', 3],
        ],
      },
    });
  });

  it('are absent without the block, and where there is no book', async () => {
    expect(await told({ ...bookOf(cells), names: [] })).toEqual({ state: 'absent' });
    expect(await told(undefined)).toEqual({ state: 'absent' });
  });

  it('are broken where the name leads nowhere', async () => {
    expect(await told(bookOf(cells, '#REF!'))).toEqual({ state: 'broken', text: '#REF!' });
    expect(await told(bookOf(cells, 'Gone!$A$1:$B$2'))).toEqual({ state: 'broken', text: 'Gone!$A$1:$B$2' });
  });

  it('are read with the decimal separator of the units in force', async () => {
    expect(await told(bookOf(cells), 'decimal=,')).toMatchObject({ house: { decimal: ',' } });
  });

  it('may be calculated: then the book is calculated again with what they came to', async () => {
    const calculated = await engine.calculate(
      bookOf({ ...cells, B5: { value: null, formula: '=1+2' }, D1: { value: null, formula: '=LATENTRY.HOUSE()' } }),
    );
    expect(parsed(calculated.sheets[0]?.cells['D1']?.value)).toMatchObject({
      house: {
        values: [
          ['Substance', 'Property'],
          ['brine', 3],
        ],
      },
    });
  });
});
