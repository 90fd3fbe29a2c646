import { formatArea } from '../../taskpane/hosts/address';
import { HostFailure } from '../../taskpane/hosts/hostFailure';
import { occupied } from '../../taskpane/hosts/occupied';
import type { Block, Change, HostError, WorkbookHost } from '../../taskpane/port';
import type { Grid } from './grid/openGrid';
import { gridCells } from './grid/gridCells';
import { rangeOfArea } from './grid/rangeOf';
import { applyChanges } from './host/applyChanges';
import { drawnCharts } from './host/drawnCharts';
import { gridEvents } from './host/gridEvents';
import { obstacles } from './host/obstacles';
import { placeOf } from './host/place';
import { readBlock } from './host/readBlock';
import { selectedRef } from './host/selectedRef';
import { workbookNames } from './host/workbookNames';

/** The longest that a calculation is waited for. */
const CALCULATION_MS = 60_000;

/** The port over the workbook that is open in the grid. */
export function gridHost(grid: Grid): WorkbookHost {
  let own = false;
  const calculated = () => grid.api.getFormula().onCalculationResultApplied(CALCULATION_MS);
  const endEditing = async () => {
    if (grid.workbook().isCellEditing()) await grid.workbook().endEditingAsync(true);
  };
  const charts = drawnCharts(grid);
  return {
    can: { chart: true, undoGroup: true, startup: false, file: true },
    locale: { decimal: '.', list: ',' },
    selection: () => settle(() => selectedRef(grid)),
    read: (refs) => settle(() => refs.map((ref) => readBlock(grid, placeOf(grid, ref)))),
    names: (prefix) => settle(() => workbookNames(grid, prefix)),
    scan: (formula, signal) => scan(grid, formula, signal),
    check: (changes) => settle(() => [...obstacles(grid, changes), ...hits(grid, changes)]),
    apply: async (changes) => {
      await endEditing();
      const errors = obstacles(grid, changes);
      if (errors.length > 0) throw new HostFailure(errors);
      own = true;
      try {
        applyChanges(grid, changes);
      } finally {
        own = false;
      }
      await calculated();
    },
    recalculate: async (refs) => {
      const places = refs.map((ref) => placeOf(grid, ref));
      if (places.length === 0) return;
      grid.markDirty(places.map(({ sheet, area }) => ({ sheetId: sheet.getSheetId(), ...area })));
      await calculated();
    },
    reveal: async (ref) => {
      const { sheet, area } = placeOf(grid, ref);
      await endEditing();
      sheet.activate();
      sheet.getRange(rangeOfArea(area)).activate();
      sheet.scrollToCell(Math.max(0, area.top - 2), Math.max(0, area.left - 1));
    },
    chart: (spec, at) => settle(() => charts.add(spec, placeOf(grid, at).ref)),
    state: (key, value) =>
      settle(() => {
        const name = `latentry.${key}`;
        if (value !== undefined) grid.setText(name, value);
        return grid.text(name) ?? null;
      }),
    startup: () => Promise.resolve(false),
    on: gridEvents(grid, () => own),
  };
}

async function* scan(grid: Grid, formula: RegExp, signal: AbortSignal): AsyncIterable<Block> {
  for (const sheet of grid.workbook().getSheets()) {
    await Promise.resolve();
    if (signal.aborted) return;
    const last = gridCells(grid.injector, sheet.getSheet()).last();
    if (last.row < 0) continue;
    const address = formatArea({ top: 0, left: 0, rows: last.row + 1, columns: last.column + 1 });
    const block = readBlock(grid, placeOf(grid, { sheet: sheet.getSheetName(), address }));
    const found = block.formulas.some((row) => row.some((text) => text !== '' && matches(formula, text)));
    if (found) yield block;
  }
}

function matches(formula: RegExp, text: string): boolean {
  formula.lastIndex = 0;
  return formula.test(text);
}

/** What the changes would write over. */
function hits(grid: Grid, changes: readonly Change[]): HostError[] {
  return changes.flatMap((change) => {
    if (change.kind !== 'cells' || grid.sheet(change.ref.sheet) === undefined) return [];
    try {
      return occupied(change, readBlock(grid, placeOf(grid, change.ref))) ?? [];
    } catch (error) {
      // A bad address is told by `obstacles`.
      if (error instanceof HostFailure) return [];
      throw error;
    }
  });
}

function settle<T>(run: () => T): Promise<T> {
  return new Promise((resolve) => resolve(run()));
}
