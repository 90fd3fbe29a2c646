import type { UnitKind } from './unit';

/** What a data column can hold. */
export type ColumnRole = 'temperature' | 'latent' | 'pressure' | 'heatCapacity' | 'unknown';

const CHANGE = '(?:vap|fus|sub|trs|sol|lg|sg|sl|l|g|s|cr|m|liq|gas)*';

/** Symbols of the trade without blanks, underscores, carets and braces; words as they stand. */
const SYMBOLS: readonly (readonly [RegExp, ColumnRole])[] = [
  [/^(?:T|t|θ|ϑ)(?:[a-z0-9]{0,4})$/, 'temperature'],
  [new RegExp(`^(?:Δ|d|D|delta)?${CHANGE}(?:H|h)°?${CHANGE}(?:fg|fs|ig|if)?$`), 'latent'],
  [/^(?:L|l|λ|r)(?:v|f|s|vap|fus|sub)?$/, 'latent'],
  [new RegExp(`^(?:Δ|d|D|delta)?${CHANGE}[Cc][Pp](?:,?m)?°?${CHANGE}$`), 'heatCapacity'],
  [/^[pP](?:s|sat|v|vap|g|abs|0)?$/, 'pressure'],
];

const WORDS: readonly (readonly [RegExp, ColumnRole])[] = [
  [/heat ?cap|specific heat/i, 'heatCapacity'],
  [/\btemp/i, 'temperature'],
  [/latent|enthalp|heat of|heat\b/i, 'latent'],
  [/press/i, 'pressure'],
];

/** Guesses a column's role from its symbol or name. */
export function headerRole(name: string): ColumnRole {
  const symbol = name.replace(/[\s_^{}]/g, '');
  for (const [pattern, role] of SYMBOLS) if (pattern.test(symbol)) return role;
  for (const [pattern, role] of WORDS) if (pattern.test(name)) return role;
  return 'unknown';
}

/** The role of a column whose unit measures this. */
export function roleOfKind(kind: UnitKind): ColumnRole {
  switch (kind) {
    case 'temperature':
    case 'pressure':
    case 'heatCapacity':
      return kind;
    case 'difference':
      return 'temperature';
    case 'heat':
      return 'latent';
    default:
      return 'unknown';
  }
}

/** What a name says of an uncertainty: of what it is one, and its coverage factor where the name tells. */
export interface NamedUncertainty {
  readonly of: ColumnRole;
  readonly coverage: number | undefined;
}

const SYMBOL = /^(u|U|s|σ|sigma|sd|se|unc|±)(?:_?(?:c|r|rel))?(?: ?\((.+)\)|[ _](.+))?$/;
const WORD = /uncertainty|std\.? ?dev|standard (?:error|deviation)|\bunc\.?\b/i;

/** Whether a name is that of an uncertainty: `u(ΔH)`, `U`, `σ_T`, `standard uncertainty of T`; `undefined` where not. */
export function uncertaintyOf(name: string): NamedUncertainty | undefined {
  const symbol = SYMBOL.exec(name);
  if (symbol !== null) {
    const standard = symbol[1] !== 'U' && symbol[1] !== 'unc' && symbol[1] !== '±';
    return { of: headerRole(symbol[2] ?? symbol[3] ?? ''), coverage: standard ? 1 : undefined };
  }
  if (!WORD.test(name)) return undefined;
  const rest = name
    .replace(WORD, ' ')
    .replace(/\b(?:standard|expanded|of|in|the)\b/gi, ' ')
    .trim();
  return { of: headerRole(rest), coverage: /standard|std/i.test(name) ? 1 : undefined };
}
