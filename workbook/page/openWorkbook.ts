import type { Book } from '../book';
import { askBefore } from './bar/askBefore';
import type { PageElements } from './bar/elements';
import { notice, wordsOf } from './bar/notice';
import { dropFile } from './files/dropFile';
import { type PickedFile, pickFile } from './files/pickFile';
import { storeFile } from './files/storeFile';
import type { Grid } from './grid/openGrid';
import { autosave } from './keep/autosave';
import type { Keeper } from './keep/keeper';
import { type Original, readWorkbook, writeWorkbook } from './workbookFile';

export interface OpenState {
  readonly grid: Grid;
  readonly elements: PageElements;
  /** Absent where the browser keeps nothing. */
  readonly keeper: Keeper | undefined;
  readonly standard: () => Book;
  readonly name: string;
  readonly changed: boolean;
  readonly original: Original | undefined;
}

const STANDARD = 'Standard workbook.xlsx';

/** The workbook as a file: New, Open, Save, dropping a file, and keeping it in the browser. */
export function openWorkbook(state: OpenState): void {
  const { grid, elements, keeper, standard } = state;
  const { buttons, status } = elements;
  let { name, changed, original } = state;
  let quiet = false;
  let changes = 0;
  let keptChanges = 0;

  const say = (text: string) => {
    status.textContent = text;
  };
  const showName = () => {
    elements.bookName.textContent = name.replace(/\.xlsx$/i, '');
    elements.bookName.title = changed ? `${name}, with changes that no file holds` : name;
    document.title = `${changed ? '• ' : ''}${name.replace(/\.xlsx$/i, '')} – Latentry`;
  };
  const failed = (what: string) => (error: unknown) => notice(elements.notice, `${what}: ${wordsOf(error)}`);

  const keep = async () => {
    if (keeper === undefined) return;
    const upTo = changes;
    const file = original === undefined ? {} : { file: original.bytes };
    await keeper.save({ name, changed, book: grid.book(), ...file });
    keptChanges = upTo;
    say('Kept in this browser');
  };
  const keepOrSay = () => void keep().catch(failed('This browser could not keep the workbook, save it to a file'));

  const saving = autosave(
    grid,
    (byPerson) => {
      changes += 1;
      if (quiet || !byPerson || changed) return;
      changed = true;
      showName();
    },
    keepOrSay,
  );

  const show = (book: Book, newName: string, newOriginal: Original | undefined) => {
    quiet = true;
    try {
      grid.open(book);
    } finally {
      quiet = false;
    }
    name = newName;
    original = newOriginal;
    changed = false;
    showName();
    notice(elements.notice, '');
    keepOrSay();
  };

  const save = async (): Promise<boolean> => {
    await endEditing(grid);
    const book = grid.book();
    const bytes = await writeWorkbook(book, original);
    const stored = await storeFile(name, bytes);
    if (stored === null) return false;
    name = stored.name;
    changed = false;
    original = await readWorkbook(bytes);
    grid.savedAs(original.file.book);
    showName();
    await keep();
    say(`Saved ${name}`);
    return true;
  };

  /** True where the workbook that is open may go. */
  const mayLeave = async (): Promise<boolean> => {
    await endEditing(grid);
    if (!changed) return true;
    const answer = await askBefore(elements, `"${name}" has changes that no file holds.`);
    return answer === 'discard' || (answer === 'save' && (await save()));
  };

  const open = async ({ name: fileName, bytes }: PickedFile) => {
    let read: Original;
    say(`Opening ${fileName} …`);
    try {
      read = await readWorkbook(bytes);
    } catch (error) {
      say('');
      notice(elements.notice, `"${fileName}" was not opened, your workbook is as it was. ${wordsOf(error)}`);
      return;
    }
    say('');
    if (await mayLeave()) show(read.file.book, fileName, read);
  };

  const actions = {
    new: async () => {
      if (await mayLeave()) show(standard(), STANDARD, undefined);
    },
    open: async () => {
      const file = await pickFile(elements.fileInput);
      if (file !== null) await open(file);
    },
    save,
  };
  const run = (id: keyof typeof actions) => {
    const words = { new: 'No new workbook', open: 'The file was not opened', save: 'The workbook was not saved' };
    actions[id]().catch(failed(words[id]));
  };
  for (const id of ['new', 'open', 'save'] as const) buttons[id].addEventListener('click', () => run(id));
  window.addEventListener(
    'keydown',
    (event) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey || event.shiftKey) return;
      const id = { s: 'save', o: 'open' }[event.key.toLowerCase()];
      if (id !== 'save' && id !== 'open') return;
      event.preventDefault();
      event.stopPropagation();
      run(id);
    },
    true,
  );
  dropFile(
    elements.sheet,
    (file) => void open(file).catch(failed('The file was not opened')),
    failed('The file was not read'),
  );
  // A save that has begun may not end when the page goes: what is not surely kept is kept in the quick way too.
  const keepNow = () => {
    if (changes !== keptChanges) keeper?.saveNow({ name, changed, book: grid.book() });
  };
  window.addEventListener('pagehide', keepNow);
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState !== 'hidden') return;
    keepNow();
    saving.flush();
  });

  showName();
  say(state.keeper === undefined ? '' : 'Kept in this browser');
}

async function endEditing(grid: Grid): Promise<void> {
  if (grid.workbook().isCellEditing()) await grid.workbook().endEditingAsync(true);
}
