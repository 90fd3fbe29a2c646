import { beforeAll, describe, expect, it } from 'vitest';
import type { Book, BookCell } from '../../../workbook/book';
import { emptySheet } from '../../../workbook/emptySheet';
import { openEngine, type Engine } from '../../../workbook/engine/openEngine';
import { smallBundle } from './smallBundle';

let engine: Engine;

beforeAll(async () => {
  engine = await openEngine({ bundlePath: await smallBundle() });
});

function bookOf(cells: Record<string, BookCell>, more: Partial<Book> = {}): Book {
  return { sheets: [{ ...emptySheet('Data'), cells }], names: [], styles: {}, properties: {}, ...more };
}

async function cellsOf(book: Book): Promise<Readonly<Record<string, BookCell>>> {
  return (await engine.calculate(book)).sheets[0]?.cells ?? {};
}

describe('calculate', () => {
  it('keeps values, looks and formulas, and fills in what formulas give', async () => {
    const cells = await cellsOf(
      bookOf({
        A1: { value: 4, style: 'input' },
        A2: { value: 'note' },
        B1: { value: null, formula: '=A1*2', style: 'answer', format: '0.00' },
        B2: { value: 99, formula: '=B1&" kg"' },
        B3: { value: null, formula: '=A1>3' },
        B4: { value: null, formula: '=A9' },
      }),
    );
    expect(cells).toEqual({
      A1: { value: 4, style: 'input' },
      A2: { value: 'note' },
      B1: { value: 8, formula: '=A1*2', style: 'answer', format: '0.00' },
      B2: { value: '8 kg', formula: '=B1&" kg"' },
      B3: { value: true, formula: '=A1>3' },
      B4: { value: 0, formula: '=A9' },
    });
  });

  it('writes a spill with its extent, keeps the looks below, and clears what an earlier, longer spill left', async () => {
    const cells = await cellsOf(
      bookOf({
        A1: { value: 2 },
        C1: { value: 1, formula: '=LATENTRY.COLUMN(A1)', spill: 'C1:D3' },
        C2: { value: 2, style: 'answer' },
        C3: { value: 3, style: 'answer' },
        D3: { value: 'n3' },
        E1: { value: null, formula: '=SUM(C1:C3)' },
      }),
    );
    expect(cells).toEqual({
      A1: { value: 2 },
      C1: { value: 1, formula: '=LATENTRY.COLUMN(A1)', spill: 'C1:D2' },
      D1: { value: 'n1' },
      C2: { value: 2, style: 'answer' },
      D2: { value: 'n2' },
      C3: { value: null, style: 'answer' },
      D3: { value: null },
      E1: { value: 3, formula: '=SUM(C1:C3)' },
    });
  });

  it('says #SPILL! with words where a value is in the way', async () => {
    const cells = await cellsOf(
      bookOf({ A1: { value: null, formula: '=LATENTRY.COLUMN(3)' }, A2: { value: 'in the way' } }),
    );
    expect(cells['A1']?.value).toEqual({ error: '#SPILL!', message: 'the cells that the result needs are not empty' });
    expect(cells['A2']?.value).toBe('in the way');
  });

  it('gives errors their words, also inside a spill', async () => {
    const cells = await cellsOf(
      bookOf({
        A1: { value: null, formula: '=LATENTRY.MIXED()' },
        D1: { value: null, formula: '=LATENTRY.REFUSE("#N/A","no such range")' },
        D2: { value: null, formula: '=D1+1' },
      }),
    );
    expect(cells['B1']?.value).toEqual({ error: '#N/A', message: 'second is missing' });
    expect(cells['D1']?.value).toEqual({ error: '#N/A', message: 'no such range' });
    expect(cells['D2']?.value).toEqual({ error: '#N/A', message: 'no value is available' });
  });

  it('gives no number where formulas depend on themselves, and every other cell as ever', async () => {
    const cells = await cellsOf(
      bookOf({
        A1: { value: null, formula: '=A1+1' },
        B1: { value: null, formula: '=B2*2' },
        B2: { value: null, formula: '=SUM(B3:B4)' },
        B3: { value: null, formula: '=B1' },
        C1: { value: null, formula: '=B1+1' },
        C2: { value: null, formula: '=6*7' },
        C3: { value: null, formula: '=C2+1' },
      }),
    );
    const message = 'the formula depends on its own cell';
    for (const address of ['A1', 'B1', 'B2', 'B3']) expect(cells[address]?.value).toEqual({ error: '#REF!', message });
    expect(cells['C1']?.value).toMatchObject({ error: '#REF!' });
    expect([cells['C2']?.value, cells['C3']?.value]).toEqual([42, 43]);
  });

  it('fills an array formula of the fixed kind, and no more', async () => {
    const cells = await cellsOf(
      bookOf({
        A1: { value: null, formula: '=LATENTRY.COLUMN(2)', array: 'A1:A3' },
        D1: { value: null, formula: '=7', array: 'D1:D2' },
      }),
    );
    expect(['A1', 'A2', 'A3', 'D1', 'D2'].map((address) => cells[address]?.value)).toEqual([
      1,
      2,
      { error: '#N/A' },
      7,
      7,
    ]);
    expect(cells['B1']).toBeUndefined();
    expect(cells['A1']?.spill).toBeUndefined();
  });

  it('keeps the saved value of a formula that it cannot follow, for what depends on it too', async () => {
    const cells = await cellsOf(
      bookOf({
        A1: { value: 5, formula: '=SUM(Data!C1#)' },
        A2: { value: null, formula: '=A1*2' },
        A3: { value: null, formula: '=@A1:A2' },
      }),
    );
    expect(cells).toEqual({
      A1: { value: 5, formula: '=SUM(Data!C1#)' },
      A2: { value: 10, formula: '=A1*2' },
      A3: { value: null, formula: '=@A1:A2' },
    });
  });

  it('does not carry a name from one book to the next', async () => {
    const formula = '=LATENTRY.ECHO(feed)';
    const named = (value: number) => bookOf({ A1: { value }, A2: { value: 2 * value }, B1: { value: null, formula } });
    const received = (cells: Readonly<Record<string, BookCell>>): unknown => {
      const text = cells['B1']?.value;
      return typeof text === 'string' ? JSON.parse(text) : text;
    };
    const first = await cellsOf({ ...named(1), names: [{ name: 'feed', formula: 'Data!$A$1' }] });
    const second = await cellsOf({ ...named(1), names: [{ name: 'feed', formula: 'Data!$A$2' }] });
    const third = await cellsOf(named(1));
    expect(received(first)).toMatchObject({ 0: [[1]] });
    expect(received(second)).toMatchObject({ 0: [[2]] });
    expect(received(third)).toMatchObject({ 0: [[{ code: '#NAME?' }]] });
  });

  it('knows names that are formulas or private to a sheet', async () => {
    const cells = await cellsOf(
      bookOf(
        { A1: { value: null, formula: '=factor*2' }, A2: { value: null, formula: '=here+1' }, A3: { value: 40 } },
        {
          names: [
            { name: 'factor', formula: '21' },
            { name: 'here', formula: 'Data!$A$3', sheet: 'Data' },
          ],
        },
      ),
    );
    expect([cells['A1']?.value, cells['A2']?.value]).toEqual([42, 41]);
  });

  it('takes calls in turn', async () => {
    const books = [1, 2, 3].map((value) =>
      bookOf({ A1: { value }, B1: { value: null, formula: '=LATENTRY.LATE(A1)' } }),
    );
    const calculated = await Promise.all(books.map((book) => engine.calculate(book)));
    expect(calculated.map((book) => book.sheets[0]?.cells['B1']?.value)).toEqual([2, 4, 6]);
  });

  it('leaves the book that it was given alone', async () => {
    const book = bookOf({ A1: { value: null, formula: '=1+1' } });
    const before = structuredClone(book);
    await engine.calculate(book);
    expect(book).toEqual(before);
  });
});
