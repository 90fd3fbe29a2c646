/**
 * Says in words why the page did not start: a script that is not there, or one that broke before the page's own code
 * could speak. Once the workbook is shown it does nothing more.
 */
export function startFailures(): void {
  window.addEventListener(
    'error',
    (event) => {
      const loading = document.getElementById('loading');
      if (loading === null || loading.hidden) return;
      const script = event.target instanceof HTMLScriptElement ? event.target.src : '';
      const reason = script === '' ? event.message : `${script} could not be loaded`;
      loading.setAttribute('role', 'alert');
      loading.textContent = `The workbook could not be started: ${reason}. Reload the page to try again.`;
    },
    true,
  );
}
