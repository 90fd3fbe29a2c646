import { settingsStore } from '../../functions/settings/store';
import { startSettings } from '../../taskpane/boot/startSettings';
import { mountPane } from '../../taskpane/pane/mount';
import { memoryHost, type MemoryHost } from '../taskpane/memoryHost';

/** What the tests reach into: the workbook behind the pane. */
export interface PaneTestWindow {
  readonly host: MemoryHost;
  readonly store: typeof settingsStore;
  readonly unmount: () => void;
  /** Begins to watch the settings, as the add-in does when it is ready. */
  start(): Promise<void>;
}

const host = memoryHost();
host.book.addSheet('Data');
const element = document.getElementById('pane');
if (element === null) throw new Error('the page has no element for the pane');

const unmount = mountPane(host, element);
const start = async (): Promise<void> => {
  await startSettings(host);
};

Object.assign(globalThis, { paneTest: { host, store: settingsStore, unmount, start } });
