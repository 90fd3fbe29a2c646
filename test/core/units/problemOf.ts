import { Problem, type ProblemData } from '../../../core/problem';

type ArgumentProblem = Extract<ProblemData, { code: 'argument' }>;

/** The data of the problem that a call must throw. */
export function problemOf(call: () => unknown): ArgumentProblem {
  try {
    call();
  } catch (thrown) {
    if (thrown instanceof Problem && thrown.data.code === 'argument') return thrown.data;
    throw thrown;
  }
  throw new Error('nothing was refused');
}
