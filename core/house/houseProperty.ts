import type { LatentKind } from '../answer';
import type { Change } from '../substance';
import { usualKind } from './materialData';

/** What a row of the Substances sheet is about. */
export type HouseProperty =
  | { readonly is: 'formula' | 'CAS' | 'synonym' | 'replaces built-in' }
  | { readonly is: 'constant'; readonly item: ConstantItem }
  | { readonly is: 'transition'; readonly change: Change; readonly at: string | undefined }
  | { readonly is: 'heat'; readonly change: Change; readonly kind: LatentKind; readonly kindSaid: boolean }
  | { readonly is: 'heat capacity'; readonly phase: 'solid' | 'liquid' | 'gas'; readonly form: string | undefined }
  | { readonly is: 'pressure'; readonly over: 'solid' | 'liquid' }
  | { readonly is: 'composition'; readonly phase: 'solid' | 'liquid' | undefined };

export const CONSTANT_ITEMS = [
  ...(['molar mass', 'triple temperature', 'triple pressure', 'critical temperature', 'critical pressure'] as const),
  'acentric factor',
] as const;
export type ConstantItem = (typeof CONSTANT_ITEMS)[number];

/** The usual words for a property, for lists; a solid-solid change has the names of its forms: `heat of alpha-beta`. */
export const HOUSE_PROPERTIES: readonly string[] = [
  ...['molar mass', 'melting temperature', 'heat of fusion', 'solid heat capacity', 'liquid heat capacity'],
  ...['boiling temperature', 'heat of vaporization', 'gas heat capacity', 'vapour pressure'],
  ...['sublimation pressure', 'heat of sublimation', 'composition', 'solid composition'],
  ...['critical temperature', 'critical pressure', 'triple temperature', 'triple pressure', 'acentric factor'],
  ...['formula', 'CAS', 'synonym', 'replaces built-in'],
];

const HEAT_WORDS: Readonly<Record<string, Change>> = {
  vaporization: 'vaporization',
  evaporation: 'vaporization',
  boiling: 'vaporization',
  fusion: 'fusion',
  melting: 'fusion',
  sublimation: 'sublimation',
};

const TEXT_WORDS: Readonly<Record<string, 'formula' | 'CAS' | 'synonym' | 'replaces built-in'>> = {
  formula: 'formula',
  cas: 'CAS',
  'cas number': 'CAS',
  synonym: 'synonym',
  synonyms: 'synonym',
  'replaces built-in': 'replaces built-in',
  'replaces built in': 'replaces built-in',
};

const PHASE_WORDS = {
  solid: 'solid',
  liquid: 'liquid',
  gas: 'gas',
  vapor: 'gas',
  'ideal gas': 'gas',
} as const;

/** Two names joined by a hyphen: the forms of a solid-solid change, cold first. */
const FORMS = '([a-z0-9]+)-([a-z0-9]+)';

/**
 * Reads what a row is about, in the words of the trade: `liquid heat capacity`, `heat of vaporization (standard)`,
 * `boiling temperature at 10 kPa`, `heat of alpha-beta`.
 *
 * @returns `undefined` for a text that is none of them
 */
export function readProperty(text: string): HouseProperty | undefined {
  const at = /^(.*?)\s+at\s+(.+)$/i.exec(text.trim());
  const named = (at?.[1] ?? text)
    .toLowerCase()
    .replace(/vapour/g, 'vapor')
    .replace(/vaporisation/g, 'vaporization')
    .replace(/fiber/g, 'fibre');
  const said = /\b(coexistence|isobaric|standard)\b/.exec(named)?.[1] as LatentKind | undefined;
  const plain = named
    .replace(/\b(?:coexistence|isobaric|standard)\b/g, ' ')
    .replace(/[\s_,;()]+/g, ' ')
    .trim();
  if (at !== null) {
    const point = transitionOf(plain);
    return point === 'vaporization' ? { is: 'transition', change: point, at: at[2] } : undefined;
  }
  const heat = /^(?:latent )?(?:heat|enthalpy) of (?:the )?(.+?)(?: change| transition)?$/.exec(plain)?.[1];
  const change = heat === undefined ? undefined : (HEAT_WORDS[heat] ?? solidChange(heat));
  if (change !== undefined)
    return { is: 'heat', change, kind: said ?? usualKind(change), kindSaid: said !== undefined };
  if (said !== undefined) return undefined;
  return textOrConstant(plain) ?? heatCapacityOf(plain) ?? pointOrLine(plain);
}

function textOrConstant(plain: string): HouseProperty | undefined {
  const text = TEXT_WORDS[plain];
  if (text !== undefined) return { is: text };
  const item = CONSTANT_ITEMS.find((word) => word === plain);
  return item === undefined ? undefined : { is: 'constant', item };
}

function heatCapacityOf(plain: string): HouseProperty | undefined {
  const match =
    /^(ideal gas|solid|liquid|gas|vapor)(?: (\S+))? heat capacity$/.exec(plain) ??
    /^heat capacity of (?:the )?(ideal gas|solid|liquid|gas|vapor)(?: (\S+))?$/.exec(plain);
  const phase = PHASE_WORDS[match?.[1] as keyof typeof PHASE_WORDS] as 'solid' | 'liquid' | 'gas' | undefined;
  if (phase === undefined || (phase !== 'solid' && match?.[2] !== undefined)) return undefined;
  return { is: 'heat capacity', phase, form: match?.[2] };
}

function pointOrLine(plain: string): HouseProperty | undefined {
  const change = transitionOf(plain);
  if (change !== undefined) return { is: 'transition', change, at: undefined };
  if (plain === 'vapor pressure' || plain === 'saturation pressure') return { is: 'pressure', over: 'liquid' };
  if (plain === 'sublimation pressure') return { is: 'pressure', over: 'solid' };
  const composition = /^(?:(solid|liquid) )?composition$/.exec(plain);
  if (composition === null) return undefined;
  return { is: 'composition', phase: composition[1] as 'solid' | 'liquid' | undefined };
}

function transitionOf(plain: string): Change | undefined {
  const word = /^(.+) (?:temperature|point)$/.exec(plain)?.[1];
  if (word === undefined) return undefined;
  if (word === 'melting' || word === 'freezing') return 'fusion';
  return word === 'boiling' ? 'vaporization' : solidChange(word);
}

function solidChange(word: string): Change | undefined {
  const [, cold, hot] = new RegExp(`^${FORMS}$`).exec(word) ?? [];
  return cold === undefined || cold === hot ? undefined : word;
}

/** The words of a property as messages and lists write it. */
export function propertyWords(property: HouseProperty): string {
  switch (property.is) {
    case 'constant':
      return property.item;
    case 'transition': {
      const { change, at } = property;
      const name = change === 'fusion' ? 'melting' : change === 'vaporization' ? 'boiling' : change;
      return `${name} temperature${at === undefined ? '' : ` at ${at}`}`;
    }
    case 'heat': {
      const { change, kind } = property;
      return kind === usualKind(change) ? `heat of ${change}` : `heat of ${change}, ${kind}`;
    }
    case 'heat capacity':
      return property.form === undefined
        ? `${property.phase} heat capacity`
        : `${property.phase} ${property.form} heat capacity`;
    case 'pressure':
      return property.over === 'liquid' ? 'vapour pressure' : 'sublimation pressure';
    case 'composition':
      return property.phase === undefined ? 'composition' : `${property.phase} composition`;
    default:
      return property.is;
  }
}
