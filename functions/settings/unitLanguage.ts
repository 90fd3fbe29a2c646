import {
  create,
  createUnitDependencies,
  fractionDependencies,
  unitDependencies,
  type FactoryFunctionMap,
} from 'mathjs';
import { DEFINITIONS } from '../../core/units/definitions';

/** An exact value in SI base units with its dimensions: mass, length, time, temperature, amount. */
export interface LanguageUnit {
  /** Value of one unit, counted from the unit's own zero. */
  readonly factor: { readonly n: bigint; readonly d: bigint };
  /** SI value of the unit's own zero. */
  readonly offset: { readonly n: bigint; readonly d: bigint };
  readonly dimensions: readonly number[];
}

interface ExactFraction {
  readonly s: bigint;
  readonly n: bigint;
  readonly d: bigint;
  sub(other: ExactFraction): ExactFraction;
}

interface ParsedUnit {
  readonly dimensions: readonly number[];
  readonly value: ExactFraction;
  to(unit: string): ParsedUnit;
}

interface UnitMath {
  fraction(text: string): ExactFraction;
  unit(value: ExactFraction, text: string): ParsedUnit;
  createUnit(
    name: string,
    options: { definition: ParsedUnit; offset?: ExactFraction },
    override: { override: boolean },
  ): unknown;
  readonly Unit: { isValidAlpha: (character: string) => boolean };
}

/** The language's own order: mass, length, time, current, temperature, luminous intensity, amount, angle, bit. */
const CURRENT = 3;
const LUMINOUS = 5;

/**
 * The unit language with our units in it, reckoned in exact fractions: mathjs, built from the parts that units need.
 * Its own values of units that we define are replaced, since some of them are rounded.
 */
function buildLanguage(): UnitMath {
  const parts = { createUnitDependencies, fractionDependencies, unitDependencies } as FactoryFunctionMap;
  const math = create(parts, { number: 'Fraction' }) as unknown as UnitMath;
  const isLetter = math.Unit.isValidAlpha;
  math.Unit.isValidAlpha = (character) => character === '_' || isLetter(character);
  for (const [name, factor, unit, offset] of DEFINITIONS) {
    const definition = math.unit(math.fraction(factor), unit);
    const options = offset === undefined ? { definition } : { definition, offset: math.fraction(offset) };
    math.createUnit(name, options, { override: true });
  }
  return math;
}

let language: UnitMath | undefined;

/** Reads a unit written in the unit language, as `kW h / t`; throws the language's own error on anything else. */
export function readUnitLanguage(text: string): LanguageUnit {
  language ??= buildLanguage();
  const one = language.unit(language.fraction('1'), text);
  const [mass = 0, length = 0, time = 0, , temperature = 0, , amount = 0, ...rest] = one.dimensions;
  const foreign = [one.dimensions[CURRENT] ?? 0, one.dimensions[LUMINOUS] ?? 0, ...rest];
  if (foreign.some((power) => power !== 0)) throw new SyntaxError(`"${text}" has electric, light, angle or bit units`);
  const dimensions = [mass, length, time, temperature, amount];
  const scale = dimensions.every((power, i) => power === (i === TEMPERATURE ? 1 : 0));
  const zero = language.unit(language.fraction('0'), text);
  return { factor: signed(one.value), offset: signed(scale ? zero.to('K').value : zero.value), dimensions };
}

/** Place of the temperature in `LanguageUnit.dimensions`. */
const TEMPERATURE = 3;

function signed(value: ExactFraction): { n: bigint; d: bigint } {
  return { n: value.s * value.n, d: value.d };
}
