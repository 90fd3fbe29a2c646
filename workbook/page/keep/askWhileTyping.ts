import type { Injector } from '@univerjs/core';
import { IEditorBridgeService } from '@univerjs/sheets-ui';

/** What stands in a cell that is still being typed in is not kept yet: leaving the page then asks first. */
export function askWhileTyping(injector: Injector): void {
  const editor = injector.get(IEditorBridgeService);
  window.addEventListener('beforeunload', (event) => {
    if (editor.isVisible().visible) event.preventDefault();
  });
}
