import { Problem } from '../problem';
import { checkCovariance } from './covarianceBlock';
import { readForm, type Form } from './form';
import { powerIntegral } from './powerIntegral';

/** Molar gas constant, J/(mol K); exact since the SI of 2019. */
export const GAS_CONSTANT = 8.31446261815324;

export interface KirchhoffInput {
  /** Latent heat at `atK`, in any unit of heat per amount. */
  readonly latent: number;
  /** Temperatures in kelvin, above 0. */
  readonly atK: number;
  readonly toK: number;
  /** ΔCp of the same kind as the latent heat, in its unit per kelvin: one number, or the coefficients of `form`. */
  readonly deltaCp: number | readonly number[];
  /** Shape of ΔCp(T), T in kelvin; constant when absent. */
  readonly form?: string | undefined;
  /** Standard uncertainty of `latent`. */
  readonly uLatent?: number | undefined;
  /** Standard uncertainty of a constant ΔCp. */
  readonly uDeltaCp?: number | undefined;
  /** Correlation of `latent` with a constant ΔCp, in [−1, 1]. */
  readonly correlation?: number | undefined;
  /** Covariance block of the coefficients. */
  readonly covariance?: readonly (readonly number[])[] | undefined;
  /** Covariance of `latent` with each coefficient. */
  readonly latentCovariance?: readonly number[] | undefined;
  /** For NASA forms: the gas constant in the unit of the heat capacity; J/(mol K) when absent. */
  readonly gasConstant?: number | undefined;
}

export interface KirchhoffResult {
  readonly value: number;
  /** Standard uncertainty; undefined where no uncertainty was given. */
  readonly uncertainty: number | undefined;
  /** Mean of ΔCp over the interval, at `atK` where it has no width. */
  readonly meanDeltaCp: number;
  readonly form: string;
  /** ∂value/∂coefficient, in the order of the coefficients; that of `latent` is 1. */
  readonly sensitivities: readonly number[];
}

/**
 * Latent heat carried to another temperature by Kirchhoff's law.
 *
 * ΔH(T₂) = ΔH(T₁) + ∫ ΔCp dT from T₁ to T₂, integrated exactly; u² = cᵀ V c with the sensitivities c and the covariance V
 * of latent heat and coefficients. Latent heat and ΔCp must be of one kind: along the two-phase line, at one pressure,
 * or standard.
 *
 * @param input latent heat, temperatures, ΔCp and what is known of their uncertainties
 * @returns value with standard uncertainty, mean ΔCp, sensitivities
 * @throws Problem of code `argument` for temperatures not above 0 K, numbers that are not finite, an unknown form, a
 * wrong number of coefficients, negative uncertainties, a correlation outside [−1, 1], a block that is no covariance
 * @source G. Kirchhoff, Ann. Phys. 179 (1858) 177; JCGM 100:2008 (GUM), 5.2.2, equation (13)
 * @example
 * import { kirchhoff } from 'latentry';
 * kirchhoff({ latent: 2256.4, atK: 373.15, toK: 298.15, deltaCp: -2.5055 }).value // => 2444.3125
 * kirchhoff({ latent: 40660, atK: 373.15, toK: 298.15, deltaCp: -42.7, uLatent: 30, uDeltaCp: 0.5 }).uncertainty // => 48.02
 */
export function kirchhoff(input: KirchhoffInput): KirchhoffResult {
  const { latent, atK, toK } = input;
  refuseUnless('latent', latent, Number.isFinite(latent), 'a finite latent heat');
  refuseUnless('at', atK, Number.isFinite(atK) && atK > 0, 'a temperature above 0 K');
  refuseUnless('to', toK, Number.isFinite(toK) && toK > 0, 'a temperature above 0 K');
  const form = readForm(input.form ?? 'constant');
  const coefficients = coefficientsOf(input.deltaCp, form);
  const scale = form.timesGasConstant ? (input.gasConstant ?? GAS_CONSTANT) : 1;
  const sensitivities = form.terms.map((term) => scale * term.scale * powerIntegral(term.power, atK, toK));
  const change = dot(sensitivities, coefficients);
  const here = form.terms.map((term) => scale * term.scale * atK ** term.power);
  const value = latent + change;
  refuseUnless('deltacp', value, Number.isFinite(value), 'coefficients with a finite integral');
  return {
    value,
    uncertainty: uncertaintyOf(input, sensitivities),
    meanDeltaCp: toK === atK ? dot(here, coefficients) : change / (toK - atK),
    form: form.name,
    sensitivities,
  };
}

