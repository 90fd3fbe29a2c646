import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nearest } from '../../core/nearest';

const KEYS = ['temperature', 'pressure', 'heat', 'heat_capacity', 'flow', 'power'];

describe('nearest', () => {
  it.each([
    ['tempreature', 'temperature'],
    ['temperatur', 'temperature'],
    ['TEMPERATURE', 'temperature'],
    ['preasure', 'pressure'],
    ['heatt', 'heat'],
    ['folw', 'flow'],
    ['poewr', 'power'],
  ])('%s is %s', (word, expected) => {
    expect(nearest(word, KEYS)).toBe(expected);
  });

  it.each(['', 'x', 'colour', 'zzzzzzzz'])('nothing is near "%s"', (word) => {
    expect(nearest(word, KEYS)).toBeUndefined();
  });

  it('one slip of any of the four kinds always leads back', () => {
    const letters = 'abcdefghijklmnopqrstuvwxyz'.split('');
    fc.assert(
      fc.property(
        fc.constantFrom('temperature', 'pressure', 'heat_capacity'),
        fc.nat(20),
        fc.constantFrom(...letters),
        fc.constantFrom('leave out', 'add', 'change', 'swap'),
        (word, at, letter, slip) => {
          const i = at % (word.length - 1);
          const written = {
            'leave out': word.slice(0, i) + word.slice(i + 1),
            add: word.slice(0, i) + letter + word.slice(i),
            change: word.slice(0, i) + letter + word.slice(i + 1),
            swap: word.slice(0, i) + (word[i + 1] ?? '') + (word[i] ?? '') + word.slice(i + 2),
          }[slip];
          expect(nearest(written, KEYS)).toBe(word);
        },
      ),
      { seed: 2, numRuns: 500 },
    );
  });
});
