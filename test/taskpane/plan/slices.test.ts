import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatArea, parseArea } from '../../../taskpane/hosts/address';
import { slices } from '../../../taskpane/plan/slices';

describe('slices', () => {
  it('cuts whole rows', () => {
    expect(slices({ sheet: 'Data', address: 'A1:B5' }, 4).map((ref) => ref.address)).toEqual([
      'A1:B2',
      'A3:B4',
      'A5:B5',
    ]);
  });

  it('gives a row that is wider than a piece a piece of its own', () => {
    expect(slices({ sheet: 'Data', address: 'A1:D2' }, 3)).toHaveLength(2);
  });

  it('covers every row once, in order', () => {
    const count = fc.integer({ min: 1, max: 60 });
    fc.assert(
      fc.property(count, count, count, count, (top, left, rows, columns) => {
        const whole = { top, left, rows, columns };
        const pieces = slices({ sheet: 'S', address: formatArea(whole) }, 50).map((ref) => parseArea(ref.address)!);
        expect(pieces.reduce((sum, piece) => sum + piece.rows, 0)).toBe(rows);
        let next = top;
        for (const piece of pieces) {
          expect(piece).toMatchObject({ top: next, left, columns });
          next += piece.rows;
        }
      }),
      { seed: 20261201 },
    );
  });
});