function coefficientsOf(deltaCp: number | readonly number[], form: Form): readonly number[] {
  const coefficients = typeof deltaCp === 'number' ? [deltaCp] : deltaCp;
  if (coefficients.length !== form.terms.length) {
    const count = form.terms.length;
    const allowed = `${count} ${count === 1 ? 'coefficient' : 'coefficients'} for the form ${form.name}`;
    throw new Problem({ code: 'argument', argument: 'deltacp', allowed, received: String(coefficients.length) });
  }
  for (const value of coefficients) refuseUnless('deltacp', value, Number.isFinite(value), 'finite numbers');
  return coefficients;
}

function uncertaintyOf(input: KirchhoffInput, sensitivities: readonly number[]): number | undefined {
  const { uLatent, uDeltaCp, correlation, covariance, latentCovariance } = input;
  if (uLatent === undefined && uDeltaCp === undefined && covariance === undefined) {
    if (correlation !== undefined) throw alone('correlation');
    if (latentCovariance !== undefined) throw alone('latent_covariance');
    return undefined;
  }
  for (const [name, u] of [
    ['u_latent', uLatent],
    ['u_deltacp', uDeltaCp],
  ] as const) {
    refuseUnless(name, u ?? 0, Number.isFinite(u ?? 0) && (u ?? 0) >= 0, 'a standard uncertainty of at least 0');
  }
  const block = covariance === undefined ? blockOf(uDeltaCp, sensitivities.length) : covariance;
  if (covariance !== undefined && uDeltaCp !== undefined) {
    throw refused('u_deltacp', 'one uncertainty, or a covariance block', 'both');
  }
  const across = acrossOf(input, sensitivities.length);
  const u = uLatent ?? 0;
  const joint = [[u * u, ...across], ...block.map((row, i) => [across[i] ?? 0, ...row])];
  checkCovariance(block, sensitivities.length, 'covariance');
  checkCovariance(joint, sensitivities.length + 1, 'covariance with the latent heat');
  const all = [1, ...sensitivities];
  return Math.sqrt(
    Math.max(
      0,
      dot(
        all,
        joint.map((row) => dot(row, all)),
      ),
    ),
  );
}

function blockOf(uDeltaCp: number | undefined, size: number): readonly (readonly number[])[] {
  if (size > 1 && uDeltaCp !== undefined) {
    throw refused('u_deltacp', `a covariance block of ${size} rows and ${size} columns`, 'one number');
  }
  const variance = (uDeltaCp ?? 0) ** 2;
  return Array.from({ length: size }, () => new Array<number>(size).fill(size === 1 ? variance : 0));
}

/** Covariances of the latent heat with the coefficients. */
function acrossOf(input: KirchhoffInput, size: number): readonly number[] {
  const { correlation, latentCovariance, uLatent = 0, uDeltaCp } = input;
  if (latentCovariance !== undefined) {
    if (correlation !== undefined) throw refused('correlation', 'a correlation, or covariances', 'both');
    if (latentCovariance.length !== size) {
      throw refused('latent_covariance', `${size} numbers, one a coefficient`, String(latentCovariance.length));
    }
    return latentCovariance;
  }
  if (correlation === undefined) return new Array<number>(size).fill(0);
  refuseUnless('correlation', correlation, correlation >= -1 && correlation <= 1, 'a number in [-1, 1]');
  if (size !== 1) throw refused('correlation', 'covariances of the latent heat with each coefficient', 'one number');
  const u = uDeltaCp ?? Math.sqrt(Math.max(0, input.covariance?.[0]?.[0] ?? 0));
  return [correlation * uLatent * u];
}

function dot(a: readonly number[], b: readonly number[]): number {
  return a.reduce((sum, value, i) => sum + value * (b[i] ?? 0), 0);
}

function alone(argument: string): Problem {
  return refused(
    argument,
    'together with uncertainties of latent heat and heat-capacity difference',
    'no uncertainties',
  );
}

function refused(argument: string, allowed: string, received: string): Problem {
  return new Problem({ code: 'argument', argument, allowed, received });
}

function refuseUnless(argument: string, value: number, good: boolean, allowed: string): void {
  if (!good) throw refused(argument, allowed, String(value));
}
