import type { Mark } from '../answer';
import { Problem, shortNumber } from '../problem';
import type { Decimal } from '../units/parseNumber';
import { toMolar } from '../units/toMolar';
import { toSi } from '../units/toSi';
import type { Unit, UnitKind } from '../units/unit';
import { unitOf } from '../units/unitOf';
import { cellNumbers, type CellNumber } from './cellNumbers';
import { cellText, type HouseColumn, type HouseRow } from './houseRow';
import type { Evidence } from './materialData';
import { readForm, type FormWord } from './readForm';

/** What the other rows of the same substance, and the workbook, give to a row. */
export interface Beside {
  readonly decimal: Decimal;
  /** kg/mol; NaN where there is no such row. Throws the problem of a row that can't be read. */
  molarMass(): number;
  /** K; undefined where there is no such row. Throws the problem of a row that can't be read. */
  criticalK(): number | undefined;
  /** Told of what is worth a warning. */
  warn(column: HouseColumn, text: string): void;
}

/** What a form makes of the coefficients, and where it holds by itself, K. */
export interface Read<S> {
  readonly shape: S;
  readonly natural: { readonly fromK: number; readonly toK: number } | undefined;
  readonly method: string;
  readonly marks?: readonly Mark[];
}

export interface Limits {
  readonly fromK: number | undefined;
  readonly toK: number | undefined;
}

/** Gauge pressures don't belong into a row: they would change with the barometer. */
const NO_BAROMETER = 0;

/** Temperatures that unit conversion may have set apart, K. */
const ROUNDING_K = 1e-6;

/** A refusal that does not name its place yet. */
export function refusal(received: string, allowed: string): Problem {
  return new Problem({ code: 'argument', argument: '', allowed, received });
}

/** Reads the cells of one row; whatever it refuses names the row on the sheet, the property and the column. */
export class RowReader {
  constructor(
    readonly row: HouseRow,
    private readonly about: string,
    readonly beside: Beside,
  ) {}

  text(column: HouseColumn): string {
    return cellText(this.row.cells[column]);
  }

  refused(column: HouseColumn, received: string, allowed: string): Problem {
    return this.placed(column, refusal(received, allowed));
  }

  /** Runs the reading of one cell. */
  cell<T>(column: HouseColumn, read: () => T): T {
    try {
      return read();
    } catch (thrown) {
      if (thrown instanceof Problem) throw this.placed(column, thrown);
      throw thrown;
    }
  }

  private placed(column: HouseColumn, problem: Problem): Problem {
    const { data } = problem;
    if (data.code !== 'argument' || data.argument.startsWith('Substances row')) return problem;
    return new Problem({ ...data, argument: `Substances row ${this.row.number} (${this.about}), ${column}` });
  }

  /** The form cell; where it is blank, what the coefficients look like. */
  form(allowed: readonly FormWord[]): { readonly word: FormWord; readonly temperature: Unit | undefined } {
    const { word, temperature } = this.cell('form', () => readForm(this.text('form'), allowed));
    const only = allowed.length === 1 ? allowed[0] : undefined;
    const found = word ?? only ?? (this.text('coefficients').includes(':') ? 'table' : this.oneNumber());
    if (found !== undefined && allowed.includes(found)) return { word: found, temperature };
    throw this.refused('form', 'nothing', allowed.join(', '));
  }

  private oneNumber(): 'constant' | undefined {
    return this.numbers().length === 1 ? 'constant' : undefined;
  }

  /** The numbers of the coefficients cell. */
  numbers(least = 1, most = Infinity, what = ''): CellNumber[] {
    return this.cell('coefficients', () => {
      const numbers = cellNumbers(this.row.cells.coefficients, this.beside.decimal);
      if (numbers.length >= least && numbers.length <= most) return numbers;
      throw refusal(`"${this.text('coefficients')}", ${numbers.length} numbers`, what);
    });
  }

  /** The numbers of an equation, without units. */
  bareNumbers(least: number, most: number, what: string): number[] {
    return this.numbers(least, most, what).map(({ value, unit }) => {
      if (unit === '') return value;
      throw this.refused('coefficients', `"${value} ${unit}"`, 'bare numbers: their unit stands in the column "unit"');
    });
  }

  /** SI per mole and unit of the cell; per kilogram where the substance has no molar mass. */
  perAmount(kind: 'heat' | 'heatCapacity'): number {
    const text = this.text('unit');
    const unit = this.cell('unit', () => {
      if (text === '') throw refusal('nothing', kind === 'heat' ? 'a unit, as kJ/kg' : 'a unit, as kJ/(kg K)');
      return unitOf(text, kind);
    });
    const molarMass = this.beside.molarMass();
    if (unit.basis === 'mole' && Number.isNaN(molarMass)) {
      throw this.refused('unit', `"${text}"`, 'a unit of mass, as kJ/kg, or a row "molar mass" for this substance');
    }
    return toMolar(unit, molarMass).scale;
  }

