import { shortNumber } from '../problem';
import type { Change, Gap, Ladder, Rung } from '../substance';
import { boilingAt, samePressure, type Boiling } from './boilingAt';
import { readable } from './given';
import type { HeatCapacityData, MaterialData } from './materialData';
import {
  condensedChain,
  covers,
  heatAt,
  singleHeat,
  heatCapacityOf,
  SAME_K,
  type Chain,
  type Crossing,
  type Station,
} from './stations';

/** A rung with what is needed to go on along its phase. */
export interface MaterialRung extends Rung {
  readonly cp: HeatCapacityData | undefined;
  /** A temperature on the rung and the enthalpy there. */
  readonly anchorK: number;
  readonly anchorEnthalpy: number;
}

export interface MaterialLadder extends Ladder {
  readonly rungs: readonly MaterialRung[];
  /** Where its enthalpies are zero, in words. */
  readonly reference: string;
}

/** A stretch of a phase before enthalpies are put on it. */
interface Stretch {
  readonly station: Station;
  readonly fromK: number;
  readonly toK: number;
}

/** Stretches that transitions of known heat join; `gaps[i]` lies above `stretches[i]`. */
interface Piece {
  readonly stretches: Stretch[];
  readonly gaps: (Crossing & { readonly temperatureK: number; readonly heat: number })[];
  below: string;
  above: string;
}

const ROOM_K = 298.15;

/**
 * What a heating path of a material meets at a pressure: the longest run of phases that known heats and heat capacities
 * join. A phase whose heat capacity does not reach from one transition to the next ends the run; there it is a rung of
 * one temperature.
 *
 * @throws Problem as `boilingAt` does
 */
export function materialLadder(data: MaterialData, pressurePa: number): MaterialLadder {
  const condensed = condensedChain(data);
  const boiling = boilingAt(data, pressurePa);
  const chain = 'lacking' in boiling ? condensed : withGas(data, condensed, boiling, pressurePa);
  const pieces = piecesOf(chain, boiling);
  const best = pieces.reduce<Piece | undefined>((a, b) => (a === undefined || rank(b) > rank(a) ? b : a), undefined);
  if (best === undefined) {
    const alone = heatCapacityOf(data, 'gas');
    const piece = alone === undefined ? undefined : pieceOfGas(alone);
    return finished(data, pressurePa, piece);
  }
  return finished(data, pressurePa, best);
}

function pieceOfGas(cp: HeatCapacityData): Piece {
  const stretch = { station: { phase: 'gas' as const, cp }, fromK: cp.fromK, toK: cp.toK };
  return { stretches: [stretch], gaps: [], below: 'heat of vaporization', above: 'gas heat capacity' };
}

/** The chain with the vapour above its last phase, or above the solid where that sublimes. */
function withGas(
  data: MaterialData,
  { stations, crossings }: Chain,
  boiling: Exclude<Boiling, { lacking: string }>,
  pressurePa: number,
): Chain {
  const { change, temperatureK } = boiling;
  const sublimes = change === 'sublimation';
  const kept = sublimes ? stations.filter(({ phase }) => phase === 'solid') : stations;
  if (kept.length === 0) return { stations, crossings };
  const top: Crossing = { change, temperatureK, heat: heatToVapour(data, change, temperatureK, pressurePa) };
  return {
    stations: [...kept, { phase: 'gas', cp: heatCapacityOf(data, 'gas') }],
    crossings: [...crossings.slice(0, kept.length - 1), top],
  };
}

/** A single heat of vaporization holds where the material boils at the pressure of its boiling temperature. */
function heatToVapour(
  data: MaterialData,
  change: Change,
  temperatureK: number,
  pressurePa: number,
): number | undefined {
  const point = readable(data.transitions.get(change));
  const own = point !== undefined && samePressure(pressurePa, point.pressurePa);
  return heatAt(data, change, temperatureK) ?? (own ? singleHeat(data, change, point.temperatureK) : undefined);
}

