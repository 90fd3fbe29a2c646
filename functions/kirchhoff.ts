import { readForm } from '../core/kirchhoff/form';
import { kirchhoff as carry, type KirchhoffInput } from '../core/kirchhoff/kirchhoff';
import { Problem } from '../core/problem';
import { checkedMolarMass } from '../core/units/perMole';
import type { Quantity } from '../core/units/parseQuantity';
import type { Basis, Unit } from '../core/units/unit';
import { answer } from './edge/answer';
import { ArgReader } from './edge/argReader';
import { shapeOf, type Block } from './edge/block';
import { commonShape } from './edge/broadcast';
import { CellFault, peel, shown } from './edge/cell';
import { faultOf } from './edge/cellError';
import { substanceKey } from './edge/keys';
import type { ArgSpec, BlockwiseSpec, Element, Table } from './edge/spec';
import type { Settings } from './settings/settings';

const args: readonly ArgSpec[] = [
  { name: 'latent', kind: 'heat' },
  { name: 'at', kind: 'temperature' },
  { name: 'to', kind: 'temperature' },
  { name: 'deltacp', kind: 'heatCapacity' },
  { name: 'u_latent', kind: 'heat', optional: true },
  { name: 'u_deltacp', kind: 'heatCapacity', optional: true },
  { name: 'correlation', kind: 'number', optional: true },
];

const spec: BlockwiseSpec = {
  family: 'blockwise',
  name: 'KIRCHHOFF',
  args,
  options: ['form', 'substance'],
  run: (blocks, settings) => new Carrier(blocks, settings).table(),
};

/** Coefficients of a form, and their covariance, in SI of the basis of the heat-capacity unit. */
interface Coefficients {
  readonly form: string;
  readonly values: readonly number[];
  readonly covariance: readonly (readonly number[])[] | undefined;
  readonly basis: Basis;
}

/** Reads the arguments of one call and carries element by element. */
class Carrier {
  private readonly readers: readonly ArgReader[];
  private readonly coefficients: Coefficients | undefined;
  private readonly uncertain: boolean;

  constructor(
    private readonly blocks: readonly (Block | undefined)[],
    private readonly settings: Settings,
  ) {
    this.readers = args.map((arg, i) => new ArgReader(arg, blocks[i], settings));
    this.coefficients = this.readCoefficients();
    this.uncertain = blocks.slice(4).some((block) => block !== undefined);
  }

  table(): Table {
    const shared = this.coefficients === undefined ? this.blocks : this.blocks.filter((_, i) => i !== 3 && i !== 5);
    const shape = commonShape(shared);
    if (!this.uncertain) {
      return Array.from({ length: shape.rows }, (_, r) =>
        Array.from({ length: shape.columns }, (__, c) => this.element(r, c)[0]),
      );
    }
    if (shape.rows > 1 && shape.columns > 1) {
      throw new Problem({
        code: 'argument',
        argument: 'to',
        allowed: 'one row or one column where uncertainties are given: each answer takes two cells',
        received: `a range of ${shapeOf(shape)}`,
      });
    }
    if (shape.columns === 1) {
      const rows = Array.from({ length: shape.rows }, (_, r) => this.element(r, 0));
      if (rows.length === 1 && rows[0]?.[0] instanceof CellFault) throw rows[0][0];
      return rows;
    }
    const pairs = Array.from({ length: shape.columns }, (_, c) => this.element(0, c));
    return [pairs.map((pair) => pair[0]), pairs.map((pair) => pair[1])];
  }

  private element(r: number, c: number): [Element, Element] {
    try {
      const latent = this.readers[0]?.withUnit(r, c);
      const [at, to] = [this.readers[1]?.quantity(r, c), this.readers[2]?.quantity(r, c)];
      for (const part of [latent, at, to]) {
        if (part === '') return ['', ''];
        if (part instanceof CellFault) return [part, part];
      }
      return this.carried(latent as Quantity, at as number, to as number, r, c);
    } catch (thrown) {
      const fault = faultOf(thrown, this.settings);
      return [fault, fault];
    }
  }

  private carried(latent: Quantity, atK: number, toK: number, r: number, c: number): [Element, Element] {
    const slope = this.coefficients ?? this.constantSlope(r, c);
    if (slope === '') return ['', ''];
    const scale = this.betweenBases(slope.basis, latent.unit.basis);
    const input: KirchhoffInput = {
      latent: latent.si,
      atK,
      toK,
      deltaCp: slope.values.map((value) => value * scale),
      form: slope.form,
      ...(this.uncertain ? this.uncertainties(slope, latent.unit, scale, r, c) : {}),
    };
    const result = carry(input);
    const unit = this.answerUnit(latent.unit);
    return [result.value / unit.factor, result.uncertainty === undefined ? '' : result.uncertainty / unit.factor];
  }

