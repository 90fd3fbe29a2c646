import { deltaCp } from '../deltaCp';
import { estimate } from '../estimate';
import { fitDeltaCp } from '../fitDeltaCp';
import { heat } from '../heat';
import { heatCap } from '../heatCap';
import { kirchhoff } from '../kirchhoff';
import { latent } from '../latent';
import { satPressure } from '../satPressure';
import { satTemperature } from '../satTemperature';
import { toUnits } from '../toUnits';
import type { Check } from './check';
import { checkList } from './checkList';

const functions: Readonly<Record<string, (...args: never[]) => unknown[][]>> = {
  LATENT: latent,
  DELTACP: deltaCp,
  HEATCAP: heatCap,
  SATPRESSURE: satPressure,
  SATTEMPERATURE: satTemperature,
  HEAT: heat,
  KIRCHHOFF: kirchhoff,
  FITDELTACP: fitDeltaCp,
  ESTIMATE: estimate,
  TOUNITS: toUnits,
};

/** Every check with the call that computes it. */
export const checks: readonly { readonly check: Check; readonly run: () => number }[] = checkList.map((check) => ({
  check,
  run: () => compute(check),
}));

function compute(check: Check): number {
  const fn = functions[check.call];
  if (fn === undefined) throw new Error(`no such function: ${check.call}`);
  const args: unknown[] = check.args.map((arg) =>
    typeof arg !== 'object' ? [[arg]] : 'rows' in arg ? arg.rows : arg.values.map((x) => [x]),
  );
  // Every cell function ends with the settings and the invocation.
  while (args.length < fn.length - 2) args.push(undefined);
  const table = fn(...([...args, [[[check.settings]]]] as never[]));
  const { pick } = check;
  const value = pick === undefined ? table[0]?.[0] : table.find((row) => row[0] === pick.label)?.[pick.column];
  if (typeof value !== 'number') throw new Error(`no number: ${String(value)}`);
  return value;
}
