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
    const passed = rows.filter((row) => row[5] === 'pass').length;
    const head = ['Check', 'Value', 'Published', 'Deviation', 'Allowed', `${passed} of ${rows.length} pass`, 'Source'];
    return [head, ...rows];
  },
};

function rowOf(check: Check, run: () => number): Table[number] {
  const formula = formulaOf(check);
  try {
    const value = run();
    const deviation = value - check.expected;
    const result = Math.abs(deviation) <= check.within ? 'pass' : 'FAIL';
    return [formula, value, check.expected, deviation, check.within, result, check.source];
  } catch (error) {
    return [
      formula,
      error instanceof Error ? error.message : String(error),
      check.expected,
      '',
      check.within,
      'FAIL',
      check.source,
    ];
  }
}

/**
 * Every built-in check value against its published source: value, published figure, deviation, what it may be, result.
 * @customfunction SELFCHECK
 * @param invocation The call itself.
 * @returns A table with a heading row, one check a row.
 */
export function selfCheck(invocation?: CustomFunctions.Invocation): any[][] {
  return answer(spec, [invocation]);
}
