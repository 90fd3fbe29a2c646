import { STANDARD_ATMOSPHERE_PA } from '../../core/atmosphere';
import type { Answer } from '../../core/answer';
import type { HeatPath } from '../../core/path/heatSteps';
import type { Place } from '../../core/path/place';
import type { Ladder } from '../../core/substance';

/** The pressure of an optional argument: one standard atmosphere when left out. */
export function orAtmosphere(pressurePa: number): number {
  return pressurePa === pressurePa ? pressurePa : STANDARD_ATMOSPHERE_PA;
}

function rangeOf(ladder: Ladder): Answer['range'] {
  return { axis: 'temperature', from: ladder.rungs[0]?.fromK ?? 0, to: ladder.rungs.at(-1)?.toK ?? Infinity };
}

/** The evidence of a heat between two states. */
export function pathRecord(path: HeatPath): Answer {
  return {
    value: path.heat,
    unit: 'J/mol',
    method: 'enthalpy difference at constant pressure, through every phase and transition between the states',
    sources: path.ladder.sources,
    range: rangeOf(path.ladder),
    marks: path.marks,
  };
}

/** The evidence of one state's enthalpy. */
export function placeRecord(place: Place, ladder: Ladder, reference: string): Answer {
  return {
    value: place.enthalpy,
    unit: 'J/mol',
    method: `enthalpy; zero: ${reference}`,
    sources: ladder.sources,
    range: rangeOf(ladder),
    marks: place.marks,
  };
}
