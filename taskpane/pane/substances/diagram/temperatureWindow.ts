import type { Ladder } from '../../../../core/substance';

/** A temperature interval that is shown, K. */
export interface Window {
  readonly fromK: number;
  readonly toK: number;
}

const ROOM_K = 298.15;
/** Room beside the outermost transitions: of the span between them, of the hottest of them, at least. */
const SHARE_OF_SPAN = 0.45;
const SHARE_OF_HEIGHT = 0.12;
const LEAST_K = 15;
/** Around one transition: of its temperature, and of the way to its neighbours. */
const CLOSE_SHARE = 0.12;
const NEIGHBOUR_SHARE = 0.6;

/**
 * The window of a diagram: all transitions with room beside them, or one transition (by its place among the gaps) and
 * what surrounds it. It ends where the ladder ends.
 */
export function temperatureWindow(ladder: Ladder, around?: number): Window {
  const low = ladder.rungs[0]?.fromK ?? 0;
  const high = ladder.rungs.at(-1)?.toK ?? low;
  const gap = around === undefined ? undefined : ladder.gaps[around];
  const window = gap === undefined ? overview(ladder, low, high) : close(ladder, around ?? 0, gap.temperatureK);
  const fromK = Math.max(window.fromK, low);
  const toK = Math.min(window.toK, high);
  return toK > fromK ? { fromK, toK } : { fromK: low - LEAST_K, toK: high + LEAST_K };
}

function overview({ gaps }: Ladder, low: number, high: number): Window {
  const [first, last] = [gaps[0], gaps.at(-1)];
  if (first === undefined || last === undefined) return { fromK: low, toK: high };
  const span = last.temperatureK - first.temperatureK;
  const room = Math.max(SHARE_OF_SPAN * span, SHARE_OF_HEIGHT * last.temperatureK, LEAST_K);
  const fromK = first.temperatureK - room;
  const toK = last.temperatureK + room;
  const nearRoom = (edge: number) => Math.abs(edge - ROOM_K) < SHARE_OF_SPAN * (toK - fromK);
  return {
    fromK: fromK > ROOM_K && nearRoom(fromK) && low <= ROOM_K ? ROOM_K : fromK,
    toK: toK < ROOM_K && nearRoom(toK) && high >= ROOM_K ? ROOM_K : toK,
  };
}

function close({ gaps }: Ladder, place: number, atK: number): Window {
  const below = gaps[place - 1]?.temperatureK;
  const above = gaps[place + 1]?.temperatureK;
  const room = Math.max(CLOSE_SHARE * atK, LEAST_K);
  return {
    fromK: atK - (below === undefined ? room : Math.min(room, NEIGHBOUR_SHARE * (atK - below))),
    toK: atK + (above === undefined ? room : Math.min(room, NEIGHBOUR_SHARE * (above - atK))),
  };
}

/** The window widened, with a little room, to hold a temperature. */
export function widened({ fromK, toK }: Window, temperatureK: number): Window {
  if (temperatureK >= fromK && temperatureK <= toK) return { fromK, toK };
  const room = 0.04 * (toK - fromK);
  return temperatureK < fromK ? { fromK: Math.max(0, temperatureK - room), toK } : { fromK, toK: temperatureK + room };
}
