import { STANDARD_ATMOSPHERE_PA } from '../atmosphere';
import type { Datum } from '../answer';
import { Problem, shortNumber } from '../problem';
import type { Decimal } from '../units/parseNumber';
import { parseQuantity } from '../units/parseQuantity';
import type { PropertyRow } from './gatherRows';
import type { HouseFault } from './house';
import type { NamedRows } from './houseNames';
import { propertyWords, readProperty, type ConstantItem } from './houseProperty';
import {
  heatKey,
  type Given,
  type HeatCapacityData,
  type HeatData,
  type MaterialData,
  type PressureData,
  type TransitionData,
} from './materialData';
import { readComposedCapacity, readHeatCapacity } from './readHeatCapacity';
import { readHeat } from './readHeat';
import { readPressure } from './readPressure';
import { refusal, RowReader, type Beside } from './rowReader';

/** A boiling temperature and a vapour pressure that are printed for one material agree within this, K. */
const AGREEMENT_K = 1;

/** Everything that the rows of one substance say; rows that can't be read are faults and stand in for their property. */
export function readMaterial(names: NamedRows, decimal: Decimal, faults: HouseFault[]): MaterialData {
  return new MaterialReader(names, decimal, faults).read();
}

class MaterialReader {
  private readonly name: string;
  private readonly constants = new Map<ConstantItem, Given<Datum>>();
  private readonly points = new Map<string, Given<Datum>>();
  private readonly transitions = new Map<string, Given<TransitionData>>();
  private readonly heats = new Map<string, Given<HeatData>>();
  private readonly heatCapacities = new Map<string, Given<HeatCapacityData>>();
  private readonly pressures = new Map<'solid' | 'liquid', Given<PressureData>>();
  private readonly notes: string[] = [];

  constructor(
    private readonly names: NamedRows,
    private readonly decimal: Decimal,
    private readonly faults: HouseFault[],
  ) {
    this.name = names.gathered.name;
  }

  read(): MaterialData {
    const { rows } = this.names.gathered;
    // What other rows rest on comes first.
    const order = (row: PropertyRow): number =>
      row.property.is === 'constant' ? 0 : row.property.is === 'transition' ? 1 : 2;
    for (const row of [...rows].sort((a, b) => order(a) - order(b))) this.readRow(row);
    this.boilingOfPressure();
    const molar = this.constants.get('molar mass');
    const molarMass = molar === undefined || molar instanceof Problem ? NaN : molar.value;
    if (Number.isNaN(molarMass)) this.notes.unshift('no molar mass: answers per mass only');
    return {
      name: this.name,
      ...this.names.said,
      group: 'house',
      molarMass,
      notes: this.notes,
      constants: [...this.constants.values(), ...this.points.values()].filter(
        (given): given is Datum => !(given instanceof Problem),
      ),
      solidChanges: this.solidChanges(),
      heats: this.heats,
      transitions: this.transitions,
      heatCapacities: this.heatCapacities,
      pressures: this.pressures,
      lack: (piece) => this.lack(piece),
    };
  }

  /** Where the vapour pressure is one atmosphere the material boils; a boiling temperature beside it has to agree. */
  private boilingOfPressure(): void {
    const line = this.pressures.get('liquid');
    const row = this.transitions.get('vaporization');
    if (line === undefined || line instanceof Problem || row instanceof Problem) return;
    const pressurePa = row?.pressurePa ?? STANDARD_ATMOSPHERE_PA;
    if (!(pressurePa >= line.shape.at(line.fromK) && pressurePa <= line.shape.at(line.toK))) return;
    const temperatureK = line.shape.inverse(pressurePa);
    if (row === undefined) {
      this.transitions.set('vaporization', { temperatureK, pressurePa });
      return;
    }
    if (Math.abs(temperatureK - row.temperatureK) <= AGREEMENT_K) return;
    const said = this.names.gathered.rows.find(
      ({ property }) => property.is === 'transition' && property.change === 'vaporization',
    );
    const text = `the vapour pressure given says ${shortNumber(temperatureK)} K at this pressure; paths follow it`;
    if (said !== undefined) this.beside(said.row.number, said.about).warn('coefficients', text);
  }

  /** Solid-solid changes by temperature, those without one last. */
  private solidChanges(): string[] {
    const changes = new Set<string>();
    for (const { property } of this.names.gathered.rows) {
      const solid = property.is === 'heat' || property.is === 'transition' ? property.change : '';
      if (solid.includes('-')) changes.add(solid);
    }
    const at = (change: string): number => {
      const given = this.transitions.get(change);
      return given === undefined || given instanceof Problem ? Infinity : given.temperatureK;
    };
    return [...changes].sort((a, b) => (at(a) === at(b) ? 0 : at(a) - at(b)));
  }

