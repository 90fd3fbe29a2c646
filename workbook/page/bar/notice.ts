/** Says in words, above the workbook, what went wrong; an empty text takes it away. */
export function notice(element: HTMLElement, text: string): void {
  element.replaceChildren();
  element.hidden = text === '';
  if (text === '') return;
  const words = document.createElement('p');
  words.textContent = text;
  const close = document.createElement('button');
  close.type = 'button';
  close.textContent = 'Close';
  close.addEventListener('click', () => notice(element, ''));
  element.append(words, close);
}

/** The words of anything that was thrown. */
export function wordsOf(error: unknown): string {
  return error instanceof Error ? error.message : String(error);
}
