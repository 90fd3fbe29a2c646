import { Problem } from '../../core/problem';
import { parseQuantity, type Quantity } from '../../core/units/parseQuantity';
import type { QuantityKind, Unit } from '../../core/units/unit';
import type { Settings } from '../settings/settings';
import { isScalar, type Block } from './block';
import { CellFault, peel, shown, type Cell } from './cell';
import { faultOf } from './cellError';
import { scaleOf } from './lastPlan';
import type { ArgSpec, Key } from './spec';
import { unitFor } from './unitFor';

/** Reads the elements of one argument: numbers in the workbook's units or texts with their own become SI. */
export class ArgReader {
  readonly isKey: boolean;
  /** True for a range: a blank in it gives a blank; a blank single cell is refused. */
  readonly varies: boolean;
  private readonly unit: Unit | undefined;
  private readonly factor: number;
  private readonly offset: number;
  private readonly wideRows: boolean;
  private readonly wideColumns: boolean;

  constructor(
    private readonly arg: ArgSpec,
    private readonly block: Block | undefined,
    private readonly settings: Settings,
  ) {
    this.isKey = arg.kind === 'key';
    this.varies = block !== undefined && !isScalar(block);
    this.wideRows = block !== undefined && block.rows > 1;
    this.wideColumns = block !== undefined && block.columns > 1;
    this.unit =
      arg.kind === 'key' || arg.kind === 'block' || arg.kind === 'number' ? undefined : unitFor(arg.kind, settings);
    const scale = scaleOf(arg.kind, settings);
    this.factor = scale.factor;
    this.offset = scale.offset;
    if (block === undefined && arg.optional !== true) {
      throw new Problem({
        code: 'argument',
        argument: arg.name,
        allowed: 'a value: it is required',
        received: 'nothing',
      });
    }
  }

  private raw(r: number, c: number): unknown {
    return this.block?.cells[this.wideRows ? r : 0]?.[this.wideColumns ? c : 0];
  }

  blankFault(): CellFault {
    return faultOf(
      new Problem({ code: 'argument', argument: this.arg.name, allowed: 'a value', received: 'a blank cell' }),
    );
  }

  /** A key; `""` for a blank inside a range. */
  key(r: number, c: number): Key | CellFault {
    if (this.block === undefined) return undefined;
    const cell = peel(this.raw(r, c));
    if (cell === null) return this.varies ? '' : this.blankFault();
    if (typeof cell === 'boolean') return this.refused(cell);
    return cell;
  }

  /** A quantity in SI, NaN when left out, `""` for a blank inside a range. */
  quantity(r: number, c: number): number | '' | CellFault {
    if (this.block === undefined) return NaN;
    const raw = this.raw(r, c);
    if (typeof raw === 'number' && raw - raw === 0) return raw * this.factor + this.offset;
    const cell = peel(raw);
    if (cell === null) return this.varies ? '' : this.blankFault();
    if (cell instanceof CellFault) return cell;
    if (typeof cell === 'number') return cell * this.factor + this.offset;
    if (typeof cell !== 'string' || this.unit === undefined) return this.refused(cell);
    try {
      return parseQuantity(cell, this.arg.kind as QuantityKind, this.settings, this.arg.name).si;
    } catch (thrown) {
      return faultOf(thrown, this.settings);
    }
  }

  /** A quantity with the unit it came in: for quantities per amount, whose basis the unit decides. */
  withUnit(r: number, c: number): Quantity | '' | CellFault | undefined {
    if (this.block === undefined || this.unit === undefined) return undefined;
    const cell = peel(this.raw(r, c));
    if (typeof cell !== 'string') {
      const si = this.quantity(r, c);
      return typeof si === 'number' ? { si, unit: this.unit } : si;
    }
    try {
      return parseQuantity(cell, this.arg.kind as QuantityKind, this.settings, this.arg.name);
    } catch (thrown) {
      return faultOf(thrown, this.settings);
    }
  }

  private refused(cell: Cell): CellFault {
    const allowed = this.isKey
      ? 'a text'
      : this.unit === undefined
        ? 'a number'
        : `a number (${this.unit.symbol}) or a text with its unit`;
    return faultOf(new Problem({ code: 'argument', argument: this.arg.name, allowed, received: shown(cell) }));
  }
}