  private readRow({ row, property, about }: PropertyRow): void {
    const reader = new RowReader(row, about, this.beside(row.number, about));
    switch (property.is) {
      case 'constant':
        this.put(this.constants, property.item, reader, () => constantOf(property.item, reader));
        return;
      case 'transition':
        this.put(this.transitions, property.change, reader, () =>
          this.transition(property.change, property.at, reader),
        );
        return;
      case 'heat':
        this.put(this.heats, heatKey(property.change, property.kind), reader, () => readHeat(reader));
        return;
      case 'heat capacity':
        this.put(this.heatCapacities, property.form ?? property.phase, reader, () => readHeatCapacity(reader));
        return;
      case 'pressure':
        this.put(this.pressures, property.over, reader, () => readPressure(reader));
        return;
      case 'composition':
        this.composed(property.phase, reader);
        return;
      default:
        return;
    }
  }

  /** A material with ice in it is a solid, any other a liquid, unless the row says. */
  private composed(phase: 'solid' | 'liquid' | undefined, reader: RowReader): void {
    try {
      const { fractions, ...piece } = readComposedCapacity(reader);
      const frozen = (fractions.ice ?? 0) > 0;
      const found = phase ?? (frozen ? 'solid' : 'liquid');
      if (frozen)
        this.notes.push(
          'the share of ice is that of the composition at every temperature: its melting is not counted in',
        );
      this.put(this.heatCapacities, found, reader, () => piece);
    } catch (thrown) {
      this.put(this.heatCapacities, phase ?? 'liquid', reader, () => {
        throw thrown;
      });
    }
  }

  private transition(change: string, at: string | undefined, reader: RowReader): TransitionData {
    const temperatureK = reader.quantity('temperature');
    const pressurePa =
      at === undefined ? STANDARD_ATMOSPHERE_PA : reader.cell('property', () => pressureInWords(at, this.decimal));
    const item = propertyWords({ is: 'transition', change, at });
    this.points.set(item, datum(item, temperatureK, 'K', reader));
    return { temperatureK, pressurePa };
  }

  /** Keeps what a row gives, or the problem of the row; a second row for the same takes both out of use. */
  private put<K, T>(into: Map<K, Given<T>>, key: K, reader: RowReader, read: () => T): void {
    let given: Given<T>;
    try {
      given = read();
      if (into.has(key)) throw reader.refused('property', 'a second row', 'one row for each property');
    } catch (thrown) {
      if (!(thrown instanceof Problem)) throw thrown;
      given = thrown;
      const column = COLUMN.exec(thrown.data.code === 'argument' ? thrown.data.argument : '')?.[1] ?? 'property';
      this.fault(reader.row.number, column, 'error', thrown.message);
    }
    into.set(key, given);
  }

  private fault(row: number, column: string, severity: HouseFault['severity'], message: string): void {
    const own = this.faults.some((fault) => fault.row === row && fault.message === message);
    if (!own) {
      this.faults.push({ row, column: column as HouseFault['column'], substance: this.name, severity, message });
    }
  }

  private beside(row: number, about: string): Beside {
    const valueOf = (item: ConstantItem): number | undefined => {
      const given = this.constants.get(item);
      if (given instanceof Problem) throw given;
      return given?.value;
    };
    return {
      decimal: this.decimal,
      molarMass: () => valueOf('molar mass') ?? NaN,
      criticalK: () => valueOf('critical temperature'),
      warn: (column, text) => {
        this.fault(row, column, 'warning', `Substances row ${row} (${about}), ${column}: ${text}`);
      },
    };
  }

  /** What to add to the sheet; names rows that could not be read, since one of them may be it. */
  private lack(piece: string): string {
    const { unread } = this.names.gathered;
    const property = readProperty(piece.replace(/,$/, ''));
    const hint = unread.length === 0 ? '' : `; not read: row ${unread.join(', row ')}`;
    if (property !== undefined) {
      return `add a row "${propertyWords(property)}" for ${this.name} to the Substances sheet${hint}`;
    }
    const slope = piece.startsWith('temperature slope') ? '; give the heat as a polynomial, table or equation' : '';
    return `the rows of the Substances sheet do not say${slope}${hint}`;
  }
}

const COLUMN = /, ([^,]+)$/;

const UNITS = {
  'molar mass': ['molarMass', 'kg/mol'],
  'triple temperature': ['temperature', 'K'],
  'triple pressure': ['pressure', 'Pa'],
  'critical temperature': ['temperature', 'K'],
  'critical pressure': ['pressure', 'Pa'],
} as const;

function constantOf(item: ConstantItem, reader: RowReader): Datum {
  if (item === 'acentric factor') {
    const [value = NaN] = reader.bareNumbers(1, 1, 'one number');
    return datum(item, value, '1', reader);
  }
  const [kind, unit] = UNITS[item];
  const value = reader.quantity(kind);
  if (!(value > 0)) throw reader.refused('coefficients', reader.text('coefficients'), `a ${item} above 0`);
  return datum(item, value, unit, reader);
}

function datum(item: string, value: number, unit: string, reader: RowReader): Datum {
  return { item, value, unit, source: reader.source(), confirmed: reader.text('source') !== '' };
}

/** A pressure that a property's own words give: "boiling temperature at 10 kPa". */
function pressureInWords(text: string, decimal: Decimal): number {
  const { si, unit } = parseQuantity(text, 'pressure', { decimal, barometerPa: 0 });
  if (unit.gauge || !(si > 0)) throw refusal(`"${text}"`, 'an absolute pressure above 0');
  return si;
}
