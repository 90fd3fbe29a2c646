import type { Ladder } from '../../../../core/substance';
import { rungName } from '../facts/stableAt';

/** Names of the phases on either side of one transition of a ladder; undefined where none is meant. */
export function sidesOf(ladder: Ladder, place: number | undefined): readonly string[] | undefined {
  return place === undefined ? undefined : ladder.rungs.slice(place, place + 2).map(rungName);
}
