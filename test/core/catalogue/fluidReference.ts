import { readFileSync } from 'node:fs';
import { catalogue } from '../../../core/catalogue/find';
import type { Curve, Substance } from '../../../core/substance';

/** One published value that no fit has seen. */
export interface Unseen {
  readonly fluid: string;
  readonly quantity: 'dHvap' | 'p_sat' | 'cp_liquid';
  readonly T_K: number;
  readonly value: number;
  readonly unit: 'kJ/mol' | 'kPa' | 'J/(mol K)';
  readonly source: string;
  readonly status: string;
}

type Uncertainty = Readonly<Partial<Record<Unseen['quantity'], number>>>;

interface UnseenFile {
  readonly sources: Readonly<Record<string, { readonly citation: string; readonly uncertainty: Uncertainty }>>;
  readonly agreement: Readonly<
    Record<string, { readonly T_K: number; readonly p_sat_kPa: number; readonly dHvap_kJ_per_mol?: number }>
  >;
  readonly values: readonly Unseen[];
}

export const unseen = JSON.parse(
  readFileSync(new URL('../../reference/fluid-unseen.json', import.meta.url), 'utf8'),
) as UnseenFile;

/** The catalogue's curve for a quantity; vapour pressure over the liquid. */
export function curveFor(substance: Substance, quantity: Unseen['quantity']): Curve {
  if (quantity === 'dHvap') return substance.latent('vaporization', 'coexistence');
  if (quantity === 'p_sat') return substance.saturationPressure('stable');
  return substance.heatCapacity('liquid', 'saturated');
}

const SI = { 'kJ/mol': 1000, kPa: 1000, 'J/(mol K)': 1 } as const;

/** One comparison: deviations relative to the published value. */
export interface Judged {
  readonly at: Unseen;
  readonly tr: number;
  readonly deviation: number;
  /** Standard uncertainty that the catalogue states, relative; Infinity where it states none. */
  readonly stated: number;
  /** Expanded uncertainty (k = 2) of the published value itself, relative. */
  readonly published: number;
}

/** Compares the catalogue with one published value; undefined where that lies outside the curve's range. */
export function judge(at: Unseen): Judged | undefined {
  const substance = catalogue.entry(at.fluid)?.make();
  if (substance === undefined) throw new Error(`no such fluid: ${at.fluid}`);
  const curve = curveFor(substance, at.quantity);
  if (at.T_K < curve.from || at.T_K > curve.to) return undefined;
  const critical = substance.constants.find(({ item }) => item === 'critical temperature')?.value;
  if (critical === undefined) throw new Error(`no critical temperature: ${at.fluid}`);
  const published = at.value * SI[at.unit];
  const stated = curve.uncertaintyAt?.(at.T_K);
  return {
    at,
    tr: at.T_K / critical,
    deviation: curve.at(at.T_K) / published - 1,
    stated: stated === undefined ? Infinity : stated / published,
    published: unseen.sources[at.source]?.uncertainty[at.quantity] ?? NaN,
  };
}

/** The value below which a share of the numbers lies. */
export function quantile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] ?? NaN;
}
