import { STANDARD_ATMOSPHERE_PA } from '../../../../core/atmosphere';
import type { Answer } from '../../../../core/answer';
import { Problem } from '../../../../core/problem';
import type { Change, Substance } from '../../../../core/substance';
import { factOf, type Fact } from '../facts/fact';

const ROOM_K = 298.15;

/** How far latent heat and heat capacities disagree between 298.15 K and the boiling point. */
export interface Disagreement {
  readonly change: Change;
  readonly fromK: number;
  readonly toK: number;
  readonly fact: Fact;
  /** The difference as a share of the latent heat at the boiling point. */
  readonly share?: number;
}

/** The disagreement of a substance that boils at one atmosphere; none for one that doesn't. */
export function disagreements(substance: Substance): Disagreement[] {
  const boilingK = boilingPoint(substance);
  if (boilingK === undefined || boilingK === ROOM_K) return [];
  const change = 'vaporization';
  const fact = factOf((): Answer => substance.disagreement(change, ROOM_K, boilingK));
  const latent = factOf(() => {
    const curve = substance.latent(change, substance.defaultKind(change));
    return {
      value: curve.at(boilingK),
      unit: curve.unit,
      method: '',
      sources: [],
      range: { axis: 'temperature', from: boilingK, to: boilingK },
      marks: [],
    };
  });
  const share =
    fact.answer === undefined || latent.answer === undefined ? undefined : fact.answer.value / latent.answer.value;
  return [
    {
      change,
      fromK: ROOM_K,
      toK: boilingK,
      fact,
      ...(share === undefined || !Number.isFinite(share) ? {} : { share }),
    },
  ];
}

function boilingPoint(substance: Substance): number | undefined {
  try {
    return substance.ladder(STANDARD_ATMOSPHERE_PA).gaps.find(({ change }) => change === 'vaporization')?.temperatureK;
  } catch (error) {
    if (error instanceof Problem) return undefined;
    throw error;
  }
}
