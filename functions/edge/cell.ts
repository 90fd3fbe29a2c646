/**
 * What a raw argument element is, once the host's ways of handing it over are peeled off.
 * Numbers, texts and truth values come as they are; a blank as `null`; an error as a `CellFault`.
 */
export class CellFault {
  constructor(
    readonly code: string,
    readonly message: string = '',
  ) {}
}

export type Cell = number | string | boolean | null | CellFault;

interface RichValue {
  readonly type?: unknown;
  readonly basicType?: unknown;
  readonly basicValue?: unknown;
  readonly code?: unknown;
  readonly error?: unknown;
  readonly message?: unknown;
}

/** Peels one element: rich values give their basic value, entities and arrays are refused as faults. */
export function peel(raw: unknown): Cell {
  switch (typeof raw) {
    case 'number':
      return Number.isFinite(raw) ? raw : new CellFault('#NUM!', 'the argument is not a finite number');
    case 'string':
      return raw === '' ? null : raw;
    case 'boolean':
      return raw;
    case 'object':
      return raw === null ? null : peelObject(raw);
    default:
      return null;
  }
}

function peelObject(rich: RichValue): Cell {
  for (const code of [rich.code, rich.error]) {
    if (typeof code === 'string' && code.startsWith('#')) {
      return new CellFault(code, typeof rich.message === 'string' ? rich.message : '');
    }
  }
  if (rich.type === 'Error' && typeof rich.basicValue === 'string') return new CellFault(rich.basicValue);
  if (rich.basicType === 'Error' || rich.basicValue === undefined || typeof rich.basicValue === 'object') {
    const kind = typeof rich.type === 'string' ? rich.type : 'object';
    return new CellFault('#VALUE!', `a data-type cell (${kind}) is not a number or a text; point at one of its fields`);
  }
  return peel(rich.basicValue);
}

/** A cell as a message shows it. */
export function shown(cell: Cell): string {
  if (cell === null) return 'a blank';
  if (cell instanceof CellFault) return cell.code;
  return typeof cell === 'string' ? `"${cell.length > 60 ? `${cell.slice(0, 57)}…` : cell}"` : String(cell);
}
