import { formatArea, parseArea, parseReference, type Area } from '../../taskpane/hosts/address';
import type { Cell, CellFormat, HostEvent, Ref } from '../../taskpane/port';

export interface MemoryCell {
  value: Cell;
  formula: string;
  format?: CellFormat;
  /** Key of the cell whose formula spilled here. */
  spilledFrom?: string;
}

export interface MemorySheet {
  readonly name: string;
  readonly cells: Map<string, MemoryCell>;
  readonly notes: Map<string, string>;
  protected: boolean;
}

/** Gives a formula's value, a 2-D array where it spills. `cell` reads another cell. */
export type Evaluate = (formula: string, at: Ref, cell: (ref: Ref) => Cell) => Cell | readonly (readonly Cell[])[];

type EventName = 'select' | 'change' | 'calculated' | 'activated';

const key = (row: number, column: number) => `${String(row)},${String(column)}`;

/** A workbook in memory: what a person and a host both work on in the tests. */
export class MemoryWorkbook {
  sheets = new Map<string, MemorySheet>();
  names = new Map<string, { readonly name: string; readonly ref: Ref | 'broken' }>();
  readonly state = new Map<string, string>();
  selected: Ref | null = null;
  /** How often each cell's formula was evaluated, by `Sheet!A1`. */
  readonly evaluations = new Map<string, number>();
  readonly charts: { readonly title: string; readonly at: Ref }[] = [];
  private readonly listeners = new Map<EventName, Set<(event: HostEvent) => void>>();

  constructor(readonly evaluate: Evaluate = () => ({ error: '#NAME?' })) {}

  sheet(name: string): MemorySheet | undefined {
    return this.sheets.get(name.toLowerCase());
  }

  addSheet(name: string): MemorySheet {
    const present = this.sheet(name);
    if (present !== undefined) return present;
    const sheet: MemorySheet = { name, cells: new Map(), notes: new Map(), protected: false };
    this.sheets.set(name.toLowerCase(), sheet);
    return sheet;
  }

  /** Points a name at cells, or at text such as `=#REF!`, which is broken. */
  setName(name: string, target: Ref | string): void {
    const ref = typeof target === 'string' ? (parseReference(target) ?? 'broken') : target;
    this.names.set(name.toLowerCase(), { name, ref });
  }

  area(ref: Ref): Area {
    const area = parseArea(ref.address);
    if (area === null) throw new Error(`memory workbook: bad address ${ref.address}`);
    return area;
  }

  cell(sheet: string, row: number, column: number): MemoryCell {
    return this.sheet(sheet)?.cells.get(key(row, column)) ?? { value: null, formula: '' };
  }

  value(ref: Ref): Cell {
    const { top, left } = this.area(ref);
    return this.cell(ref.sheet, top, left).value;
  }

  values(ref: Ref): Cell[][] {
    return this.grid(ref, (cell) => cell.value);
  }

  formulas(ref: Ref): string[][] {
    return this.grid(ref, (cell) => cell.formula);
  }

  /** The used area of a sheet, or null when it is empty. */
  used(name: string): Area | null {
    const places = [...(this.sheet(name)?.cells.keys() ?? [])].map((place) => place.split(',').map(Number));
    if (places.length === 0) return null;
    const rows = places.map((place) => place[0] ?? 0);
    const columns = places.map((place) => place[1] ?? 0);
    const top = Math.min(...rows);
    const left = Math.min(...columns);
    return { top, left, rows: Math.max(...rows) - top + 1, columns: Math.max(...columns) - left + 1 };
  }

  /** Writes one cell without calculating; null content empties it; undefined leaves it as it is. */
  write(sheet: string, row: number, column: number, content: Cell | { readonly formula: string } | undefined): void {
    if (content === undefined) return;
    const target = this.addSheet(sheet);
    const place = key(row, column);
    const format = target.cells.get(place)?.format;
    this.clearSpill(target, place);
    const isFormula = typeof content === 'object' && content !== null && 'formula' in content;
    if (content === null && format === undefined) target.cells.delete(place);
    else {
      target.cells.set(place, {
        value: isFormula ? null : content,
        formula: isFormula ? content.formula : '',
        ...(format === undefined ? {} : { format }),
      });
    }
  }

