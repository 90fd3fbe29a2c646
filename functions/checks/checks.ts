import { deltaCp } from '../deltaCp';
import { fitDeltaCp } from '../fitDeltaCp';
import { heat } from '../heat';
import { heatCap } from '../heatCap';
import { kirchhoff } from '../kirchhoff';
import { latent } from '../latent';
import { satPressure } from '../satPressure';
import { toUnits } from '../toUnits';
import type { Check } from './check';
import { fitChecks } from './fitChecks';
import { unitChecks } from './unitChecks';
import { waterChecks } from './waterChecks';

const functions: Readonly<Record<string, (...args: never[]) => unknown[][]>> = {
  LATENT: latent,
  DELTACP: deltaCp,
  HEATCAP: heatCap,
  SATPRESSURE: satPressure,
  HEAT: heat,
  KIRCHHOFF: kirchhoff,
  FITDELTACP: fitDeltaCp,
  TOUNITS: toUnits,
};

/** How many positional arguments come before the settings. */
const POSITIONS: Readonly<Record<string, number>> = {
  LATENT: 3,
  DELTACP: 3,
  HEATCAP: 5,
  SATPRESSURE: 2,
  HEAT: 4,
  KIRCHHOFF: 7,
  FITDELTACP: 4,
  TOUNITS: 4,
};

/** Every check with the call that computes it. */
export const checks: readonly { readonly check: Check; readonly run: () => number }[] = [
  ...waterChecks,
  ...fitChecks,
  ...unitChecks,
].map((check) => ({ check, run: () => compute(check) }));

function compute(check: Check): number {
  const fn = functions[check.call];
  const positions = POSITIONS[check.call];
  if (fn === undefined || positions === undefined) throw new Error(`no such function: ${check.call}`);
  const args: unknown[] = check.args.map((arg) => (typeof arg === 'object' ? arg.values.map((x) => [x]) : [[arg]]));
  while (args.length < positions) args.push(undefined);
  const table = fn(...([...args, [[[check.settings]]]] as never[]));
  const { pick } = check;
  const value = pick === undefined ? table[0]?.[0] : table.find((row) => row[0] === pick.label)?.[pick.column];
  if (typeof value !== 'number') throw new Error(`no number: ${String(value)}`);
  return value;
}
