import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import type { WorkbookHost } from '../port';
import { Pane } from './Pane';

/**
 * Shows the side pane in an element; the pane sees the workbook through the port alone.
 * @param host The workbook.
 * @param element An empty element at least 320 px wide; the pane fills it.
 * @returns A function that takes the pane away again.
 */
export function mountPane(host: WorkbookHost, element: HTMLElement): () => void {
  const root = createRoot(element);
  root.render(
    <StrictMode>
      <Pane host={host} />
    </StrictMode>,
  );
  return () => root.unmount();
}
