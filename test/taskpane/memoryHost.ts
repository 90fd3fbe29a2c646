import { formatArea, parseArea } from '../../taskpane/hosts/address';
import { checkShapes } from '../../taskpane/hosts/checkShapes';
import { HostFailure } from '../../taskpane/hosts/hostFailure';
import { occupied } from '../../taskpane/hosts/occupied';
import type { Block, Cell, Change, ChartSpec, HostError, HostEvent, Ref, WorkbookHost } from '../../taskpane/port';
import { MemoryWorkbook, type Evaluate, type MemorySheet } from './memoryWorkbook';

export interface MemoryHostOptions {
  readonly evaluate?: Evaluate;
  readonly decimal?: string;
  readonly mostCells?: number;
}

interface UndoStep {
  readonly label: string;
  readonly sheets: Map<string, MemorySheet>;
  readonly names: MemoryWorkbook['names'];
}

/** The port over a workbook in memory, with what a person does beside it. */
export class MemoryHost implements WorkbookHost {
  readonly can = { chart: true, undoGroup: true, startup: true, file: false };
  readonly locale: { readonly decimal: string; readonly list: string };
  readonly book: MemoryWorkbook;
  readonly undoLog: UndoStep[] = [];
  readonly charts: { readonly spec: ChartSpec; readonly at: Ref }[] = [];
  readonly recalculated: Ref[] = [];
  /** How often cells were read: one crossing each. */
  crossings = 0;
  private startsWithFile = false;
  private readonly mostCells: number;

  constructor(options: MemoryHostOptions = {}) {
    this.book = new MemoryWorkbook(options.evaluate);
    const decimal = options.decimal ?? '.';
    this.locale = { decimal, list: decimal === ',' ? ';' : ',' };
    this.mostCells = options.mostCells ?? 500_000;
  }

  selection(): Promise<Ref | null> {
    return Promise.resolve(this.book.selected);
  }

  read(refs: readonly Ref[]): Promise<Block[]> {
    this.crossings += 1;
    return settle(() => refs.map((ref) => this.block(ref)));
  }

  names(prefix: string): Promise<Map<string, Ref | 'broken'>> {
    const found = new Map<string, Ref | 'broken'>();
    for (const [lower, { name, ref }] of this.book.names) {
      if (!lower.startsWith(prefix.toLowerCase())) continue;
      found.set(name, ref === 'broken' || this.book.sheet(ref.sheet) === undefined ? 'broken' : ref);
    }
    return Promise.resolve(found);
  }

  async *scan(formula: RegExp, signal: AbortSignal): AsyncIterable<Block> {
    for (const { name } of [...this.book.sheets.values()]) {
      await Promise.resolve();
      if (signal.aborted) return;
      const used = this.book.used(name);
      if (used === null) continue;
      const block = this.block({ sheet: name, address: formatArea(used) });
      if (block.formulas.flat().some((text) => text !== '' && matches(formula, text))) yield block;
    }
  }

  check(changes: readonly Change[]): Promise<HostError[]> {
    return settle(() => {
      const errors = this.obstacles(changes);
      for (const change of changes) {
        if (change.kind !== 'cells' || this.book.sheet(change.ref.sheet) === undefined) continue;
        const hit = parseArea(change.ref.address) === null ? null : occupied(change, this.block(change.ref));
        if (hit !== null) errors.push(hit);
      }
      return errors;
    });
  }

  apply(changes: readonly Change[], label: string): Promise<void> {
    return settle(() => {
      const errors = this.obstacles(changes);
      if (errors.length > 0) throw new HostFailure(errors);
      this.undoLog.push({ label, sheets: structuredClone(this.book.sheets), names: new Map(this.book.names) });
      for (const change of changes) this.applyOne(change);
      this.book.calculate();
      for (const change of changes) {
        if (change.kind === 'cells') this.book.emit('change', { ref: change.ref, remote: false, own: true });
      }
    });
  }

  recalculate(refs: readonly Ref[]): Promise<void> {
    return settle(() => {
      this.recalculated.push(...refs);
      this.book.calculate(refs);
    });
  }

  reveal(ref: Ref): Promise<void> {
    return settle(() => {
      this.select(ref);
    });
  }

  chart(spec: ChartSpec, at: Ref): Promise<void> {
    this.charts.push({ spec, at });
    return Promise.resolve();
  }

  state(key: string, value?: string): Promise<string | null> {
    if (value !== undefined) this.book.state.set(key, value);
    return Promise.resolve(this.book.state.get(key) ?? null);
  }

