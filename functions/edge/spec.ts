import type { Answer } from '../../core/answer';
import type { QuantityKind } from '../../core/units/unit';
import type { Settings } from '../settings/settings';
import type { Block } from './block';
import type { CellFault } from './cell';

/** `key` arguments (names, states) choose what to compute; quantities are what it is computed from. */
export type ArgKind = 'key' | 'number' | 'block' | QuantityKind;

export interface ArgSpec {
  /** As messages name it: `temperature`. */
  readonly name: string;
  readonly kind: ArgKind;
  readonly optional?: boolean;
}

/** A key as it arrives: a text, a number (a bare temperature as a state), or absent. */
export type Key = string | number | undefined;

/** A number in the workbook's units, or a text; quantities that were left out arrive as NaN. */
export type Compute = (a: number, b: number, c: number, d: number) => number | string;

/** What a function does once its keys and settings are known; quantities are in SI. */
export interface Plan {
  readonly compute: Compute;
  /** The same answer with its evidence, value in SI; absent for plain texts and conversions. */
  readonly record?: (a: number, b: number, c: number, d: number) => Answer;
  /** Turns an SI value of the record into the workbook's unit. */
  readonly toCell?: (si: number) => number;
  /** What `answer=range` says of a value that belongs to no range. */
  readonly rangeWords?: string;
  /** Turns an SI standard uncertainty into the workbook's unit. */
  readonly toCellDifference?: (si: number) => number;
}

/** Scalars broadcast against ranges; every element is computed by itself. */
export interface CellwiseSpec {
  readonly family: 'cellwise';
  readonly name: string;
  readonly args: readonly ArgSpec[];
  /** Option keys this function knows, beyond the unit settings and `answer`. */
  readonly options: readonly string[];
  plan(keys: readonly Key[], settings: Settings): Plan;
}

/** One cell of an answer; a blank is `""`. */
export type Element = number | string | CellFault;

/** What a block-wise function gives back. */
export type Table = Element[][];

/** Arguments are taken as whole blocks; the result is a table. */
export interface BlockwiseSpec {
  readonly family: 'blockwise';
  readonly name: string;
  readonly args: readonly ArgSpec[];
  readonly options: readonly string[];
  run(blocks: readonly (Block | undefined)[], settings: Settings): Table;
}

export type Spec = CellwiseSpec | BlockwiseSpec;
