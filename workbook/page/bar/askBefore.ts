import type { PageElements } from './elements';

export type Answer = 'save' | 'discard' | 'cancel';

/** Asks what to do with changes that no file holds; Escape cancels. */
export function askBefore({ ask, askText }: Pick<PageElements, 'ask' | 'askText'>, text: string): Promise<Answer> {
  askText.textContent = text;
  ask.returnValue = 'cancel';
  ask.showModal();
  return new Promise((resolve) => {
    ask.addEventListener(
      'close',
      () => resolve(ask.returnValue === 'save' || ask.returnValue === 'discard' ? ask.returnValue : 'cancel'),
      { once: true },
    );
  });
}
