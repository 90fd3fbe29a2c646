import type { Mark } from '../answer';
import type { Phase, Rung } from '../substance';

/** Where a state lies on a ladder. */
export interface Place {
  readonly temperatureK: number;
  /** J/mol on the substance's reference. */
  readonly enthalpy: number;
  /** Segment of the ladder: 2i for rung i, 2i + 1 for the gap above it. */
  readonly segment: number;
  readonly phase: Rung['phase'] | 'two phases';
  /** The phase that is not the stable one here, where the state names such a phase. */
  readonly metastable?: Phase;
  /** True where a bare temperature lies on a transition, so that the other end decides the side. */
  readonly undecided?: boolean;
  readonly marks: readonly Mark[];
}
