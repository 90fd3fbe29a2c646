/**
 * Resolves once a person can see `element`. The page may have been loaded only to calculate, in a hidden view:
 * such a view draws nothing, so the observer stays silent until the pane is opened.
 */
export function whenVisible(element: Element): Promise<void> {
  return new Promise((resolve) => {
    const observer = new IntersectionObserver((entries) => {
      if (!entries.some((entry) => entry.isIntersecting)) return;
      observer.disconnect();
      resolve();
    });
    observer.observe(element);
  });
}
