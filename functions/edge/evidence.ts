import type { Answer, LatentKind } from '../../core/answer';
import { Problem } from '../../core/problem';
import type { Settings } from '../settings/settings';
import { CellFault } from './cell';
import { faultOf, writerFor } from './cellError';
import { wordOption } from './keys';
import type { Plan } from './spec';

/** The parts of an answer that a cell can show instead of its value. */
export const ANSWER_PARTS = [
  'value',
  'uncertainty',
  'expanded',
  'kind',
  'method',
  'source',
  'range',
  'status',
] as const;
export type AnswerPart = (typeof ANSWER_PARTS)[number];

/** Coverage factor of `answer=expanded`: k = 2, about 95 % for a normal distribution (GUM 6.3.3). */
const COVERAGE_FACTOR = 2;

const KIND_WORDS: Record<LatentKind, string> = {
  coexistence: 'coexistence: both phases on the two-phase line',
  isobaric: 'isobaric: both phases at one stated pressure',
  standard: 'standard: liquid or solid at 1 bar against ideal gas',
};

export function answerPart(settings: Settings): AnswerPart {
  return wordOption(settings, 'answer', ANSWER_PARTS, 'value');
}

/** The asked part of one element's evidence; a problem becomes words for `status` and a fault for the rest. */
export function showPart(
  part: AnswerPart,
  plan: Plan,
  quantities: readonly number[],
  settings: Settings,
): number | string | CellFault {
  const [a = NaN, b = NaN, c = NaN, d = NaN] = quantities;
  try {
    if (plan.record === undefined) {
      if (part !== 'status')
        throw new Problem({ code: 'missing', subject: part, reason: 'this function gives a value only' });
      plan.compute(a, b, c, d);
      return 'ok';
    }
    return partOf(plan.record(a, b, c, d), part, plan, settings);
  } catch (thrown) {
    const fault = faultOf(thrown, settings);
    return part === 'status' ? statusOf(fault) : fault;
  }
}

/** A fault as `answer=status` shows it. */
export function statusOf(fault: CellFault): string {
  return `${fault.code} ${fault.message}`.trim();
}

function partOf(answer: Answer, part: AnswerPart, plan: Plan, settings: Settings): number | string {
  const toCell = plan.toCell ?? ((si: number) => si);
  switch (part) {
    case 'value':
      return toCell(answer.value);
    case 'uncertainty':
    case 'expanded': {
      if (answer.uncertainty === undefined) {
        throw new Problem({ code: 'missing', subject: 'uncertainty', reason: 'the source states none for this value' });
      }
      const u = Math.abs((plan.toCellDifference ?? toCell)(answer.uncertainty));
      return part === 'uncertainty' ? u : COVERAGE_FACTOR * u;
    }
    case 'kind':
      return answer.kind === undefined ? 'no kind: not a latent heat' : KIND_WORDS[answer.kind];
    case 'method':
      return answer.method;
    case 'source':
      return answer.sources.join('; ');
    case 'range': {
      if (plan.rangeWords !== undefined) return plan.rangeWords;
      const write = writerFor(settings)[answer.range.axis];
      return `[${write(answer.range.from)}, ${write(answer.range.to)}]`;
    }
    case 'status':
      return answer.marks.length === 0 ? 'ok' : answer.marks.map((mark) => `${mark.code}: ${mark.text}`).join('; ');
  }
}