/** More transitions first, then one that has a liquid, then the wider one. */
function rank({ stretches, gaps }: Piece): number {
  const liquid = stretches.some(({ station }) => station.phase === 'liquid') ? 1 : 0;
  const span = (stretches.at(-1)?.toK ?? 0) - (stretches[0]?.fromK ?? 0);
  return gaps.length * 1e7 + liquid * 1e6 + Math.min(span, 9e5);
}

function piecesOf({ stations, crossings }: Chain, boiling: Boiling): Piece[] {
  const pieces: Piece[] = [];
  let piece: Piece | undefined;
  const close = (above: string): void => {
    if (piece !== undefined) pieces.push({ ...piece, above });
    piece = undefined;
  };
  stations.forEach((station, i) => {
    const under = crossings[i - 1];
    const over = crossings[i];
    const lowK = under?.temperatureK;
    const topK =
      over?.temperatureK ?? ('lacking' in boiling && station.phase === 'liquid' ? liquidEnd(boiling) : undefined);
    const cp = nameOf(station);
    const stretches = stretchesOf(station.cp, lowK, topK);
    stretches.forEach((stretch, j) => {
      const first = j === 0;
      const joined = first && piece !== undefined;
      if (!joined) {
        close(first ? lacking(under) : cp);
        piece = { stretches: [], gaps: [], below: first && under !== undefined ? lacking(under) : cp, above: '' };
      }
      piece?.stretches.push({ station, ...stretch });
    });
    const reached = stretches.at(-1);
    const known = over?.temperatureK !== undefined && over.heat !== undefined;
    const atTop = reached !== undefined && topK !== undefined && Math.abs(reached.toK - topK) <= SAME_K;
    if (known && atTop) piece?.gaps.push(over as Piece['gaps'][number]);
    else close(over === undefined ? aboveLast(station, reached?.toK, boiling) : known ? cp : lacking(over));
  });
  close('');
  return pieces.filter(({ stretches, gaps }) => gaps.length > 0 || stretches.some(({ fromK, toK }) => toK > fromK));

  function aboveLast(station: Station, toK: number | undefined, at: Boiling): string {
    const ends = station.cp !== undefined && toK !== undefined && toK >= station.cp.toK - SAME_K;
    if (station.phase !== 'liquid' || station.cp === undefined || !('lacking' in at)) return nameOf(station);
    return ends ? nameOf(station) : at.lacking;
  }

  function lacking(crossing: Crossing | undefined): string {
    if (crossing === undefined) return '';
    const change = crossing.change;
    if (crossing.temperatureK === undefined) return `${change === 'fusion' ? 'melting' : change} temperature`;
    return `heat of ${change}`;
  }

  function liquidEnd(at: Exclude<Boiling, { change: string }>): number | undefined {
    return Number.isFinite(at.liquidToK) ? at.liquidToK : undefined;
  }
}

function nameOf({ phase, form }: Station): string {
  return `${form === undefined ? phase : `${phase} ${form}`} heat capacity`;
}

/** Where a phase between two transitions is known: all through, or from each transition as far as its data reach. */
function stretchesOf(
  cp: HeatCapacityData | undefined,
  lowK: number | undefined,
  topK: number | undefined,
): { fromK: number; toK: number }[] {
  const point = (at: number | undefined): { fromK: number; toK: number }[] =>
    at === undefined ? [] : [{ fromK: at, toK: at }];
  if (cp === undefined) return [...point(lowK), ...point(topK)];
  const low = lowK === undefined || covers(cp, lowK);
  const top = topK === undefined || covers(cp, topK);
  const fromK = lowK ?? cp.fromK;
  const toK = topK ?? cp.toK;
  if (low && top) return fromK <= toK ? [{ fromK, toK }] : [];
  if (low) return [{ fromK, toK: Math.min(cp.toK, toK) }, ...point(topK)];
  if (top) return [...point(lowK), { fromK: Math.max(cp.fromK, fromK), toK }];
  const between = cp.toK > fromK && cp.fromK < toK ? [{ fromK: cp.fromK, toK: cp.toK }] : [];
  return [...point(lowK), ...between, ...point(topK)];
}

