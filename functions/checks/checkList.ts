import type { Check } from './check';
import { condensedChecks } from './condensedChecks';
import { estimateChecks } from './estimateChecks';
import { fitChecks } from './fitChecks';
import { fluidChecks } from './fluidChecks';
import { storageChecks } from './storageChecks';
import { unitChecks } from './unitChecks';
import { waterChecks } from './waterChecks';

/** Every published check, in the order in which SELFCHECK lists them. */
export const checkList: readonly Check[] = [
  ...waterChecks,
  ...fluidChecks,
  ...condensedChecks,
  ...storageChecks,
  ...estimateChecks,
  ...fitChecks,
  ...unitChecks,
];
