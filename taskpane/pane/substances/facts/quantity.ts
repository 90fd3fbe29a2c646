import type { FormulaAsk } from '../../../plan/formulaText';
import type { Fact } from './fact';

/** One line of a card: what it is, what the core says, and the formula that gives the same in a cell. */
export interface Quantity {
  readonly label: string;
  readonly fact: Fact;
  readonly ask: FormulaAsk;
  /** The line in full words where its label leans on a heading: "vaporization: ΔH on the two-phase line". */
  readonly name: string;
}
