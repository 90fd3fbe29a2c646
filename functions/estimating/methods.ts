import type { Answer } from '../../core/answer';
import { plainName, refused } from '../../core/catalogue/find';
import { acentricLatent } from '../../core/estimate/acentricLatent';
import type { BoilingPoint } from '../../core/estimate/boilingPoint';
import { chenLatent } from '../../core/estimate/chenLatent';
import { chickosDifference } from '../../core/estimate/chickosDifference';
import { chickosLatent } from '../../core/estimate/chickosLatent';
import { COMPOSITION_PARTS, compositionHeatCapacity } from '../../core/estimate/compositionHeatCapacity';
import { kistiakowskyLatent } from '../../core/estimate/kistiakowskyLatent';
import { koppHeatCapacity } from '../../core/estimate/koppHeatCapacity';
import { riedelLatent } from '../../core/estimate/riedelLatent';
import { troutonLatent } from '../../core/estimate/troutonLatent';
import { vetereLatent } from '../../core/estimate/vetereLatent';
import { watsonLatent } from '../../core/estimate/watsonLatent';
import type { OutOfRange } from '../../core/evaluate';
import { Problem } from '../../core/problem';
import type { Settings } from '../settings/settings';
import { constituentSum } from './constituentSum';
import type { Inputs } from './inputs';

/** One method: its words, the rows it cannot do without, and how it is computed from them. */
interface EstimateMethod {
  readonly words: readonly [name: string, ...others: string[]];
  readonly needs: readonly string[];
  run(inputs: Inputs, settings: Settings): Answer;
}

type AtBoilingPoint = (point: BoilingPoint, policy: OutOfRange, inputs: Inputs) => Answer;

function boiling(name: string, estimate: AtBoilingPoint): EstimateMethod {
  return {
    words: [name],
    needs: ['boiling temperature', 'critical temperature', 'critical pressure'],
    run: (inputs, { outOfRange }) =>
      estimate(
        {
          boilingK: inputs.need('boiling temperature'),
          criticalK: inputs.need('critical temperature'),
          criticalPressurePa: inputs.need('critical pressure'),
        },
        outOfRange,
        inputs,
      ),
  };
}

function chickos(change: 'vaporization' | 'sublimation', condensed: string): readonly EstimateMethod[] {
  return [
    {
      words: [`${change} heat capacity difference`, `chickos ${change}`],
      needs: [condensed],
      run: (inputs) => chickosDifference(change, inputs.need(condensed)),
    },
    {
      words: [`${change} by heat capacity difference`, `chickos ${change} latent heat`],
      needs: ['latent heat', 'at temperature', 'to temperature', condensed],
      run: (inputs, { outOfRange }) =>
        chickosLatent(
          {
            change,
            latent: inputs.need('latent heat'),
            atK: inputs.need('at temperature'),
            toK: inputs.need('to temperature'),
            condensedHeatCapacity: inputs.need(condensed),
          },
          outOfRange,
        ),
    },
  ];
}

function kopp(set: 'kopp' | 'hurst-harrison'): EstimateMethod {
  return { words: [set], needs: ['formula'], run: (inputs) => koppHeatCapacity(inputs.formula ?? '', set) };
}

/** Watson's ratio holds per mass and per mole alike: a molar mass is needed only to go from one to the other. */
function watson(inputs: Inputs, { units, outOfRange }: Settings): Answer {
  const given = inputs.quantity('latent heat');
  const perMass = units.heat.basis === 'mass' && given?.unit.basis === 'mass';
  const exponent = inputs.si('exponent');
  return watsonLatent(
    {
      latent: perMass ? given.si : inputs.need('latent heat'),
      atK: inputs.need('at temperature'),
      toK: inputs.need('to temperature'),
      criticalK: inputs.need('critical temperature'),
      ...(exponent === undefined ? {} : { exponent }),
    },
    outOfRange,
    perMass ? 'J/kg' : 'J/mol',
  );
}

const METHODS: readonly EstimateMethod[] = [
  {
    words: ['watson'],
    needs: ['latent heat', 'at temperature', 'to temperature', 'critical temperature'],
    run: watson,
  },
  boiling('riedel', riedelLatent),
  boiling('chen', chenLatent),
  boiling('vetere', (point, policy, inputs) => vetereLatent(point, inputs.si('association factor'), policy)),
  {
    words: ['trouton'],
    needs: ['boiling temperature'],
    run: (inputs, { outOfRange }) =>
      troutonLatent(inputs.need('boiling temperature'), inputs.si('trouton constant'), outOfRange),
  },
  {
    words: ['kistiakowsky'],
    needs: ['boiling temperature'],
    run: (inputs, { outOfRange }) => kistiakowskyLatent(inputs.need('boiling temperature'), outOfRange),
  },
  {
    words: ['acentric factor', 'pitzer'],
    needs: ['temperature', 'critical temperature', 'acentric factor'],
    run: (inputs, { outOfRange }) =>
      acentricLatent(
        inputs.need('temperature'),
        inputs.need('critical temperature'),
        inputs.need('acentric factor'),
        outOfRange,
      ),
  },
  ...chickos('vaporization', 'liquid heat capacity'),
  ...chickos('sublimation', 'solid heat capacity'),
  kopp('kopp'),
  kopp('hurst-harrison'),
  { words: ['neumann-kopp', 'neumann'], needs: ['amount of …'], run: constituentSum },
  {
    words: ['composition', 'choi-okos'],
    needs: ['temperature'],
    run: (inputs, { outOfRange }) =>
      compositionHeatCapacity(
        Object.fromEntries(COMPOSITION_PARTS.map((part) => [part, inputs.si(part) ?? 0])),
        inputs.need('temperature'),
        outOfRange,
      ),
  },
];

/** The names of the methods, for autocomplete and messages. */
export const methodNames: readonly string[] = METHODS.map(({ words: [name] }) => name);

/**
 * The estimate that a method makes from the inputs.
 *
 * @throws Problem `argument` for an unknown method (with the nearest) and for missing inputs (with all that it needs)
 */
export function estimateBy(method: string, inputs: Inputs, settings: Settings): Answer {
  const plain = plainName(method);
  const found = METHODS.find(({ words }) => words.some((word) => plainName(word) === plain));
  if (found === undefined) {
    throw refused('method', method, methodNames, [...methodNames, ...METHODS.flatMap(({ words }) => words)]);
  }
  const lacking = found.needs.filter((label) => !inputs.has(label));
  if (lacking.length > 0) {
    throw new Problem({
      code: 'argument',
      argument: `inputs of ${found.words[0]}`,
      allowed: `${found.needs.join(', ')}, or a substance that has them`,
      received: `${inputs.received.length === 0 ? 'nothing' : inputs.received.join(', ')}, without ${lacking.join(', ')}`,
    });
  }
  return found.run(inputs, settings);
}
