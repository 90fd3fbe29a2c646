/** The page's own elements, all of them in its HTML. */
export interface PageElements {
  readonly bookName: HTMLElement;
  readonly status: HTMLElement;
  readonly notice: HTMLElement;
  readonly sheet: HTMLElement;
  readonly grid: HTMLElement;
  readonly loading: HTMLElement;
  readonly pane: HTMLElement;
  readonly fileInput: HTMLInputElement;
  readonly ask: HTMLDialogElement;
  readonly askText: HTMLElement;
  readonly buttons: Readonly<Record<'new' | 'open' | 'save' | 'undo' | 'redo' | 'pane-toggle', HTMLButtonElement>>;
}

export function pageElements(): PageElements {
  const button = (id: string) => element(id, HTMLButtonElement);
  return {
    bookName: element('book-name', HTMLElement),
    status: element('status', HTMLElement),
    notice: element('notice', HTMLElement),
    sheet: element('sheet', HTMLElement),
    grid: element('grid', HTMLElement),
    loading: element('loading', HTMLElement),
    pane: element('pane', HTMLElement),
    fileInput: element('file', HTMLInputElement),
    ask: element('ask', HTMLDialogElement),
    askText: element('ask-text', HTMLElement),
    buttons: {
      new: button('new'),
      open: button('open'),
      save: button('save'),
      undo: button('undo'),
      redo: button('redo'),
      'pane-toggle': button('pane-toggle'),
    },
  };
}

function element<T extends HTMLElement>(id: string, kind: abstract new () => T): T {
  const found = document.getElementById(id);
  if (!(found instanceof kind)) throw new Error(`the page has no element "${id}"`);
  return found;
}
