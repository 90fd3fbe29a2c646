import { Problem } from '../problem';

/** Chemical symbols up to californium. */
const SYMBOLS: ReadonlySet<string> = new Set(
  (
    'H He Li Be B C N O F Ne Na Mg Al Si P S Cl Ar K Ca Sc Ti V Cr Mn Fe Co Ni Cu Zn Ga Ge As Se Br Kr Rb Sr Y Zr Nb Mo Tc Ru ' +
    'Rh Pd Ag Cd In Sn Sb Te I Xe Cs Ba La Ce Pr Nd Pm Sm Eu Gd Tb Dy Ho Er Tm Yb Lu Hf Ta W Re Os Ir Pt Au Hg Tl Pb Bi Po At ' +
    'Rn Fr Ra Ac Th Pa U Np Pu Am Cm Bk Cf'
  ).split(' '),
);

/**
 * Atoms of each element in one formula unit, from a formula as `Ca(OH)2` or `Na2SO4·10H2O`.
 *
 * @param formula symbols in their own case, counts behind them, brackets, parts joined by `·`, `*` or `.` before a number
 * @returns count by symbol
 * @throws Problem `argument` for a text that is no formula, or an unknown symbol
 * @example
 * atomsOf('Ca(OH)2').get('H') // => 2
 */
export function atomsOf(formula: string): ReadonlyMap<string, number> {
  const atoms = new Map<string, number>();
  const plain = formula
    .replace(/\s+/g, '')
    .replace(/[₀-₉]/g, (digit) => String('₀₁₂₃₄₅₆₇₈₉'.indexOf(digit)))
    // A point behind a zero belongs to a count, any other joins two parts.
    .replace(/([A-Za-z)\]])0\.(\d)/g, '$10,$2')
    .replace(/[[{]/g, '(')
    .replace(/[\]}]/g, ')');
  for (const part of plain.split(/[·•⋅*]|\.(?=\d*[A-Z(])/)) {
    const [, times = '', group = ''] = /^(\d*)(.+)$/.exec(part) ?? [];
    add(atoms, group, countOf(times, formula), formula);
  }
  return atoms;
}

/** A symbol or an innermost bracket with its count; a count may be fractional, as in `Fe0.95O`. */
const TOKEN = /([A-Z][a-z]?|\()(\d+(?:,\d+)?)?/y;

function add(atoms: Map<string, number>, group: string, times: number, formula: string): void {
  let at = 0;
  while (at < group.length || group === '') {
    TOKEN.lastIndex = at;
    const match = TOKEN.exec(group);
    if (match === null) throw refused(formula);
    const [token, symbol = '', count = ''] = match;
    if (symbol === '(') {
      const close = closing(group, at);
      const behind = /^\d+(?:,\d+)?/.exec(group.slice(close + 1))?.[0] ?? '';
      if (close < 0 || token.length > 1) throw refused(formula);
      add(atoms, group.slice(at + 1, close), times * countOf(behind, formula), formula);
      at = close + 1 + behind.length;
    } else {
      if (!SYMBOLS.has(symbol)) throw refused(formula);
      atoms.set(symbol, (atoms.get(symbol) ?? 0) + times * countOf(count, formula));
      at += token.length;
    }
  }
}

/** 1 where nothing is written. */
function countOf(digits: string, formula: string): number {
  if (digits === '') return 1;
  const count = Number(digits.replace(',', '.'));
  if (count > 0) return count;
  throw refused(formula);
}

function closing(group: string, open: number): number {
  let depth = 0;
  for (let i = open; i < group.length; i++) {
    if (group[i] === '(') depth++;
    if (group[i] === ')' && --depth === 0) return i;
  }
  return -1;
}

function refused(formula: string): Problem {
  return new Problem({
    code: 'argument',
    argument: 'formula',
    allowed: 'a chemical formula, as Ca(OH)2 or Na2SO4·10H2O',
    received: `"${formula}"`,
  });
}
