import type { LatentKind } from '../../../../core/answer';
import { evaluate, type OutOfRange } from '../../../../core/evaluate';
import type { Change, Substance } from '../../../../core/substance';
import type { FormulaAsk } from '../../../plan/formulaText';
import { factOf } from './fact';
import type { Quantity } from './quantity';

const KINDS: readonly LatentKind[] = ['coexistence', 'isobaric', 'standard'];

/** A latent heat of one kind and the slope of the same kind. */
export interface KindFacts {
  readonly kind: LatentKind;
  /** True for the kind that formulas give without being told. */
  readonly usual: boolean;
  readonly latent: Quantity;
  readonly slope: Quantity;
}

export interface ChangeFacts {
  readonly change: Change;
  /** The usual kind first. */
  readonly kinds: readonly KindFacts[];
}

/** Where the facts are asked. */
export interface FactsAt {
  readonly temperatureK: number;
  readonly pressurePa: number;
  /** The pressure in the workbook's unit, for labels. */
  readonly pressureText: string;
  readonly outOfRange: OutOfRange;
}

/** Every latent heat of a substance at a temperature, each kind with the slope of its own kind. */
export function latentFacts(substance: Substance, at: FactsAt): ChangeFacts[] {
  return substance.changes.map((change) => {
    const usual = substance.defaultKind(change);
    const kinds = [usual, ...KINDS.filter((kind) => kind !== usual)];
    return { change, kinds: kinds.map((kind) => kindFacts(substance, change, kind, at)) };
  });
}

function kindFacts(substance: Substance, change: Change, kind: LatentKind, at: FactsAt): KindFacts {
  const usual = kind === substance.defaultKind(change);
  const quantity = (which: 'latent' | 'latentSlope'): Quantity => {
    const label = which === 'latent' ? latentLabel(kind, at) : slopeLabel(change, kind, at);
    return {
      label,
      name: `${change}: ${label}`,
      fact: factOf(() => {
        const curve = substance[which](change, kind, kind === 'isobaric' ? at.pressurePa : undefined);
        return evaluate(curve, at.temperatureK, at.outOfRange);
      }),
      ask: askFor(which === 'latent' ? 'LATENT' : 'DELTACP', substance, change, usual ? undefined : kind, kind),
    };
  };
  return { kind, usual, latent: quantity('latent'), slope: quantity('latentSlope') };
}

function askFor(
  name: 'LATENT' | 'DELTACP',
  substance: Substance,
  change: Change,
  written: LatentKind | undefined,
  kind: LatentKind,
): FormulaAsk {
  return {
    name,
    arguments: [{ text: substance.name }, { text: change }, 'temperature'],
    ...(written === undefined ? {} : { kind: written }),
    ...(kind === 'isobaric' ? { atPressure: true } : {}),
  };
}

function latentLabel(kind: LatentKind, { pressureText }: FactsAt): string {
  switch (kind) {
    case 'coexistence':
      return 'ΔH on the two-phase line';
    case 'isobaric':
      return `ΔH at ${pressureText}`;
    case 'standard':
      return 'ΔH° of the standard states, 1 bar';
  }
}

/** The slope along a two-phase line is nowhere called ΔCp: part of it is no heat capacity. */
function slopeLabel(change: Change, kind: LatentKind, { pressureText }: FactsAt): string {
  switch (kind) {
    case 'coexistence':
      return change === 'vaporization' || change === 'sublimation'
        ? 'slope along saturation'
        : 'slope along the two-phase line';
    case 'isobaric':
      return `ΔCp at ${pressureText}`;
    case 'standard':
      return 'ΔCp° of the standard states';
  }
}
