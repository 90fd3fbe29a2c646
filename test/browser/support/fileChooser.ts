import type { Page } from 'playwright-core';

/** Gives the page a file when it asks for one. */
export async function fileChooser(
  page: Page,
  file: { readonly name: string; readonly bytes: Buffer },
  ask: () => Promise<void>,
): Promise<void> {
  const [chooser] = await Promise.all([page.waitForEvent('filechooser'), ask()]);
  await chooser.setFiles({ name: file.name, mimeType: 'application/octet-stream', buffer: file.bytes });
}