/** Puts enthalpies on a piece, from its zero on. */
function finished(data: MaterialData, pressurePa: number, piece: Piece | undefined): MaterialLadder {
  if (piece === undefined) {
    return {
      pressurePa,
      rungs: [],
      gaps: [],
      sources: [],
      missingAbove: `heat capacities of ${data.name}`,
      reference: 'none',
    };
  }
  const { stretches, gaps } = piece;
  const gas = stretches.findIndex(({ station }) => station.phase === 'gas');
  const first = stretches[0] as Stretch;
  const zeroOnGas = gas > 0 && first.station.cp === undefined && stretches[gas]?.station.cp !== undefined && gas === 1;
  const start = zeroOnGas ? 1 : 0;
  const zero = zeroOf(data, stretches[start] as Stretch);
  const enthalpies: number[] = [];
  enthalpies[start] = 0;
  const anchors: number[] = [];
  anchors[start] = zero;
  const along = (i: number, toK: number): number => {
    const cp = stretches[i]?.station.cp;
    return (enthalpies[i] as number) + (cp === undefined ? 0 : cp.shape.area(anchors[i] as number, toK));
  };
  const placed: Gap[] = [];
  gaps.forEach(({ change, temperatureK, heat }, i) => {
    if (i + 1 <= start) {
      anchors[i] = temperatureK;
      enthalpies[i] = along(i + 1, temperatureK) - heat;
      placed.push({ change, temperatureK, below: enthalpies[i], above: enthalpies[i] + heat });
      return;
    }
    const below = along(i, temperatureK);
    anchors[i + 1] = temperatureK;
    enthalpies[i + 1] = below + heat;
    placed.push({ change, temperatureK, below, above: below + heat });
  });
  const rungs = stretches.map(({ station, fromK, toK }, i): MaterialRung => {
    const anchorK = anchors[i] as number;
    const anchorEnthalpy = enthalpies[i] as number;
    const { phase, form, cp } = station;
    return {
      phase,
      ...(form === undefined ? {} : { form }),
      fromK,
      toK,
      cp,
      anchorK,
      anchorEnthalpy,
      enthalpy: cp === undefined ? () => anchorEnthalpy : (t) => anchorEnthalpy + cp.shape.area(anchorK, t),
    };
  });
  const where = stretches[start]?.station ?? first.station;
  const named = where.form === undefined ? where.phase : `${where.phase} ${where.form}`;
  return {
    pressurePa,
    rungs,
    gaps: placed,
    sources: sourcesOf(data, piece),
    missingBelow: `${piece.below} of ${data.name}`,
    missingAbove: `${piece.above} of ${data.name}`,
    reference: `${named} at ${shortNumber(zero)} K`,
  };
}

/**
 * Zero lies at the first transition between condensed phases, so that it is the same at every pressure; without one at
 * 25 °C, or at that end of the heat capacity that is nearest to it.
 */
function zeroOf(data: MaterialData, { station, toK }: Stretch): number {
  const { cp, phase, form } = station;
  if (cp === undefined) return toK;
  const { stations, crossings } = condensedChain(data);
  const above = crossings[stations.findIndex((other) => other.phase === phase && other.form === form)]?.temperatureK;
  if (above !== undefined && covers(cp, above)) return above;
  return Math.min(Math.max(ROOM_K, cp.fromK), cp.toK);
}

/** Everything that the enthalpies of a piece rest on. */
function sourcesOf(data: MaterialData, { stretches, gaps }: Piece): readonly string[] {
  const heats = gaps.flatMap(({ change }) =>
    [...data.heats].filter(([key]) => key.startsWith(`${change} `)).map(([, given]) => readable(given)?.sources ?? []),
  );
  return [...new Set([...stretches.map(({ station }) => station.cp?.sources ?? []), ...heats].flat())];
}
