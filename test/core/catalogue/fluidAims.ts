import type { Judged } from './fluidReference';

export interface Aim {
  readonly name: string;
  readonly of: (one: Judged) => boolean;
  /** Half of the deviations are at most this, relative. */
  readonly median: number;
  /** 95 % of the deviations are at most this, relative. */
  readonly most: number;
}

/** How near the catalogue comes to values that its fits have not seen. */
export const AIMS: readonly Aim[] = [
  {
    name: 'heat of vaporization from 0.5 to 0.8 Tc',
    of: ({ at, tr }) => at.quantity === 'dHvap' && tr >= 0.495 && tr <= 0.805,
    median: 0.007,
    most: 0.03,
  },
  {
    name: 'heat of vaporization at 0.9 Tc',
    of: ({ at, tr }) => at.quantity === 'dHvap' && tr > 0.805 && tr < 0.915,
    median: 0.02,
    most: 0.06,
  },
  { name: 'vapour pressure from 2 kPa to 0.9 pc', of: ({ at }) => at.quantity === 'p_sat', median: 0.01, most: 0.03 },
  {
    name: 'heat capacity of the saturated liquid',
    of: ({ at }) => at.quantity === 'cp_liquid',
    median: 0.01,
    most: 0.03,
  },
];
