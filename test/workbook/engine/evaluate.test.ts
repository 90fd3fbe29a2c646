import { beforeAll, describe, expect, it } from 'vitest';
import type { Cell } from '../../../taskpane/port';
import { emptySheet } from '../../../workbook/emptySheet';
import type { Book } from '../../../workbook/book';
import { openEngine, type Engine } from '../../../workbook/engine/openEngine';
import { smallBundle } from './smallBundle';

let engine: Engine;

beforeAll(async () => {
  engine = await openEngine({ bundlePath: await smallBundle() });
});

async function one(formula: string, book?: Book): Promise<Cell> {
  const [result] = await engine.evaluate([formula], book === undefined ? {} : { book });
  expect(result?.values.length).toBe(1);
  expect(result?.values[0]?.length).toBe(1);
  return result?.values[0]?.[0] ?? null;
}

/** The arguments that ECHO received. */
async function received(formula: string, book?: Book): Promise<unknown> {
  const text = await one(formula, book);
  return typeof text === 'string' ? JSON.parse(text) : text;
}

const data: Book = {
  sheets: [
    {
      ...emptySheet('Data'),
      cells: {
        A1: { value: 3 },
        B1: { value: '12' },
        B2: { value: { error: '#N/A' } },
        C1: { value: null, formula: '=A1*2' },
        D1: { value: true },
      },
    },
    { ...emptySheet('Pilot plant'), cells: { A1: { value: 98.5 } } },
  ],
  names: [{ name: 'feed', formula: 'Data!$A$1:$B$2' }],
  styles: {},
  properties: {},
};

describe('arguments arrive as Excel hands them over', () => {
  it('gives matrix parameters two-dimensional arrays and gathers the settings', async () => {
    expect(await received('=LATENTRY.ECHO(60,"140 degF","a=b","c=d")')).toEqual([
      [[60]],
      [['140 degF']],
      [[['a=b']], [['c=d']]],
      { functionName: 'ECHO', address: "'formulas:'!A1", parameterAddresses: [null, null, null, null] },
    ]);
  });

  it('tells an omitted argument, an empty cell and an empty text apart', async () => {
    const [omitted] = (await received('=LATENTRY.ECHO(1,,"k=v")')) as unknown[][];
    expect(omitted).toEqual([[1]]);
    expect(((await received('=LATENTRY.ECHO(1,,"k=v")')) as unknown[])[1]).toBeNull();
    expect(((await received('=LATENTRY.ECHO(Data!Z9)', data)) as unknown[])[0]).toEqual([[null]]);
    expect(((await received('=LATENTRY.ECHO("")')) as unknown[])[0]).toEqual([['']]);
  });

  it('gives a range with its address, error cells and blanks inside', async () => {
    expect(await received('=LATENTRY.ECHO(Data!A1:B2,feed)', data)).toEqual([
      [
        [3, '12'],
        [null, { code: '#N/A' }],
      ],
      [
        [3, '12'],
        [null, { code: '#N/A' }],
      ],
      [],
      { functionName: 'ECHO', address: "'formulas:'!A1", parameterAddresses: ['Data!A1:B2', 'Data!A1:B2'] },
    ]);
  });

  it.each(['60.0', '6e1', '60.', '0060', '(60)'])('takes the literal %s for the number 60', async (literal) => {
    expect(((await received(`=LATENTRY.ECHO(${literal})`)) as unknown[])[0]).toEqual([[60]]);
  });

  it.each(['12%', '1/2', '2026-01-02', '1,200', '60.0', '{1,2}', 'TRUE', '12:30', '$5', '10 °C'])(
    'leaves the text "%s" a text',
    async (text) => {
      expect(((await received(`=LATENTRY.ECHO("${text}")`)) as unknown[])[0]).toEqual([[text]]);
    },
  );
});

describe('results', () => {
  it('spills with its extent, blanks as empty texts, truth values as they are', async () => {
    const [column] = await engine.evaluate(['LATENTRY.COLUMN(3)']);
    expect(column).toEqual({
      formula: 'LATENTRY.COLUMN(3)',
      values: [
        [1, 'n1'],
        [2, 'n2'],
        [3, 'n3'],
      ],
    });
    const [mixed] = await engine.evaluate(['=LATENTRY.MIXED()']);
    expect(mixed?.values).toEqual([
      [1, { error: '#N/A', message: 'second is missing' }],
      ['', { error: '#VALUE!', message: 'the function gave no finite number' }],
      [true, ''],
    ]);
  });

  it('calculates around and inside: operators, nesting, LET, MAP, INDEX', async () => {
    expect(await one('=SUM(LATENTRY.COLUMN(4))/2')).toBe(5);
    expect(await one('=INDEX(LATENTRY.COLUMN(3),2,2)')).toBe('n2');
    expect(await one('=LET(x,2.50,x*2)')).toBe(5);
    expect(await one('=SUM(MAP({1,2},LAMBDA(n,INDEX(LATENTRY.COLUMN(n),n,1))))')).toBe(3);
    expect(await one('=Data!C1+1', data)).toBe(7);
    expect(await one("='Pilot plant'!A1", data)).toBe(98.5);
  });

  it('keeps full precision', async () => {
    expect(await one('=1/3')).toBe(1 / 3);
  });

  it('lets a thousand formulas spill without touching each other', async () => {
    const formulas = Array.from({ length: 1000 }, (_, i) => `=LATENTRY.COLUMN(${(i % 5) + 1})`);
    const results = await engine.evaluate(formulas);
    expect(results.map((result) => result.values.length)).toEqual(formulas.map((_, i) => (i % 5) + 1));
  });
});

