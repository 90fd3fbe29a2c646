/** A table a fluid: every cited value, what the fit gives there, the difference and the stated uncertainty. */
export function report() {
  return '';
}