  startup(on?: boolean): Promise<boolean> {
    if (on !== undefined) this.startsWithFile = on;
    return Promise.resolve(this.startsWithFile);
  }

  on(event: 'select' | 'change' | 'calculated' | 'activated', listener: (event: HostEvent) => void): () => void {
    return this.book.on(event, listener);
  }

  /** A person selects cells. */
  select(ref: Ref): void {
    const sheet = this.book.sheet(ref.sheet);
    const area = parseArea(ref.address);
    if (sheet === undefined) throw failure('no such sheet', ref, `no sheet named "${ref.sheet}"`);
    if (area === null) throw failure('bad reference', ref, `address: allowed A1 style; received "${ref.address}"`);
    this.book.selected = { sheet: sheet.name, address: formatArea(area) };
    this.book.emit('select', { ref: this.book.selected, remote: false, own: false });
  }

  /** A person, here or in another session, types cells; text that starts with `=` is a formula. */
  type(ref: Ref, cells: readonly (readonly Cell[])[], remote = false): void {
    const { top, left } = this.book.area(ref);
    for (const [r, row] of cells.entries()) {
      for (const [c, cell] of row.entries()) {
        const isFormula = typeof cell === 'string' && cell.startsWith('=');
        this.book.write(ref.sheet, top + r, left + c, isFormula ? { formula: cell } : cell);
      }
    }
    this.book.calculate();
    this.book.emit('change', { ref, remote, own: false });
  }

  /** A person takes the last step back. */
  undo(): string | null {
    const step = this.undoLog.pop();
    if (step === undefined) return null;
    this.book.sheets = step.sheets;
    this.book.names = step.names;
    this.book.calculate();
    return step.label;
  }

  private obstacles(changes: readonly Change[]): HostError[] {
    const sheets = [...this.book.sheets.values()].map((sheet) => sheet.name);
    const errors = checkShapes(changes, sheets, this.mostCells);
    for (const change of changes) {
      if ((change.kind !== 'cells' && change.kind !== 'note') || !this.book.sheet(change.ref.sheet)?.protected)
        continue;
      errors.push({ reason: 'protected', ref: change.ref, text: `sheet "${change.ref.sheet}" is protected` });
    }
    return errors;
  }

  private applyOne(change: Change): void {
    if (change.kind === 'sheet') this.book.addSheet(change.name);
    else if (change.kind === 'name') this.book.setName(change.name, change.ref);
    else if (change.kind === 'note') this.applyNote(change.ref, change.text);
    else this.applyCells(change);
  }

  private applyNote(ref: Ref, text: string): void {
    const notes = this.book.addSheet(ref.sheet).notes;
    if (text === '') notes.delete(ref.address);
    else notes.set(ref.address, text);
  }

  private applyCells(change: Extract<Change, { kind: 'cells' }>): void {
    const { top, left, rows, columns } = this.book.area(change.ref);
    for (let r = 0; r < rows; r += 1) {
      for (let c = 0; c < columns; c += 1) {
        const formula = change.formulas?.[r]?.[c] ?? '';
        const content = formula === '' ? change.values?.[r]?.[c] : { formula };
        this.book.write(change.ref.sheet, top + r, left + c, content);
        if (change.format === undefined) continue;
        const cells = this.book.addSheet(change.ref.sheet).cells;
        const place = `${String(top + r)},${String(left + c)}`;
        cells.set(place, { ...(cells.get(place) ?? { value: null, formula: '' }), format: change.format });
      }
    }
  }

  private block(ref: Ref): Block {
    const sheet = this.book.sheet(ref.sheet);
    const area = parseArea(ref.address);
    if (sheet === undefined) throw failure('no such sheet', ref, `no sheet named "${ref.sheet}"`);
    if (area === null) throw failure('bad reference', ref, `address: allowed A1 style; received "${ref.address}"`);
    const there = { sheet: sheet.name, address: formatArea(area) };
    return { ref: there, values: this.book.values(there), formulas: this.book.formulas(there) };
  }
}

/** A fresh host over an empty workbook in memory. */
export function memoryHost(options: MemoryHostOptions = {}): MemoryHost {
  return new MemoryHost(options);
}

function failure(reason: HostError['reason'], ref: Ref, text: string): HostFailure {
  return new HostFailure([{ reason, ref, text }]);
}

function matches(formula: RegExp, text: string): boolean {
  formula.lastIndex = 0;
  return formula.test(text);
}

function settle<T>(run: () => T): Promise<T> {
  return Promise.resolve().then(run);
}
