import { useEffect, useState, useSyncExternalStore } from 'react';
import { DEFAULT_SETTINGS, type Settings } from '../../../functions/settings/settings';
import { settingsStore, type StoreState } from '../../../functions/settings/store';
import { UNITS_NAME } from '../../boot/readSnapshot';
import type { Block, WorkbookHost } from '../../port';

const subscribe = (changed: () => void) => settingsStore.subscribe(changed);
const current = () => settingsStore.current();

/** What the settings store knows, followed. */
export function useStore(): StoreState {
  return useSyncExternalStore(subscribe, current);
}

/** The settings in force where there are any; the defaults where a workbook has none; undefined where they can't be read. */
export function settingsOf(state: StoreState): Settings | undefined {
  if (state.state === 'ready') return state.settings;
  return state.state === 'absent' ? DEFAULT_SETTINGS : undefined;
}

/** The Units block as it is written, read again whenever the store changes or `turn` does. */
export function useUnitsBlock(host: WorkbookHost, state: StoreState, turn: number): Block | null {
  const [block, setBlock] = useState<Block | null>(null);
  useEffect(() => {
    let wanted = true;
    void readUnitsBlock(host).then((read) => {
      if (wanted) setBlock(read);
    });
    return () => {
      wanted = false;
    };
  }, [host, state, turn]);
  return block;
}

async function readUnitsBlock(host: WorkbookHost): Promise<Block | null> {
  const named = [...(await host.names(UNITS_NAME))].find(([name]) => name.toLowerCase() === UNITS_NAME.toLowerCase());
  const ref = named?.[1];
  if (ref === undefined || ref === 'broken') return null;
  const [block] = await host.read([ref]);
  return block ?? null;
}
