import { formulaOf, type Check } from './checks/check';
import { checks } from './checks/checks';
import { answer } from './edge/answer';
import type { BlockwiseSpec, Table } from './edge/spec';

const spec: BlockwiseSpec = {
  family: 'blockwise',
  name: 'SELFCHECK',
  args: [],
  options: [],
  run: () => {
    const rows = checks.map(({ check, run }) => rowOf(check, run));
    const passed = rows.filter((row) => row[0] === 'pass').length;
    const head = [`${passed} of ${rows.length} pass`, 'Value', 'Published', 'Deviation', 'Allowed', 'Check', 'Source'];
    return [head, ...rows];
  },
};

function rowOf(check: Check, run: () => number): Table[number] {
  const formula = formulaOf(check);
  try {
    const value = run();
    const deviation = value - check.expected;
    const result = Math.abs(deviation) <= check.within ? 'pass' : 'FAIL';
    return [result, value, check.expected, deviation, check.within, formula, check.source];
  } catch (error) {
    const words = error instanceof Error ? error.message : String(error);
    return ['FAIL', words, check.expected, '', check.within, formula, check.source];
  }
}

/**
 * Every built-in check value against its published source: result, value, published figure, deviation, what it may be, formula, source.
 * @customfunction SELFCHECK
 * @param invocation The call itself.
 * @returns A table with a heading row, one check a row.
 */
export function selfCheck(invocation?: CustomFunctions.Invocation): any[][] {
  return answer(spec, [invocation]);
}
