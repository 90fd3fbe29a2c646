import type { CallPlace } from './callPlace';
import { Refusal } from './refusal';

/** How a call that gave a promise ended. */
export type Settled = { readonly value: unknown } | { readonly thrown: unknown };

/**
 * Answers that come as promises. The formula engine can't wait inside a calculation (within a LAMBDA a waiting
 * function would end it), so such a call shows "#N/A" at first, and its cell is calculated again when the answer is there.
 */
export interface LateAnswers {
  /** The answer of an earlier call with this key, once; `waiting` while it has not come; undefined for a new call. */
  take(key: () => string): Settled | 'waiting' | undefined;
  wait(key: string, answer: PromiseLike<unknown>, place: CallPlace): void;
  /** Resolves when no answer is outstanding; true where some came since the last time. */
  whenSettled(): Promise<boolean>;
}

/** A promise that has not settled by then is given up. */
const LONGEST_ANSWER_MS = 60_000;

/** Makes the store of late answers; `onSettled` hears of each cell that is to be calculated again. */
export function createLateAnswers(onSettled: (place: CallPlace) => void = () => undefined): LateAnswers {
  const answers = new Map<string, Settled | 'waiting'>();
  const outstanding = new Set<Promise<void>>();
  let arrived = false;

  return {
    take: (key) => {
      if (answers.size === 0) return undefined;
      const name = key();
      const answer = answers.get(name);
      if (answer !== undefined && answer !== 'waiting') answers.delete(name);
      return answer;
    },
    wait: (key, answer, place) => {
      answers.set(key, 'waiting');
      const settled = settle(answer).then((result) => {
        answers.set(key, result);
        outstanding.delete(settled);
        arrived = true;
        onSettled(place);
      });
      outstanding.add(settled);
    },
    whenSettled: async () => {
      while (outstanding.size > 0) await Promise.all(outstanding);
      const some = arrived;
      arrived = false;
      return some;
    },
  };
}

/** Never rejects: a rejected promise would end the calculation, and Node with it. */
async function settle(answer: PromiseLike<unknown>): Promise<Settled> {
  let timer: ReturnType<typeof setTimeout> | undefined;
  const deadline = new Promise<never>((_resolve, reject) => {
    const late = new Refusal('#N/A', `no answer within ${LONGEST_ANSWER_MS / 1000} s`);
    timer = setTimeout(() => reject(late), LONGEST_ANSWER_MS);
  });
  try {
    return { value: await Promise.race([answer, deadline]) };
  } catch (thrown) {
    return { thrown };
  } finally {
    clearTimeout(timer);
  }
}
