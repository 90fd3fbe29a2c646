import { Problem } from '../problem';
import { lowTail } from './lowTail';
import { cpOverR } from './nasa9Cp';
import type { Nasa9Interval, Nasa9Species } from './nasa9Types';
import { packedSpecies } from './species.generated';

/** Kinds in the packed data: phase, and the heat capacity divided by R that is left as T → 0. */
const KINDS: Readonly<Record<string, readonly [Nasa9Species['phase'], number]>> = {
  crystal: ['crystal', 0],
  liquid: ['liquid', NaN],
  atom: ['gas', 2.5],
  linear: ['gas', 3.5],
  bent: ['gas', 4],
};

/** A crystal form that begins above this is a hot one: below its range it is metastable and keeps its heat capacity, K. */
const COLD_K = 300;

const read = new Map<string, Nasa9Species>();

/**
 * A species of the NASA nine-coefficient data set, read from the packed data when it is first asked for.
 *
 * @param name as the data set spells it: `NH3`, `AL(cr)`, `C3H8O,2propanol`
 * @returns the same object at each call
 * @throws Problem `missing` for a species that is not carried here
 * @source McBride, Zehe & Gordon, NASA/TP-2002-211556 (2002), data release of 9 September 2021
 * @example
 * import { nasa9Species } from 'latentry';
 * nasa9Species('AL2O3(L)').fromK // => 2327
 */
export function nasa9Species(name: string): Nasa9Species {
  const known = read.get(name);
  if (known !== undefined) return known;
  const packed = Object.hasOwn(packedSpecies, name) ? packedSpecies[name] : undefined;
  if (packed === undefined) {
    throw new Problem({
      code: 'missing',
      subject: name,
      reason: 'no such species among the nine-coefficient polynomials',
    });
  }
  const species = unpacked(name, packed);
  read.set(name, species);
  return species;
}

/** `kind;g/mol;limit of the release;comment`, then a line an interval: from, to, a1 to a7, b1, b2. */
function unpacked(name: string, packed: string): Nasa9Species {
  const [head = '', ...rows] = packed.split('\n');
  const [kind = '', grams, release, comment = ''] = head.split(';');
  const [phase, floor] = KINDS[kind] ?? ['gas', 4];
  const intervals = rows.map(interval);
  const first = intervals[0];
  const last = intervals[intervals.length - 1];
  if (first === undefined || last === undefined) throw new Error(`${name} has no interval`);
  const { fromK } = first;
  const slope = (cpOverR(first, fromK + 0.01) - cpOverR(first, fromK)) / 0.01;
  return {
    name,
    phase,
    molarMass: Number(grams) / 1000,
    comment,
    intervals,
    fromK,
    toK: last.toK,
    releaseFromK: release === '' ? fromK : Number(release),
    low: lowTail(fromK, cpOverR(first, fromK), slope, fromK > COLD_K ? NaN : floor),
  };
}

function interval(row: string): Nasa9Interval {
  const [fromK = NaN, toK = NaN, ...rest] = row.split(',').map(Number);
  return { fromK, toK, a: rest.slice(0, 7), b1: rest[7] ?? NaN, b2: rest[8] ?? NaN };
}