  /** A number with its own unit, or in the one that holds for bare numbers; SI. */
  si({ value, unit }: CellNumber, kind: UnitKind, bare: Unit): number {
    const own = unit === '' ? bare : unitOf(unit, kind);
    if (own.gauge) throw refusal(`"${value} ${own.symbol}"`, 'an absolute pressure');
    const { scale, offset } = toSi(own, NO_BAROMETER);
    const si = value * scale + offset;
    if (kind === 'temperature' && si <= 0) throw refusal(`${value} ${own.symbol}`, 'a temperature above absolute zero');
    return si;
  }

  /** A single quantity: a number in the row's unit, or a text with its own unit; SI. */
  quantity(kind: UnitKind): number {
    const text = this.text('unit');
    const unit = text === '' ? undefined : this.cell('unit', () => unitOf(text, kind));
    const [one] = this.numbers(1, 1, 'one number');
    const number = one ?? { value: NaN, unit: '' };
    return this.cell('coefficients', () => {
      const own = number.unit === '' ? unit : unitOf(number.unit, kind);
      if (own === undefined)
        throw refusal(`${number.value} without a unit`, 'a number, with its unit in the column "unit"');
      return this.si(number, kind, own);
    });
  }

  limits(): Limits {
    const read = (column: 'valid from' | 'valid to', bare: Unit): number | undefined =>
      this.cell(column, () => {
        const cell = this.row.cells[column];
        if (cell === '') return undefined;
        const [one, more] = cellNumbers(cell, this.beside.decimal);
        if (one === undefined || more !== undefined) throw refusal(`"${cellText(cell)}"`, 'one temperature');
        return this.si(one, 'temperature', bare);
      });
    const fromK = read('valid from', this.row.fromUnit);
    const toK = read('valid to', this.row.toUnit);
    if (fromK !== undefined && toK !== undefined && fromK > toK) {
      throw this.refused('valid to', this.text('valid to'), 'a temperature of at least "valid from"');
    }
    return { fromK, toK };
  }

  /** The range that the row gives, within that of the form; where it gives none the form's own, with a warning. */
  bounded<S>({ shape, natural, method, marks = [] }: Read<S>, limits: Limits): Evidence & { readonly shape: S } {
    const fromK = limits.fromK ?? natural?.fromK;
    const toK = limits.toK ?? natural?.toK;
    if (fromK === undefined)
      throw this.refused('valid from', 'nothing', 'a temperature: this form has no end of its own');
    if (toK === undefined) throw this.refused('valid to', 'nothing', 'a temperature: this form has no end of its own');
    if (natural !== undefined) this.checkWithin(natural, fromK, toK);
    if (limits.fromK !== undefined && limits.toK !== undefined)
      return { shape, fromK, toK, ...this.evidence(method, marks) };
    const column = limits.fromK === undefined ? 'valid from' : 'valid to';
    this.beside.warn(
      column,
      `nothing given: valid as far as the form itself goes, [${shortNumber(fromK)}, ${shortNumber(toK)}] K`,
    );
    const text = `Substances row ${this.row.number} does not say where it is valid`;
    return { shape, fromK, toK, ...this.evidence(method, [...marks, { code: 'unconfirmed', text }]) };
  }

  private checkWithin(natural: { fromK: number; toK: number }, fromK: number, toK: number): void {
    const low = fromK < natural.fromK - ROUNDING_K;
    if (!low && toK <= natural.toK + ROUNDING_K) return;
    throw this.refused(
      low ? 'valid from' : 'valid to',
      `${shortNumber(low ? fromK : toK)} K`,
      `within [${shortNumber(natural.fromK)}, ${shortNumber(natural.toK)}] K, where the coefficients reach`,
    );
  }

  /** A wrong unit of temperature shows at the ends of the range. */
  checkEnds(
    { shape, fromK, toK }: { readonly shape: { at(t: number): number }; readonly fromK: number; readonly toK: number },
    fine: (value: number) => boolean,
    allowed: string,
  ): void {
    for (const t of [fromK, toK]) {
      const value = shape.at(t);
      if (Number.isFinite(value) && fine(value)) continue;
      const shown = Number.isFinite(value) ? shortNumber(value) : 'no finite value';
      throw this.refused('coefficients', `${shown} (SI) at ${shortNumber(t)} K`, allowed);
    }
  }

  evidence(method: string, marks: readonly Mark[]): Pick<Evidence, 'method' | 'sources' | 'marks'> {
    const source = this.source();
    if (this.text('source') !== '') return { method, sources: [source], marks };
    const text = `Substances row ${this.row.number} gives no source`;
    return { method, sources: [source], marks: [...marks, { code: 'unconfirmed', text }] };
  }

  /** Where the row's numbers come from, in words. */
  source(): string {
    const [source, revision] = [this.text('source'), this.text('revision')];
    const words = source === '' ? 'no source given' : source;
    return `Substances row ${this.row.number}: ${words}${revision === '' ? '' : `, revision ${revision}`}`;
  }
}
