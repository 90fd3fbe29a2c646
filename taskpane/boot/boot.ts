import { excelHost } from '../hosts/excel';
import type { WorkbookHost } from '../port';
import { startBlankReader } from './blankReader';
import { notice } from './notice';
import { startSettings } from './startSettings';
import { whenVisible } from './whenVisible';

export interface PaneModule {
  readonly mountPane: (host: WorkbookHost, element: HTMLElement) => () => void;
}

const OUTSIDE = 'This page is the side pane of Latentry inside Excel: open it there from the ribbon, or use the';
const LOCAL_PAGE = { text: 'local workbook page', href: 'index.html' };

async function officeHost(): Promise<string | null> {
  if (typeof Office === 'undefined') return null;
  // Outside its own programs the platform resolves with null, whatever its types say.
  const { host }: { readonly host: unknown } = await Office.onReady();
  return typeof host === 'string' ? host : null;
}

/**
 * In this order: the platform is ready, the settings are read so that formulas answer, and only when a person
 * opens the pane its own code is loaded. Outside Excel it says where to go.
 */
export async function boot(element: HTMLElement, loadPane: () => Promise<PaneModule>): Promise<void> {
  if ((await officeHost()) !== 'Excel') {
    notice(element, OUTSIDE, LOCAL_PAGE);
    return;
  }
  try {
    const host = await excelHost();
    startBlankReader(host);
    await startSettings(host);
    await whenVisible(element);
    const { mountPane } = await loadPane();
    mountPane(host, element);
  } catch (error) {
    const text = error instanceof Error ? error.message : String(error);
    notice(element, `Latentry could not start: ${text}. Close the pane and open it again.`);
    throw error;
  }
}
