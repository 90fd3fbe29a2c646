import { catalogue } from '../../../core/catalogue/find';
import type { Registry } from '../../../core/catalogue/registry';

/** A row of the Substances sheet that could not be read. */
export interface HouseFault {
  readonly cell: string;
  readonly message: string;
}

/** The substances in force: the built-in ones, and the team's own from the workbook. */
export interface RegistryView {
  readonly registry: Registry;
  readonly faults: readonly HouseFault[];
}

const builtIn: RegistryView = { registry: catalogue, faults: [] };

/** The substances in force, followed. */
export function useRegistry(): RegistryView {
  return builtIn;
}
