/**
 * Everything that can be wrong with a request, as data. `words.ts` makes the sentences,
 * the edge of `functions/` maps the codes to cell errors.
 */
export type ProblemData =
  /** The argument itself is wrong: what, allowed, received. A cell shows `#VALUE!`. */
  | {
      readonly code: 'argument';
      readonly argument: string;
      readonly allowed: string;
      readonly received: string;
      /** The nearest accepted word, where the input looks like a slip of the pen. */
      readonly nearest?: string;
    }
  /** A number lies outside the published range. Values in SI. A cell shows `#N/A`. */
  | {
      readonly code: 'range';
      readonly argument: string;
      readonly quantity: 'temperature' | 'pressure';
      readonly received: number;
      readonly from: number;
      readonly to: number;
      /** What the range belongs to, as in "vaporization of water". */
      readonly subject: string;
    }
  /** No data, or no such transition. A cell shows `#N/A`. */
  | {
      readonly code: 'missing';
      readonly subject: string;
      readonly reason: string;
      /** Where, in SI: ends the sentence in the reader's unit. */
      readonly place?: { readonly quantity: 'temperature' | 'pressure'; readonly value: number };
    };

/** The one exception class of the core. Anything else that is thrown is a defect. */
export class Problem extends Error {
  readonly data: ProblemData;

  constructor(data: ProblemData) {
    super(plainWords(data));
    this.name = 'Problem';
    this.data = data;
  }
}

/** Writes a number for a message: at most six significant digits, never an exponent of +0. */
export function shortNumber(value: number): string {
  return Number(value.toPrecision(6)).toString();
}

/** How a message writes a temperature or a pressure; the default is SI. */
export interface QuantityWriter {
  readonly temperature: (kelvin: number) => string;
  readonly pressure: (pascal: number) => string;
}

const siWriter: QuantityWriter = {
  temperature: (kelvin) => `${shortNumber(kelvin)} K`,
  pressure: (pascal) => `${shortNumber(pascal)} Pa`,
};

/** One message grammar: what is wrong, what is allowed with brackets, what was received. */
export function plainWords(data: ProblemData, write: QuantityWriter = siWriter): string {
  switch (data.code) {
    case 'argument': {
      const hint = data.nearest === undefined ? '' : `; nearest: ${data.nearest}`;
      return `${data.argument}: allowed ${data.allowed}; received ${data.received}${hint}`;
    }
    case 'range': {
      const w = write[data.quantity];
      if (data.from === data.to) {
        return `${data.argument} ${w(data.received)}: ${data.subject} is known at ${w(data.from)} only`;
      }
      return `${data.argument} ${w(data.received)} is outside [${w(data.from)}, ${w(data.to)}] for ${data.subject}`;
    }
    case 'missing': {
      const { place } = data;
      return `${data.subject}: ${data.reason}${place === undefined ? '' : ` ${write[place.quantity](place.value)}`}`;
    }
  }
}
