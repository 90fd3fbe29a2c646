import type { Gap, Ladder } from '../substance';
import type { Place } from './place';

/** One leg of a path: along a phase, or across a transition. */
export interface HeatStep {
  /**
   * `liquid`, `vaporization`; `condensation` where the path goes down; `metastable liquid` on the way to where it is
   * stable; `liquid to solid` where a metastable state changes at its own temperature.
   */
  readonly label: string;
  readonly fromK: number;
  readonly toK: number;
  /** J/mol taken up. */
  readonly heat: number;
}

const DOWNWARD: Readonly<Record<string, string>> = {
  fusion: 'freezing',
  vaporization: 'condensation',
  sublimation: 'deposition',
};

/** The legs between two stable places; downward they are the upward legs turned round. */
export function climb(a: Place, b: Place, ladder: Ladder): HeatStep[] {
  if (a.segment < b.segment || (a.segment === b.segment && a.enthalpy <= b.enthalpy)) return upward(a, b, ladder);
  return upward(b, a, ladder)
    .reverse()
    .map(({ label, fromK, toK, heat }) => ({ label: downward(label), fromK: toK, toK: fromK, heat: -heat }));
}

/** `freezing` for fusion, `gamma-alpha` for alpha-gamma; a phase keeps its name. */
function downward(label: string): string {
  const at = label.indexOf('-');
  return DOWNWARD[label] ?? (at < 0 ? label : `${label.slice(at + 1)}-${label.slice(0, at)}`);
}

function upward(a: Place, b: Place, ladder: Ladder): HeatStep[] {
  const steps: HeatStep[] = [];
  for (let segment = a.segment; segment <= b.segment; segment++) {
    const span = spanOf(segment, ladder);
    const start = segment === a.segment ? a : span.start;
    const end = segment === b.segment ? b : span.end;
    const heat = end.enthalpy - start.enthalpy;
    if (start.temperatureK === end.temperatureK && heat === 0) continue;
    steps.push({ label: span.label, fromK: start.temperatureK, toK: end.temperatureK, heat });
  }
  return steps;
}

interface Point {
  readonly temperatureK: number;
  readonly enthalpy: number;
}

/** The whole of a segment: a rung between the gaps at its ends, or a gap from its lower side to its upper. */
function spanOf(segment: number, ladder: Ladder): { label: string; start: Point; end: Point } {
  const open: Point = { temperatureK: NaN, enthalpy: NaN };
  const side = (gap: Gap | undefined, at: 'below' | 'above'): Point =>
    gap === undefined ? open : { temperatureK: gap.temperatureK, enthalpy: gap[at] };
  const index = Math.floor(segment / 2);
  const gap = ladder.gaps[index];
  if (segment % 2 === 1) return { label: gap?.change ?? '', start: side(gap, 'below'), end: side(gap, 'above') };
  const rung = ladder.rungs[index];
  return {
    label: rung?.form === undefined ? (rung?.phase ?? '') : `${rung.phase} (${rung.form})`,
    start: side(ladder.gaps[index - 1], 'above'),
    end: side(gap, 'below'),
  };
}
