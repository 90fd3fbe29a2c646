import type { Nasa9Interval, Nasa9Species } from './nasa9Types';

/** The interval that holds a temperature: the colder one where two meet, the nearest one beyond the ends. */
export function intervalAt({ intervals }: Nasa9Species, temperatureK: number): Nasa9Interval {
  let index = 0;
  while (index < intervals.length - 1 && temperatureK > (intervals[index]?.toK ?? Infinity)) index++;
  const found = intervals[index];
  if (found === undefined) throw new Error('a species has at least one interval');
  return found;
}
