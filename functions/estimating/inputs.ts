import { STANDARD_ATMOSPHERE_PA } from '../../core/atmosphere';
import { refused } from '../../core/catalogue/find';
import { valueAt } from '../../core/evaluate';
import { Problem } from '../../core/problem';
import type { Phase, Substance } from '../../core/substance';
import { parseQuantity, type Quantity } from '../../core/units/parseQuantity';
import { kindExamples } from '../../core/units/kindWords';
import { perMole } from '../../core/units/perMole';
import { readHeader } from '../../core/units/readHeader';
import type { Unit } from '../../core/units/unit';
import type { Block } from '../edge/block';
import { CellFault, peel, shown, type Cell } from '../edge/cell';
import { substanceKey } from '../edge/keys';
import { unitFor } from '../edge/unitFor';
import type { Settings } from '../settings/settings';
import { labelOf, labelWords, type Label } from './labels';

const REFERENCE_K = 298.15;

/** The two-column block of names and values, read once; a `substance` row fills what is not given. */
export class Inputs {
  private readonly quantities = new Map<string, Quantity>();
  private readonly texts = new Map<string, string>();
  readonly substance: Substance | undefined;

  constructor(
    block: Block | undefined,
    private readonly settings: Settings,
  ) {
    if (block?.columns !== 2) {
      const received = block === undefined ? 'nothing' : `a range of ${block.rows} × ${block.columns}`;
      throw problem('a range of two columns: names and values', received);
    }
    for (const [r, [name, value]] of block.cells.entries()) this.read(peel(name), peel(value), r === 0);
    const named = this.texts.get('substance');
    this.substance = named === undefined ? undefined : substanceKey(named);
  }

  /** Labels that were given, for messages. */
  get received(): readonly string[] {
    return [...this.texts.keys(), ...this.quantities.keys()];
  }

  /** Names of the constituents, from their rows. */
  get constituents(): readonly string[] {
    return this.received.flatMap((label) => (label.startsWith('amount of ') ? [label.slice(10)] : []));
  }

  has(label: string): boolean {
    if (label === 'formula') return this.formula !== undefined;
    if (label === 'amount of …') return this.constituents.length > 0;
    return this.quantity(label) !== undefined;
  }

  quantity(word: string): Quantity | undefined {
    const label = labelOf(word)?.label ?? word;
    return this.quantities.get(label) ?? this.filled(label);
  }

  /** SI; for heats and heat capacities per mole. */
  si(label: string): number | undefined {
    const quantity = this.quantity(label);
    if (quantity === undefined) return undefined;
    const { kind } = quantity.unit;
    return kind === 'heat' || kind === 'heatCapacity'
      ? quantity.si * perMole(quantity.unit, this.molarMass)
      : quantity.si;
  }

  /** As `si`, for a row that is known to be there. */
  need(label: string): number {
    const si = this.si(label);
    if (si === undefined) throw problem(`a row "${label}"`, 'none');
    return si;
  }

  get formula(): string | undefined {
    return this.texts.get('formula') ?? this.substance?.formula;
  }

  /** kg/mol, from a row, a substance or the constituents; `undefined` where none of them gives it. */
  get molarMass(): number | undefined {
    return this.quantities.get('molar mass')?.si ?? this.substance?.molarMass ?? this.summedMolarMass();
  }

  private summedMolarMass(): number | undefined {
    if (this.constituents.length === 0) return undefined;
    try {
      return this.constituents.reduce(
        (sum, name) => sum + this.need(`amount of ${name}`) * substanceKey(name).molarMass,
        0,
      );
    } catch (thrown) {
      // A constituent that is known by its own row only has no molar mass.
      if (thrown instanceof Problem) return undefined;
      throw thrown;
    }
  }

  /** A substance's own constant, or its heat capacity at 298.15 K. */
  private filled(label: string): Quantity | undefined {
    const { substance } = this;
    if (substance === undefined) return undefined;
    const datum = substance.constants.find(({ item }) => item === label);
    if (datum !== undefined) return { si: datum.value, unit: siUnit(labelOf(label)) };
    const [, phase] = /^(liquid|solid) heat capacity$/.exec(label) ?? [];
    if (phase === undefined) return undefined;
    return { si: heatCapacityOf(substance, phase as Phase, REFERENCE_K), unit: siUnit(labelOf(label)) };
  }

  private read(name: Cell, value: Cell, first: boolean): void {
    for (const cell of [name, value]) if (cell instanceof CellFault) throw cell;
    if (value === null || (typeof name !== 'string' && value === 0)) return;
    if (typeof name !== 'string') throw problem('a name beside each value', shown(name));
    const { label, unit } = this.named(name) ?? {};
    if (label === undefined) {
      // Words over words: the titles of the columns.
      if (first && typeof value === 'string' && !/\d/.test(value)) return;
      throw refused('inputs', name, labelWords);
    }
    if (this.received.includes(label.label)) throw problem('each name once', `"${label.label}" twice`);
    if (label.kind === 'text') {
      if (typeof value !== 'string') throw problem('a text', shown(value), label.label);
      this.texts.set(label.label, value);
      return;
    }
    this.quantities.set(label.label, this.quantityOf(label, value, unit));
  }

  /** A label as it stands, or with a unit behind it: `boiling temperature / °C`. */
  private named(text: string): { label: Label; unit: Unit | undefined } | undefined {
    const header = readHeader(text);
    const split = header.unit === undefined && header.unread === undefined ? undefined : labelOf(header.name);
    if (split !== undefined) {
      if (header.unread !== undefined) throw header.unread;
      return { label: split, unit: header.unit };
    }
    const label = labelOf(text);
    return label === undefined ? undefined : { label, unit: undefined };
  }

  private quantityOf({ label, kind }: Label, value: Cell, own: Unit | undefined): Quantity {
    if (kind === 'text') throw problem('a text', shown(value), label);
    if (own !== undefined && own.kind !== kind) throw problem(`a unit as ${kindExamples(kind)}`, own.symbol, label);
    if (typeof value === 'string') return parseQuantity(value, kind, this.settings, label);
    if (typeof value !== 'number') throw problem('a number or a text with its unit', shown(value), label);
    const unit = own ?? (kind === 'molarMass' ? GRAM_PER_MOLE : unitFor(kind, this.settings));
    return {
      si: value * unit.factor + unit.offset + (unit.gauge ? this.settings.barometerPa : 0),
      unit,
    };
  }
}

/** Molar mass has no setting: a bare number is in g/mol, as CONSTANT gives it. */
const GRAM_PER_MOLE: Unit = { symbol: 'g/mol', kind: 'molarMass', factor: 1e-3, offset: 0, basis: null, gauge: false };

/** Heat capacity at one atmosphere, J/(mol K). */
export function heatCapacityOf(substance: Substance, phase: Phase, temperatureK: number): number {
  return valueAt(substance.heatCapacity(phase, STANDARD_ATMOSPHERE_PA), temperatureK);
}

function siUnit(label: Label | undefined): Unit {
  const kind = label === undefined || label.kind === 'text' ? 'share' : label.kind;
  return { symbol: '', kind, factor: 1, offset: 0, basis: kind === 'heatCapacity' ? 'mole' : null, gauge: false };
}

function problem(allowed: string, received: string, argument = 'inputs'): Problem {
  return new Problem({ code: 'argument', argument, allowed, received });
}
