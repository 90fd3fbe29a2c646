import { nasa9Species } from '../nasa9/nasa9Species';
import type { Nasa9Species } from '../nasa9/nasa9Types';
import type { Cited, FluidNumbers, SolidNumbers } from './fluidNumbers';
import { gasFromPoints, withFloor } from './gasFromPoints';

/** Fields of a packed fluid, in their order. */
export const FLUID_FIELDS = [
  'name',
  'formula',
  'cas',
  'synonyms',
  'gas',
  'dimer',
  'limits',
  'terms',
  'pressure',
  'latent',
  'liquid',
  'nodes',
  'pressureSpread',
  'latentSpread',
  'heatCapacitySpread',
  'constants',
  'fusion',
  'solid',
  'disagreement',
  'latentSources',
  'pressureSources',
  'heatCapacitySources',
  'gasSources',
  'unconfirmed',
  'notes',
] as const;

type Fields = Record<(typeof FLUID_FIELDS)[number], string>;

/** How a fluid is called, without reading the rest of it. */
export function fluidNames(packed: string): Pick<FluidNumbers, 'name' | 'formula' | 'cas' | 'synonyms'> {
  const [name = '', formula = '', cas = '', synonyms = ''] = packed.split('|', 4);
  return { name, formula, cas, synonyms: listed(synonyms) };
}

/**
 * A fluid from the text that the generator writes.
 *
 * @param packed fields of `FLUID_FIELDS` between bars
 * @param sources full citations, which the fields name by their place
 */
export function unpackFluid(packed: string, sources: readonly string[]): FluidNumbers {
  const texts = packed.split('|');
  const fields = Object.fromEntries(FLUID_FIELDS.map((field, i) => [field, texts[i] ?? ''])) as Fields;
  const cite = (text: string): string[] => numbersOf(text).map((i) => sources[i] ?? '');
  const [lineFromK = NaN, vapourToK = NaN, sublimesAtK] = numbersOf(fields.limits);
  const [polar = 0, bonding = 0] = numbersOf(fields.terms);
  const constants = Object.fromEntries(
    fields.constants.split(';').map((text) => {
      const [item = '', ...rest] = text.split(',');
      return [item, cited(rest, sources)];
    }),
  );
  const value = (item: string): number => constants[item]?.value ?? NaN;
  const molarMass = value('molar mass');
  const ideal = idealOf(fields, molarMass);
  const solid = solidOf(fields.solid, sources);
  const disagreement = numbersOf(fields.disagreement);
  return {
    ...fluidNames(packed),
    molarMass,
    criticalK: value('critical temperature'),
    criticalPa: value('critical pressure'),
    acentric: value('acentric factor'),
    polar,
    bonding,
    meltingK: value('melting temperature'),
    lineFromK,
    vapourToK,
    ...(sublimesAtK === undefined ? {} : { sublimesAtK }),
    ...(ideal === undefined ? {} : { ideal }),
    ...dimerOf(fields),
    pressure: numbersOf(fields.pressure) as unknown as FluidNumbers['pressure'],
    latent: numbersOf(fields.latent) as unknown as FluidNumbers['latent'],
    liquid: numbersOf(fields.liquid),
    spread: {
      nodes: numbersOf(fields.nodes),
      pressure: numbersOf(fields.pressureSpread),
      latent: numbersOf(fields.latentSpread),
      heatCapacity: numbersOf(fields.heatCapacitySpread),
    },
    constants,
    ...(fields.fusion === '' ? {} : { fusion: cited(fields.fusion.split(','), sources) }),
    ...(solid === undefined ? {} : { solid }),
    ...(disagreement.length === 0
      ? {}
      : {
          disagreement: {
            fromK: disagreement[0] ?? NaN,
            toK: disagreement[1] ?? NaN,
            uncertainty: disagreement[2] ?? NaN,
            cubic: disagreement.slice(3),
          },
        }),
    sources: {
      latent: cite(fields.latentSources),
      pressure: cite(fields.pressureSources),
      heatCapacity: cite(fields.heatCapacitySources),
      gas: cite(fields.gasSources),
    },
    unconfirmed: new Set(listed(fields.unconfirmed)),
    notes: listed(fields.notes),
    enthalpyReference: referenceOf(fields.gas),
  };
}

function listed(text: string): string[] {
  return text === '' ? [] : text.split(';');
}

function numbersOf(text: string): number[] {
  return text === '' ? [] : text.split(',').map(Number);
}

/** `value,uncertainty,source,1 where confirmed`; the uncertainty may be empty. */
function cited(
  [value = '', uncertainty = '', source = '', confirmed]: readonly string[],
  sources: readonly string[],
): Cited {
  return {
    value: Number(value),
    ...(uncertainty === '' ? {} : { uncertainty: Number(uncertainty) }),
    source: sources[Number(source)] ?? '',
    confirmed: confirmed === '1',
  };
}

/** The species of the pairs, then `~` and the uncertainty of the heat to single molecules. */
function dimerOf({ dimer: text }: Fields): Pick<FluidNumbers, 'dimer' | 'singleMoleculesSpread'> {
  if (text === '') return {};
  const [name = '', spread] = text.split('~');
  return { dimer: nasa9Species(name), singleMoleculesSpread: Number(spread) };
}

/** A species of the nine-coefficient data, or `=` and a cubic with its range; then `~` and the floor below its data. */
function idealOf({ gas, name }: Fields, molarMass: number): Nasa9Species | undefined {
  if (gas === '') return undefined;
  const [what = '', floor] = gas.split('~');
  const [fromK = NaN, toK = NaN, ...cubic] = numbersOf(what.slice(1));
  const ideal = what.startsWith('=') ? gasFromPoints(name, molarMass, cubic, fromK, toK) : nasa9Species(what);
  return floor === undefined ? ideal : withFloor(ideal, Number(floor));
}

function referenceOf(gas: string): string {
  if (gas === '') return 'saturated liquid at its melting temperature is zero';
  return gas.startsWith('=')
    ? 'ideal gas at 298.15 K is zero'
    : 'elements in their reference states at 298.15 K and 1 bar are zero: the ideal gas has its enthalpy of formation there';
}

/** `fromK,heat capacity or crystal,source,confirmed,line confirmed`, and for a straight line `slope,atK,m³/mol` */
function solidOf(text: string, sources: readonly string[]): SolidNumbers | undefined {
  if (text === '') return undefined;
  const [fromK = '', what = '', source = '', confirmed, lineConfirmed, ...straight] = text.split(',');
  const value = Number(what);
  const [slope = 0, atK = 0, molarVolume = 0] = straight.map(Number);
  return {
    fromK: Number(fromK),
    heatCapacity: Number.isNaN(value) ? nasa9Species(what) : { value, slope, atK },
    source: sources[Number(source)] ?? '',
    confirmed: confirmed === '1',
    lineConfirmed: lineConfirmed === '1',
    molarVolume,
  };
}
