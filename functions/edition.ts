import { answer } from './edge/answer';
import { EDITION, DATA_EDITION } from './edge/editionText';
import type { BlockwiseSpec } from './edge/spec';

const spec: BlockwiseSpec = {
  family: 'blockwise',
  name: 'EDITION',
  args: [],
  options: [],
  run: () => [[`functions ${EDITION}; data ${DATA_EDITION}`]],
};

/**
 * Version of the functions and of the data that computed this workbook.
 * @customfunction EDITION
 * @param invocation The call itself.
 * @returns One text.
 */
export function edition(invocation?: CustomFunctions.Invocation): any[][] {
  return answer(spec, [invocation]);
}
