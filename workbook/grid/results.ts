import {
  ArrayValueObject,
  type BaseValueObject,
  BooleanValueObject,
  ErrorType,
  ErrorValueObject,
  NumberValueObject,
  StringValueObject,
} from '@univerjs/engine-formula';

/** An error that a call put into a cell, as an offset from the cell that holds the formula. */
export interface CallFault {
  readonly row: number;
  readonly column: number;
  readonly code: string;
  readonly message: string;
}

/** What a function gave back, as the grid's value objects; errors with words are added to `faults`. */
export function valueObject(result: unknown, faults: CallFault[]): BaseValueObject {
  if (!Array.isArray(result)) return element(result, 0, 0, faults);
  const rows = result.map((row: unknown) => (Array.isArray(row) ? (row as unknown[]) : [row]));
  const columns = rows.reduce((most, row) => Math.max(most, row.length), 0);
  if (rows.length === 0 || columns === 0) return StringValueObject.create('');
  if (rows.length === 1 && columns === 1) return element(rows[0]?.[0], 0, 0, faults);
  const values = rows.map((row, r) => {
    const cells = new Array<BaseValueObject>(columns);
    for (let c = 0; c < columns; c++) cells[c] = element(row[c], r, c, faults);
    return cells;
  });
  return ArrayValueObject.create({
    calculateValueList: values,
    rowCount: rows.length,
    columnCount: columns,
    unitId: '',
    sheetId: '',
    row: -1,
    column: -1,
  });
}

/** The error value for anything that was thrown; what is no error of ours is a defect and says so. */
export function faultObject(thrown: unknown, faults: CallFault[]): BaseValueObject {
  const known = errorCode(thrown);
  if (known !== undefined) return fault(known, messageOf(thrown), 0, 0, faults);
  return fault(ErrorType.VALUE, `internal error: ${messageOf(thrown) || String(thrown)}`, 0, 0, faults);
}

function element(value: unknown, row: number, column: number, faults: CallFault[]): BaseValueObject {
  switch (typeof value) {
    case 'number':
      if (Number.isFinite(value)) return NumberValueObject.create(value);
      return fault(ErrorType.VALUE, 'the function gave no finite number', row, column, faults);
    case 'string':
      return StringValueObject.create(value);
    case 'boolean':
      return BooleanValueObject.create(value);
    default: {
      if (value === null || value === undefined) return StringValueObject.create('');
      const code = errorCode(value);
      if (code !== undefined) return fault(code, messageOf(value), row, column, faults);
      return fault(ErrorType.VALUE, `the function gave a ${typeof value} where a value belongs`, row, column, faults);
    }
  }
}

function fault(code: ErrorType, message: string, row: number, column: number, faults: CallFault[]): BaseValueObject {
  if (message !== '') faults.push({ row, column, code, message });
  return ErrorValueObject.create(code);
}

const gridCodes: ReadonlyMap<string, ErrorType> = new Map(Object.values(ErrorType).map((code) => [code, code]));

function errorCode(value: unknown): ErrorType | undefined {
  if (typeof value !== 'object' || value === null || !('code' in value)) return undefined;
  if (typeof value.code !== 'string' || !value.code.startsWith('#')) return undefined;
  return gridCodes.get(value.code) ?? ErrorType.VALUE;
}

function messageOf(value: unknown): string {
  return typeof value === 'object' && value !== null && 'message' in value && typeof value.message === 'string'
    ? value.message
    : '';
}
