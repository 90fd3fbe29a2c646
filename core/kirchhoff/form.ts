import { nearest } from '../nearest';
import { Problem } from '../problem';

/** One term of a heat-capacity difference: coefficient · scale · T^power, T in kelvin. */
export interface FormTerm {
  readonly power: number;
  readonly scale: number;
}

/** The shape of ΔCp(T): its terms in the order of its coefficients. */
export interface Form {
  readonly name: string;
  readonly terms: readonly FormTerm[];
  /** True where the coefficients are pure numbers, to be multiplied by the gas constant. */
  readonly timesGasConstant: boolean;
}

const powers = (name: string, list: readonly number[], timesGasConstant = false): Form => ({
  name,
  terms: list.map((power) => ({ power, scale: 1 })),
  timesGasConstant,
});

/** Forms that have a name of their own. */
const CONSTANT = powers('constant', [0]);
const NAMED: ReadonlyMap<string, Form> = new Map([
  ['constant', CONSTANT],
  ['linear', powers('a+bT', [0, 1])],
  ['maierkelley', powers('a+bT+c/T^2', [0, 1, -2])],
  [
    'shomate',
    {
      name: 'shomate',
      terms: [0, 1, 2, 3, -2].map((power) => ({ power, scale: 1000 ** -power })),
      timesGasConstant: false,
    },
  ],
  ['nasa7', powers('nasa7', [0, 1, 2, 3, 4], true)],
  ['nasa9', powers('nasa9', [-2, -1, 0, 1, 2, 3, 4], true)],
]);

/** What a message offers; any other sum of powers of T is understood as well. */
export const FORM_NAMES = [
  'constant',
  'a+bT',
  'a+bT+cT^2',
  'a+bT+cT^2+dT^3',
  'a+bT+c/T^2',
  'a+bT+cT^2+d/T^2',
  'Maier-Kelley',
  'shomate',
  'nasa7',
  'nasa9',
] as const;

const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const HIGHEST_POWER = 6;

/**
 * The form that a text names: `a+bT`, `a + bT + cT²`, `a+bT+c/T^2`, `Maier-Kelley`, `shomate`, `nasa7`, …
 *
 * A sum of terms is a letter alone, or a letter with a power of T, each letter and each power once, powers from −6 to 6;
 * coefficients follow the order of the letters as written. Shomate takes T/1000 and no constant of integration
 * (A + Bt + Ct² + Dt³ + E/t²). NASA forms take cp/R (a₁ … a₅; or a₁T⁻² … a₇T⁴).
 *
 * @param text name or sum; case, spaces and typographic signs do not matter
 * @returns the terms in the order of the coefficients
 * @throws Problem of code `argument` with the nearest name
 * @source C. G. Maier, K. K. Kelley, J. Am. Chem. Soc. 54 (1932) 3243; NIST Chemistry WebBook (Shomate);
 * B. J. McBride et al., NASA/TP-2002-211556
 * @example
 * import { readForm } from 'latentry';
 * readForm('a + b·T + c T⁻²').name // => 'a+bT+c/T^2'
 */
export function readForm(text: string): Form {
  const known = NAMED.get(text) ?? remembered.get(text);
  if (known !== undefined) return known;
  const plain = plainForm(text);
  const form = NAMED.get(plain.replace(/[-_]/g, '')) ?? readSum(plain);
  if (form === undefined) throw unknownForm(text, plain);
  if (remembered.size >= MOST_REMEMBERED) remembered.clear();
  remembered.set(text, form);
  return form;
}

/** Spellings read before: a column of formulas repeats one. */
const remembered = new Map<string, Form>();
const MOST_REMEMBERED = 100;

function unknownForm(text: string, plain: string): Problem {
  const near = nearest(plain, FORM_NAMES);
  return new Problem({
    code: 'argument',
    argument: 'form',
    allowed: `${FORM_NAMES.join(', ')}, or another sum of powers of T`,
    received: JSON.stringify(text),
    ...(near === undefined ? {} : { nearest: near }),
  });
}

/** Lower case, no spaces or dots, one kind of minus, powers as `^n`. */
function plainForm(text: string): string {
  return text
    .toLowerCase()
    .replace(/[\s·⋅*×]/g, (sign) => (sign === '*' ? '*' : ''))
    .replace(/\*\*/g, '^')
    .replace(/\*/g, '')
    .replace(/[−–—]/g, '-')
    .replace(
      /(⁻?)([⁰¹²³⁴⁵⁶⁷⁸⁹])/g,
      (_, minus: string, digit: string) => `^${minus === '' ? '' : '-'}${SUPERSCRIPTS.indexOf(digit)}`,
    )
    .replace(/\^[({](-?\d)[)}]/g, '^$1');
}

function readSum(plain: string): Form | undefined {
  const list: number[] = [];
  const letters = new Set<string>();
  for (const part of plain.split('+')) {
    const match = /^([a-su-z])(?:(\/?)t(?:\^(-?\d))?)?$/.exec(part);
    const letter = match?.[1];
    if (match === null || letter === undefined) return undefined;
    const size = part.includes('t') ? Number(match[3] ?? 1) : 0;
    const power = match[2] === '/' ? -size : size;
    if (letters.has(letter) || list.includes(power) || Math.abs(power) > HIGHEST_POWER) return undefined;
    letters.add(letter);
    list.push(power);
  }
  if (list.length === 1 && list[0] === 0) return CONSTANT;
  return powers(nameOf(list), list);
}

function nameOf(list: readonly number[]): string {
  const letters = 'abcdefghijklm';
  return list.map((power, i) => `${letters.charAt(i)}${powerName(power)}`).join('+');
}

function powerName(power: number): string {
  if (power === 0) return '';
  const size = Math.abs(power) === 1 ? 'T' : `T^${Math.abs(power)}`;
  return power < 0 ? `/${size}` : size;
}
