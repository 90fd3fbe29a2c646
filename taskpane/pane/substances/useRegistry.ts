import { useSyncExternalStore } from 'react';
import type { Registry } from '../../../core/catalogue/registry';
import type { HouseFault } from '../../../core/house/house';
import { currentRegistry } from '../../../functions/house/currentRegistry';
import { houseStore, type HouseState } from '../../../functions/house/store';

/** The substances in force: the built-in ones, and the team's own from the workbook. */
export interface RegistryView {
  readonly registry: Registry;
  /** Rows of the Substances sheet that could not be read, or that need a second look. */
  readonly faults: readonly HouseFault[];
  readonly state: HouseState;
}

const subscribe = (changed: () => void) => houseStore.subscribe(changed);
const current = () => houseStore.current();

/** The substances in force, followed. */
export function useRegistry(): RegistryView {
  const state = useSyncExternalStore(subscribe, current);
  return { registry: currentRegistry(), faults: state.state === 'ready' ? state.house.faults : [], state };
}
