import type { Phase } from '../substance';

/** A state on a heating path at one pressure, as its user names it. */
export type State =
  /** A temperature, and the phase where it is named. */
  | { readonly form: 'temperature'; readonly temperatureK: number; readonly phase?: Phase }
  /** On the boiling (or subliming) line: all liquid or all vapour. */
  | { readonly form: 'saturated'; readonly phase: 'liquid' | 'gas' }
  /** On the boiling line, this part of the amount being vapour: 0 to 1. */
  | { readonly form: 'fraction'; readonly vapor: number }
  /** Liquid below its boiling temperature by a difference. */
  | { readonly form: 'subcooled'; readonly deltaK: number }
  /** Vapour above its boiling (or subliming) temperature by a difference. */
  | { readonly form: 'superheated'; readonly deltaK: number }
  /** At the melting temperature: all solid or all liquid. */
  | { readonly form: 'melting'; readonly phase: 'solid' | 'liquid' };