  /** Evaluates every formula, in order of sheets, rows, columns, twice so that later cells reach earlier ones. */
  calculate(only?: readonly Ref[]): void {
    const wanted = only?.map((ref) => ({ sheet: ref.sheet.toLowerCase(), area: this.area(ref) }));
    for (const pass of [1, 2]) {
      for (const sheet of this.sheets.values()) {
        for (const [place, cell] of [...sheet.cells]) {
          if (cell.formula === '') continue;
          const [row = 0, column = 0] = place.split(',').map(Number);
          const marked =
            wanted === undefined ||
            wanted.some((w) => w.sheet === sheet.name.toLowerCase() && inside(w.area, row, column));
          if (marked) this.evaluateCell(sheet, place, cell, row, column, pass === 1);
        }
      }
    }
    this.emit('calculated', { remote: false, own: false });
  }

  on(name: EventName, listener: (event: HostEvent) => void): () => void {
    const set = this.listeners.get(name) ?? new Set();
    this.listeners.set(name, set.add(listener));
    return () => set.delete(listener);
  }

  emit(name: EventName, event: HostEvent): void {
    for (const listener of [...(this.listeners.get(name) ?? [])]) listener(event);
  }

  listenerCount(name: EventName): number {
    return this.listeners.get(name)?.size ?? 0;
  }

  private grid<T>(ref: Ref, pick: (cell: MemoryCell) => T): T[][] {
    const { top, left, rows, columns } = this.area(ref);
    return Array.from({ length: rows }, (_, r) =>
      Array.from({ length: columns }, (__, c) => pick(this.cell(ref.sheet, top + r, left + c))),
    );
  }

  private clearSpill(sheet: MemorySheet, origin: string): void {
    for (const [place, cell] of sheet.cells) if (cell.spilledFrom === origin) sheet.cells.delete(place);
  }

  private evaluateCell(
    sheet: MemorySheet,
    place: string,
    cell: MemoryCell,
    row: number,
    column: number,
    count: boolean,
  ): void {
    const address = formatArea({ top: row, left: column, rows: 1, columns: 1 });
    const id = `${sheet.name}!${address}`;
    if (count) this.evaluations.set(id, (this.evaluations.get(id) ?? 0) + 1);
    const result = this.evaluate(cell.formula, { sheet: sheet.name, address }, (ref) => this.value(ref));
    this.clearSpill(sheet, place);
    if (!isGrid(result)) {
      cell.value = result;
      return;
    }
    const places = result
      .flatMap((line, r) => line.map((value, c) => ({ place: key(row + r, column + c), value })))
      .slice(1);
    if (places.some((p) => isFilled(sheet.cells.get(p.place)))) {
      cell.value = { error: '#SPILL!' };
      return;
    }
    cell.value = result[0]?.[0] ?? null;
    for (const p of places) {
      const format = sheet.cells.get(p.place)?.format;
      const spilled = { value: p.value, formula: '', spilledFrom: place };
      sheet.cells.set(p.place, format === undefined ? spilled : { ...spilled, format });
    }
  }
}

function isGrid(result: Cell | readonly (readonly Cell[])[]): result is readonly (readonly Cell[])[] {
  return Array.isArray(result);
}

/** A cell that has nothing but a format is no obstacle to a spill. */
function isFilled(cell: MemoryCell | undefined): boolean {
  return cell !== undefined && (cell.value !== null || cell.formula !== '');
}

function inside(area: Area, row: number, column: number): boolean {
  return row >= area.top && row < area.top + area.rows && column >= area.left && column < area.left + area.columns;
}
