import { useSyncExternalStore } from 'react';
import { contrastTheme, darkTheme, lightTheme, type PaneTheme } from './theme';

const contrast = '(forced-colors: active)';
const dark = '(prefers-color-scheme: dark)';

function subscribe(changed: () => void): () => void {
  const queries = [contrast, dark].map((text) => matchMedia(text));
  for (const query of queries) query.addEventListener('change', changed);
  return () => {
    for (const query of queries) query.removeEventListener('change', changed);
  };
}

function themeNow(): PaneTheme {
  if (matchMedia(contrast).matches) return contrastTheme;
  return matchMedia(dark).matches ? darkTheme : lightTheme;
}

/** The theme that the person's system asks for, followed while the pane is open. */
export function useTheme(): PaneTheme {
  return useSyncExternalStore(subscribe, themeNow);
}
