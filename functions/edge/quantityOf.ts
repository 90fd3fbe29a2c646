import { Problem } from '../../core/problem';
import { parseQuantity, type Quantity } from '../../core/units/parseQuantity';
import type { QuantityKind } from '../../core/units/unit';
import type { Settings } from '../settings/settings';
import { scalarOf, type Block } from './block';
import { CellFault, shown } from './cell';
import { unitFor } from './unitFor';

/** One cell as a quantity: a number in the workbook's unit, or a text with its own; with the unit it came in. */
export function readQuantity(block: Block, kind: QuantityKind, settings: Settings): Quantity {
  const cell = scalarOf(block);
  if (cell instanceof CellFault) throw cell;
  const unit = unitFor(kind, settings);
  if (typeof cell === 'string') return parseQuantity(cell, kind, settings, block.name);
  if (typeof cell === 'number') {
    return { si: cell * unit.factor + unit.offset + (unit.gauge ? settings.barometerPa : 0), unit };
  }
  throw new Problem({
    code: 'argument',
    argument: block.name,
    allowed: `a number (${unit.symbol}) or a text with its unit`,
    received: cell === null ? 'a blank cell' : shown(cell),
  });
}

/** The same in SI alone. */
export function quantityOf(block: Block, kind: QuantityKind, settings: Settings): number {
  return readQuantity(block, kind, settings).si;
}
