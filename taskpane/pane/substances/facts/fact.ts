import type { Answer } from '../../../../core/answer';
import { Problem, type ProblemData } from '../../../../core/problem';

/** A number of the core with all that travels with it, or why there is none. */
export type Fact =
  | { readonly answer: Answer; readonly problem?: undefined }
  | { readonly answer?: undefined; readonly problem: ProblemData };

/** Asks the core; what it refuses is kept as its words, a defect is thrown on. */
export function factOf(ask: () => Answer): Fact {
  try {
    return { answer: ask() };
  } catch (error) {
    if (error instanceof Problem) return { problem: error.data };
    throw error;
  }
}
