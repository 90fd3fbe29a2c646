import type { Mark } from '../answer';
import type { FluidNumbers } from './fluidNumbers';

/** From this part of the critical temperature on nothing here is certain. */
const NEAR_CRITICAL = 0.97;

export const NO_MARKS: readonly Mark[] = [];

const CRITICAL: readonly Mark[] = [
  { code: 'near-critical', text: 'within 3 % of the critical temperature, where the fitted forms are least certain' },
];

/** Marks along the saturation line, with those of data that nobody has confirmed. */
export function lineMarks(numbers: FluidNumbers, property: string): (temperatureK: number) => readonly Mark[] {
  const { criticalK, meltingK, name, unconfirmed } = numbers;
  const supercooled: readonly Mark[] = [
    { code: 'metastable', text: `of supercooled liquid: solid ${name} is the stable phase here` },
  ];
  const always = unconfirmed.has(property) ? unconfirmedMark(property) : NO_MARKS;
  const both = (marks: readonly Mark[]): readonly Mark[] => (always.length === 0 ? marks : [...marks, ...always]);
  const cold = both(supercooled);
  const hot = both(CRITICAL);
  return (k) => (k < meltingK ? cold : k > NEAR_CRITICAL * criticalK ? hot : always);
}

/** Marks of a solid's heat capacity and of what rests on it. */
export function solidMarks({ solid }: FluidNumbers): readonly Mark[] {
  return solid === undefined || solid.confirmed ? NO_MARKS : unconfirmedMark(SOLID_HEAT_CAPACITY);
}

/** Marks of the sublimation line, which follows from the solid's heat capacity. */
export function sublimationMarks({ solid }: FluidNumbers): readonly Mark[] {
  return solid === undefined || solid.confirmed || solid.lineConfirmed
    ? NO_MARKS
    : unconfirmedMark(SOLID_HEAT_CAPACITY);
}

const SOLID_HEAT_CAPACITY = 'solid heat capacity';

export function unconfirmedMark(property: string): readonly Mark[] {
  return [{ code: 'unconfirmed', text: `rests on values for ${property} that no second source confirms` }];
}