  private uncertainties(
    slope: Coefficients,
    latentUnit: Unit,
    scale: number,
    r: number,
    c: number,
  ): Partial<KirchhoffInput> {
    const uLatent = this.optional(4, r, c);
    const uSlope = this.coefficients === undefined ? this.optional(5, r, c) : undefined;
    const correlation = this.readers[6]?.quantity(r, c);
    const said = typeof correlation === 'number' && correlation === correlation ? { correlation } : {};
    return {
      uLatent: uLatent === undefined ? 0 : uLatent.si * this.betweenBases(uLatent.unit.basis, latentUnit.basis),
      ...said,
      ...(slope.covariance === undefined
        ? { uDeltaCp: uSlope === undefined ? 0 : uSlope.si * this.betweenBases(uSlope.unit.basis, latentUnit.basis) }
        : { covariance: slope.covariance.map((row) => row.map((value) => value * scale * scale)) }),
    };
  }

  private optional(index: number, r: number, c: number): Quantity | undefined {
    const read = this.readers[index]?.withUnit(r, c);
    if (read instanceof CellFault) throw read;
    if (read === '') {
      throw new Problem({
        code: 'argument',
        argument: args[index]?.name ?? '',
        allowed: 'a value',
        received: 'a blank cell',
      });
    }
    return read;
  }

  private constantSlope(r: number, c: number): Coefficients | '' {
    const read = this.readers[3]?.withUnit(r, c);
    if (read instanceof CellFault) throw read;
    if (read === '' || read === undefined) return '';
    return { form: 'constant', values: [read.si], covariance: undefined, basis: read.unit.basis };
  }

  /** With `form=`, the whole range `deltacp` is one set of coefficients, and `u_deltacp` their covariance block. */
  private readCoefficients(): Coefficients | undefined {
    const name = this.settings.options['form'];
    if (name === undefined) return undefined;
    const form = readForm(name);
    const unit = this.settings.units.heatCapacity;
    const factor = form.timesGasConstant ? 1 : unit.factor;
    const values = numbersOf(this.blocks[3]).flat();
    const covariance = this.blocks[5] === undefined ? undefined : numbersOf(this.blocks[5]);
    return {
      form: form.name,
      values: values.map((value) => value * factor),
      covariance: covariance?.map((row) => row.map((value) => value * factor * factor)),
      basis: form.timesGasConstant ? 'mole' : unit.basis,
    };
  }

  /** Factor from SI per one amount to SI per another; the molar mass of `substance=` stands between. */
  private betweenBases(from: Basis, to: Basis): number {
    if (from === to) return 1;
    const name = this.settings.options['substance'];
    if (name === undefined) {
      throw new Problem({
        code: 'argument',
        argument: 'deltacp',
        allowed: 'both per mass or both molar, or substance= for its molar mass',
        received: `${words(from)} against a latent heat ${words(to)}`,
      });
    }
    const molarMass = checkedMolarMass(substanceKey(name).molarMass, 'to go between mass and moles');
    return from === 'mass' ? molarMass : 1 / molarMass;
  }

  /** The workbook's unit where its basis is that of the latent heat, else the unit the latent heat came in. */
  private answerUnit(latentUnit: Unit): Unit {
    const { heat } = this.settings.units;
    return heat.basis === latentUnit.basis ? heat : latentUnit;
  }
}

function words(basis: Basis): string {
  return basis === 'mass' ? 'per mass' : 'per mole';
}

function numbersOf(block: Block | undefined): number[][] {
  return (block?.cells ?? []).map((row) =>
    row.map((raw) => {
      const cell = peel(raw);
      if (cell instanceof CellFault) throw cell;
      if (typeof cell === 'number') return cell;
      throw new Problem({
        code: 'argument',
        argument: block?.name ?? 'deltacp',
        allowed: 'numbers',
        received: shown(cell),
      });
    }),
  );
}

/**
 * A latent heat carried to another temperature by Kirchhoff's law; with uncertainties, value and standard uncertainty.
 * Latent heat and ΔCp must be of one kind: carry a coexistence latent heat with the coexistence slope.
 * @customfunction KIRCHHOFF
 * @requiresParameterAddresses
 * @param latent Latent heat in the workbook's unit, or text as "40.66 kJ/mol".
 * @param at Temperature of that latent heat.
 * @param to Temperature wanted: one, a row or a column.
 * @param deltacp ΔCp of the same kind in the workbook's heat-capacity unit; with form= the range of its coefficients, T in kelvin.
 * @param [u_latent] Standard uncertainty of the latent heat.
 * @param [u_deltacp] Standard uncertainty of ΔCp; with form= the covariance block of the coefficients.
 * @param [correlation] Correlation of the two, within [-1, 1].
 * @param [settings] Latentry_units, or text as "form=a+bT+c/T^2" or "substance=water".
 * @param invocation The call itself.
 * @returns Latent heat in the workbook's unit; with uncertainties a second cell beside each answer (below, for a row).
 */
export function kirchhoff(
  latent: any[][],
  at: any[][],
  to: any[][],
  deltacp: any[][],
  u_latent?: any[][],
  u_deltacp?: any[][],
  correlation?: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [latent, at, to, deltacp, u_latent, u_deltacp, correlation, settings, invocation]);
}
