import type { WorkbookHost } from '../../taskpane/port';
import { wordsOf } from './bar/notice';

const CHOICE = 'latentry.pane';

/** Shows and hides the side pane; its code is loaded when it is first shown. The choice outlives a reload. */
export function paneToggle(button: HTMLButtonElement, pane: HTMLElement) {
  let host: WorkbookHost | undefined;
  let unmount: (() => void) | undefined;
  let shown = localStorage.getItem(CHOICE) !== 'hidden';
  let mounts = 0;

  const mount = async (on: WorkbookHost) => {
    mounts += 1;
    const mine = mounts;
    unmount?.();
    unmount = undefined;
    try {
      const { mountPane } = await import('../../taskpane/pane/mount');
      if (mine !== mounts) return;
      const place = document.createElement('div');
      pane.replaceChildren(place);
      unmount = mountPane(on, place);
    } catch (error) {
      pane.textContent = `The side pane could not be loaded: ${wordsOf(error)}`;
    }
  };
  const show = () => {
    pane.hidden = !shown;
    button.setAttribute('aria-expanded', String(shown));
    if (shown && host !== undefined && unmount === undefined) void mount(host);
  };
  button.addEventListener('click', () => {
    shown = !shown;
    localStorage.setItem(CHOICE, shown ? 'shown' : 'hidden');
    show();
  });
  show();
  return {
    /** Another workbook: the pane starts anew. */
    use: (next: WorkbookHost) => {
      host = next;
      if (shown) void mount(next);
      else {
        unmount?.();
        unmount = undefined;
      }
    },
  };
}
