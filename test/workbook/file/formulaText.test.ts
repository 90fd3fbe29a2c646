import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formulaTokens } from '../../../workbook/file/formulaTokens';
import { callsOurs, fromFileFormula, maySpill, toFileFormula } from '../../../workbook/file/formulaText';
import { shiftFormula } from '../../../workbook/file/shiftFormula';

/** As typed, and as the file format stores it. */
const PAIRS: readonly (readonly [string, string])[] = [
  ['=LATENTRY.LATENT("water","vaporization",60)', '_xldudf_LATENTRY_LATENT("water","vaporization",60)'],
  ['=1+LATENTRY.LATENT("water","fusion")*2', '1+_xldudf_LATENTRY_LATENT("water","fusion")*2'],
  ['="LATENTRY.LATENT(""water"")"', '"LATENTRY.LATENT(""water"")"'],
  ["='LATENTRY.LATENT('!A1", "'LATENTRY.LATENT('!A1"],
  ['=FILTER(A1:A3,A1:A3>0)', '_xlfn._xlws.FILTER(A1:A3,A1:A3>0)'],
  ['=UNIQUE(SORT(A1:A9))', '_xlfn.UNIQUE(_xlfn._xlws.SORT(A1:A9))'],
  ['=LET(t,A1,t*2)', '_xlfn.LET(_xlpm.t,A1,_xlpm.t*2)'],
  ['=LET(f,LAMBDA(x,x+1),f(2))', '_xlfn.LET(_xlpm.f,_xlfn.LAMBDA(_xlpm.x,_xlpm.x+1),_xlpm.f(2))'],
  [
    '=MAP(A1:A3,LAMBDA(t,LATENTRY.LATENT("water","fusion",t)))',
    '_xlfn.MAP(A1:A3,_xlfn.LAMBDA(_xlpm.t,_xldudf_LATENTRY_LATENT("water","fusion",_xlpm.t)))',
  ],
  ['=SUM(B2#)', 'SUM(_xlfn.ANCHORARRAY(B2))'],
  ["=SUM('My sheet'!$B$2#)+1", "SUM(_xlfn.ANCHORARRAY('My sheet'!$B$2))+1"],
  ['=@A1:A5*2', '_xlfn.SINGLE(A1:A5)*2'],
  ['=@INDEX(A1:A5,2)&"@x"', '_xlfn.SINGLE(INDEX(A1:A5,2))&"@x"'],
  ['=Table1[[#This Row],[LATENTRY.LATENT(]]', 'Table1[[#This Row],[LATENTRY.LATENT(]]'],
  ['=[1]Sheet1!A1', '[1]Sheet1!A1'],
  ['=IFERROR(1/0,#N/A)', 'IFERROR(1/0,#N/A)'],
  ['=SUM(A:A,$1:$2)', 'SUM(A:A,$1:$2)'],
];

describe('a formula as typed and as stored', () => {
  it.each(PAIRS)('%s', (typed, stored) => {
    expect(toFileFormula(typed)).toBe(stored);
    expect(fromFileFormula(stored)).toBe(typed);
  });

  it('reads our functions in any case and without the prefix', () => {
    expect(fromFileFormula('_XLDUDF_latentry_LATENT("water")')).toBe('=LATENTRY.LATENT("water")');
    expect(fromFileFormula('LATENTRY.LATENT("water")')).toBe('=LATENTRY.LATENT("water")');
  });

  it('leaves the functions of other namespaces as they are', () => {
    expect(fromFileFormula('_xldudf_OTHER_LATENTRY_LATENT(1)')).toBe('=_xldudf_OTHER_LATENTRY_LATENT(1)');
    expect(toFileFormula('=_xldudf_OTHER_ADD(1)')).toBe('_xldudf_OTHER_ADD(1)');
  });

  it('leaves a name that only looks like a function', () => {
    expect(toFileFormula('=FILTER+SORT')).toBe('FILTER+SORT');
  });

  it('tells which formulas may spill and which call ours', () => {
    expect(maySpill('=LATENTRY.UNITS()')).toBe(true);
    expect(maySpill('=INDEX(A1:A3,2)')).toBe(true);
    expect(maySpill('=B2#')).toBe(true);
    expect(maySpill('="LATENTRY.UNITS()"&SUM(A1:A3)')).toBe(false);
    expect(callsOurs('=1+latentry.units()')).toBe(true);
    expect(callsOurs('="LATENTRY.UNITS("')).toBe(false);
  });

  it('cuts any text into tokens that give it again', () => {
    const piece = fc.constantFrom(
      '"',
      "'",
      '[',
      ']',
      '(',
      ')',
      '#',
      '@',
      'A1',
      '1.5e3',
      ' ',
      'LET',
      ',',
      '!',
      'é',
      '😀',
      '{',
      '}',
    );
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ unit: 'binary' }),
          fc.array(piece).map((all) => all.join('')),
        ),
        (text) => {
          expect(
            formulaTokens(text)
              .map((token) => token.text)
              .join(''),
          ).toBe(text);
        },
      ),
      { seed: 20_250_703, numRuns: 500 },
    );
  });

  it('never fails on a broken formula', () => {
    const piece = fc.constantFrom(
      '"',
      "'",
      '[',
      '(',
      ')',
      '#',
      '@',
      'A1',
      'LET(',
      'LAMBDA(',
      ',',
      '!',
      ':',
      '_xlfn.SINGLE(',
      '_xlfn.ANCHORARRAY(',
    );
    fc.assert(
      fc.property(fc.array(piece, { maxLength: 12 }), (pieces) => {
        const text = pieces.join('');
        expect(typeof toFileFormula(text)).toBe('string');
        expect(fromFileFormula(text).startsWith('=')).toBe(true);
      }),
      { seed: 20_250_704, numRuns: 500 },
    );
  });
});

describe('a shared formula at another cell', () => {
  it.each([
    ['A1*$B$1+LOG10(C$2)', 2, 1, 'B3*$B$1+LOG10(D$2)'],
    ['SUM(A:A,$B:B,1:2)', 1, 1, 'SUM(B:B,$B:C,2:3)'],
    ['\'A1\'!A1&"A1"', 1, 0, '\'A1\'!A2&"A1"'],
    ['Duty1!A1', 1, 0, 'Duty1!A2'],
    ['A1', -1, 0, 'A1048576'],
    ['LOG10(A1)', 1, 1, 'LOG10(B2)'],
  ])('%s moved by %i rows and %i columns', (stored, rows, columns, expected) => {
    expect(shiftFormula(stored, rows, columns)).toBe(expected);
  });
});
