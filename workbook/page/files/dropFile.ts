import { pickedFile, type PickedFile } from './pickFile';

/** Takes files that are dropped on an element; everything else that is dragged stays with the grid. */
export function dropFile(
  element: HTMLElement,
  open: (file: PickedFile) => void,
  failed: (error: unknown) => void,
): void {
  const carriesFile = (event: DragEvent) => event.dataTransfer?.types.includes('Files') === true;
  const mark = (on: boolean) => element.classList.toggle('dropping', on);
  const over = (event: DragEvent) => {
    if (!carriesFile(event)) return;
    event.preventDefault();
    mark(true);
  };
  window.addEventListener('dragover', over, true);
  window.addEventListener(
    'dragleave',
    (event) => {
      if (event.relatedTarget === null) mark(false);
    },
    true,
  );
  window.addEventListener(
    'drop',
    (event) => {
      if (!carriesFile(event)) return;
      event.preventDefault();
      event.stopPropagation();
      mark(false);
      const file = event.dataTransfer?.files[0];
      if (file !== undefined) pickedFile(file).then(open, failed);
    },
    true,
  );
}