describe('errors carry a code and words', () => {
  it.each([
    ['=LATENTRY.REFUSE("#N/A","temperature 520 K is outside")', '#N/A', 'temperature 520 K is outside'],
    ['=LATENTRY.REFUSE("#N/A","inner words")/2', '#N/A', 'inner words'],
    [
      '=LATENTRY.ECHO()',
      '#VALUE!',
      'number of arguments: allowed LATENTRY.ECHO(first, [second], [settings]); received 0',
    ],
    ['=LATENTRY.COLUMN(1,2)', '#VALUE!', 'number of arguments: allowed LATENTRY.COLUMN(length); received 2'],
    ['=LATENTRY.GONE()', '#NAME?', 'LATENTRY.GONE is listed but not in the functions bundle'],
    ['=LATENTRY.NOTNUMBER()', '#VALUE!', 'the function gave no finite number'],
    ['=LATENTRY.COLUM(3)', '#NAME?', 'no function LATENTRY.COLUM; nearest: LATENTRY.COLUMN'],
    ['=1/0', '#DIV/0!', 'division by zero'],
    ['=LATENTRY.COLUMN(3', '#VALUE!', 'brackets, quotes, commas or operators do not agree in =LATENTRY.COLUMN(3'],
    ['=1+', '#VALUE!', 'brackets, quotes, commas or operators do not agree in =1+'],
    ['=', '#VALUE!', 'brackets, quotes, commas or operators do not agree in ='],
    ['=A1*2', '#REF!', 'A1 is a cell, and there is no workbook here; write the values themselves'],
    ['=SUM(A:A)', '#REF!', 'A:A is a cell, and there is no workbook here; write the values themselves'],
    ['=Data!E1#', '#REF!', 'E1# is not followed here; write the range itself, as E1:E9'],
  ])('%s', async (formula, error, message) => {
    expect(await one(formula)).toEqual({ error, message });
  });

  it('names a defect of a function as one, and goes on', async () => {
    const results = await engine.evaluate(['=LATENTRY.CRASH()', '=1+1']);
    expect(results[0]?.values[0]?.[0]).toMatchObject({
      error: '#VALUE!',
      message: expect.stringContaining('internal error: ') as string,
    });
    expect(results[1]?.values).toEqual([[2]]);
  });

  it('asks for the sheet of a bare reference where there is a workbook', async () => {
    expect(await one('=SUM($A$1:B2)', data)).toEqual({
      error: '#REF!',
      message: '$A$1:B2 is on no sheet; write the sheet before it, as Data!$A$1:B2',
    });
  });
});

describe('answers that come late', () => {
  it('are waited for, in a chain too', async () => {
    expect(await one('=LATENTRY.LATE(21)')).toBe(42);
    expect(await one('=LATENTRY.LATE(LATENTRY.LATE(1)+1)')).toBe(6);
  });

  it('may be refusals', async () => {
    expect(await one('=LATENTRY.LATEREFUSE()')).toEqual({ error: '#N/A', message: 'came to nothing' });
  });
});

describe('settings', () => {
  const units = (value: Cell, formula?: string): Book => ({
    ...data,
    sheets: [
      ...data.sheets,
      {
        ...emptySheet('Units'),
        cells: { A4: { value: 'Temperature' }, B4: { value, ...(formula === undefined ? {} : { formula }) } },
      },
    ],
    names: [{ name: 'Latentry_units', formula: 'Units!$A$4:$B$4' }],
  });
  const setting = async (options: { book?: Book; unitsText?: string }) => {
    const [result] = await engine.evaluate(['=LATENTRY.SETTING("temperature")'], options);
    return result?.values[0]?.[0];
  };

  it('are the defaults, the text, the block, the text on top of the block', async () => {
    expect(await setting({})).toBe('degC');
    expect(await setting({ unitsText: 'temperature=K' })).toBe('K');
    expect(await setting({ book: units('degF') })).toBe('degF');
    expect(await setting({ book: units('degF'), unitsText: 'temperature=K' })).toBe('K');
    expect(await setting({})).toBe('degC');
  });

  it('may be calculated', async () => {
    expect(await setting({ book: units(null, '="deg"&"R"') })).toBe('degR');
  });

  it('that are damaged are told, never replaced', async () => {
    expect(await setting({ book: units('parsec') })).toEqual({ error: '#VALUE!', message: 'B4: degC, K; parsec' });
  });

  it('that can not be read as text are refused', async () => {
    await expect(setting({ unitsText: 'colour=red' })).rejects.toThrow('unknown key colour');
    expect(await setting({})).toBe('degC');
  });
});
