import { IUndoRedoService } from '@univerjs/core';
import { houseStore } from '../../functions/house/store';
import { settingsStore } from '../../functions/settings/store';
import { startSettings } from '../../taskpane/boot/startSettings';
import type { WorkbookHost } from '../../taskpane/port';
import type { Book } from '../book';
import type { PageElements } from './bar/elements';
import { notice, wordsOf } from './bar/notice';
import { showCellLine } from './cell/showCellLine';
import { showHoverWords } from './cell/showHoverWords';
import { openGrid, type Grid } from './grid/openGrid';
import { autoHeights } from './grid/autoHeights';
import { quietLists } from './grid/quietLists';
import { showFaultMarks } from './grid/showFaultMarks';
import { showFittedNumbers } from './grid/showFittedNumbers';
import { showNoteMarks } from './grid/showNoteMarks';
import { gridHost } from './gridHost';
import { askWhileTyping } from './keep/askWhileTyping';
import { startKeeper, type Keeper } from './keep/keeper';
import { loadFunctions } from './loadFunctions';
import { openWorkbook } from './openWorkbook';
import { paneToggle } from './paneToggle';
import { readWorkbook } from './workbookFile';

const LONGEST_CALCULATION_MS = 60_000;

/** What the page shows: for tests, and for whoever looks with the browser's tools. */
export interface RunningPage {
  readonly grid: Grid;
  readonly host: WorkbookHost;
}

/** Starts the page: functions, grid with what was open last or the standard workbook, bar, pane. */
export async function startPage(elements: PageElements, standard: () => Book): Promise<RunningPage> {
  const [{ list, mappings }, keeper] = await Promise.all([loadFunctions(), keeperOf(elements)]);
  const kept = await keeper?.load();
  const original = kept?.file === undefined ? undefined : await readWorkbook(kept.file);
  const first = kept?.book ?? standard();
  const grid = openGrid(elements.grid, list, mappings, first);
  const host = gridHost(grid);

  showCellLine(grid, list);
  showHoverWords(grid, list);
  showNoteMarks(grid);
  showFaultMarks(grid);
  showFittedNumbers(grid);
  quietLists(grid.injector);
  askWhileTyping(grid.injector);
  undoButtons(grid, elements);

  const pane = paneToggle(elements.buttons['pane-toggle'], elements.pane);
  const openSettings = settingsOf(host, elements);
  grid.beforeOpen(() => {
    openSettings.stop();
    settingsStore.publish({ state: 'unread' });
    houseStore.publish({ state: 'unread' });
  });
  const start = async (): Promise<void> => {
    await openSettings.start();
    pane.use(host);
    await grid.api.getFormula().onCalculationResultApplied(LONGEST_CALCULATION_MS);
    autoHeights(grid);
  };
  const begin = () => {
    start().catch((error: unknown) => notice(elements.notice, `The workbook is not yet calculated: ${wordsOf(error)}`));
  };
  grid.onOpened(begin);
  const name = kept?.name ?? 'Standard workbook.xlsx';
  openWorkbook({ grid, elements, keeper, standard, name, changed: kept?.changed ?? false, original });
  begin();

  elements.loading.hidden = true;
  for (const id of ['new', 'open', 'save', 'pane-toggle'] as const) elements.buttons[id].disabled = false;
  return { grid, host };
}

/** The browser's store; where there is none the page works on and says so. */
async function keeperOf(elements: PageElements): Promise<Keeper | undefined> {
  try {
    return await startKeeper();
  } catch (error) {
    notice(elements.notice, `This browser keeps nothing for this page (${wordsOf(error)}): save before you leave.`);
    return undefined;
  }
}

function undoButtons(grid: Grid, { buttons }: PageElements): void {
  buttons.undo.addEventListener('click', () => void grid.api.undo());
  buttons.redo.addEventListener('click', () => void grid.api.redo());
  grid.injector.get(IUndoRedoService).undoRedoStatus$.subscribe(({ undos, redos }) => {
    buttons.undo.disabled = undos === 0;
    buttons.redo.disabled = redos === 0;
  });
}

/** Settings of the workbook that is open; those of an earlier one never reach a later one. */
function settingsOf(host: WorkbookHost, elements: PageElements) {
  let stop: (() => void) | undefined;
  let starts = 0;
  return {
    stop: () => {
      starts += 1;
      stop?.();
      stop = undefined;
    },
    start: async () => {
      starts += 1;
      const mine = starts;
      try {
        const stopThis = await startSettings(host);
        if (mine === starts) stop = stopThis;
        else stopThis();
      } catch (error) {
        notice(elements.notice, `The unit settings could not be read: ${wordsOf(error)}`);
      }
    },
  };
}
