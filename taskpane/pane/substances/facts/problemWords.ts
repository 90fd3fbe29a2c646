import { plainWords, type ProblemData } from '../../../../core/problem';
import type { UnitWriter } from './unitWriter';

/** The words of a refusal in the workbook's units; what is known at one point says so. */
export function problemWords(problem: ProblemData, { words }: UnitWriter): string {
  if (problem.code === 'range' && problem.from === problem.to) {
    return `known at ${words[problem.quantity](problem.from)} only`;
  }
  return plainWords(problem, words);
}
