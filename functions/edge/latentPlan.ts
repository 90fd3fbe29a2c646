import { Problem } from '../../core/problem';
import { fromMolar } from '../../core/units/fromMolar';
import type { Settings } from '../settings/settings';
import { curvePlan } from './curvePlan';
import type { Change, Curve, Substance } from '../../core/substance';
import { changeKey, kindOption, onSaturation, pressureOption, substanceKey } from './keys';
import { signed } from './scale';
import type { CellwiseSpec, Key, Plan } from './spec';

/** What LATENT and DELTACP are: one curve each, asked for in the same way. */
export function latentSpec(name: string, quantity: 'latent' | 'latentSlope'): CellwiseSpec {
  return {
    family: 'cellwise',
    name,
    args: [
      { name: 'substance', kind: 'key' },
      { name: 'change', kind: 'key' },
      { name: 'temperature', kind: 'temperature', optional: true },
    ],
    options: ['kind', 'at_pressure'],
    plan: (keys, settings) => latentPlan(quantity, keys, settings),
  };
}

/** A curve of one kind, with the transition temperature as default. */
function latentPlan(quantity: 'latent' | 'latentSlope', keys: readonly Key[], settings: Settings): Plan {
  const substance = substanceKey(keys[0]);
  const { change, sign } = changeKey(substance, keys[1]);
  const kind = kindOption(settings, substance.defaultKind(change));
  const curve = onSaturation(settings, kind)
    ? isobaricOnLine(substance, change, quantity)
    : substance[quantity](change, kind, pressureOption(settings, kind));
  const unit = settings.units[quantity === 'latent' ? 'heat' : 'heatCapacity'];
  const plan = curvePlan(curve, signed(fromMolar(unit, substance.molarMass), sign), settings, 'temperature');
  const fallback = substance.transitionTemperature(change);
  const at = (x: number): number => {
    if (x === x) return x;
    if (fallback !== undefined) return fallback;
    throw new Problem({
      code: 'argument',
      argument: 'temperature',
      allowed: `a temperature: ${change} has no temperature of its own`,
      received: 'nothing',
    });
  };
  const { compute, record } = plan;
  return {
    ...plan,
    compute: (x, b, c, d) => compute(at(x), b, c, d),
    ...(record === undefined ? {} : { record: (x, b, c, d) => record(at(x), b, c, d) }),
  };
}

/**
 * The isobaric kind at the pressure of the two-phase line itself: the latent heat is that of the line, and the slope is
 * the heat-capacity difference of the two real phases, the line's slope less the term between them.
 */
function isobaricOnLine(substance: Substance, change: Change, quantity: 'latent' | 'latentSlope'): Curve {
  const line = substance[quantity](change, 'coexistence');
  const subject = `${line.subject}, at its own pressure`;
  if (quantity === 'latent') return { ...line, kind: 'isobaric', subject };
  const term = substance.coexistenceTerm(change);
  return {
    ...line,
    kind: 'isobaric',
    subject,
    from: Math.max(line.from, term.from),
    to: Math.min(line.to, term.to),
    method: 'heat-capacity difference of the two phases on the line: its slope less [Δv − T(∂Δv/∂T)p]·dp/dT',
    at: (t) => line.at(t) - term.at(t),
  };
}
