const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const SUBSCRIPTS = '₀₁₂₃₄₅₆₇₈₉';

/**
 * Rewrites the typography of units, numbers and headers in plain characters: superscripts as `^-1`, every minus as `-`,
 * every product sign as `*`, every slash as `/`, every space as one blank, `°` as `deg`, one delta, `µ` as `u`:
 * `kJ·kg⁻¹` becomes `kJ*kg^-1`.
 */
export function plainText(text: string): string {
  if (PLAIN.test(text)) return text.replace(/ +/g, ' ').trim();
  return text
    .replace(/[⁺⁻]?[⁰¹²³⁴⁵⁶⁷⁸⁹]+/g, (run) => `^${Array.from(run, unraised).join('')}`)
    .replace(/[₀-₉]/g, (digit) => String(SUBSCRIPTS.indexOf(digit)))
    .replace(/[\u2010-\u2014\u2212\ufe63\uff0d]/g, '-')
    .replace(/[\u00b7\u22c5\u2022\u2219\u00d7\u2a2f]/g, '*')
    .replace(/[\u2044\u2215\uff0f]/g, '/')
    .replace(/[\s\u200b\u2060\ufeff]+/g, ' ')
    .replace(/℃/g, 'degC')
    .replace(/℉/g, 'degF')
    .replace(/([A-Za-z])?[°º˚] ?(?=[CFRKcfrk](?![A-Za-z]))/g, (_, letter?: string) =>
      letter === undefined ? 'deg' : `${letter} deg`,
    )
    .replace(/\u212a/g, 'K')
    .replace(/\u2206/g, 'Δ')
    .replace(/[\u00b5\u03bc]/g, 'u')
    .replace(/\uff08/g, '(')
    .replace(/\uff09/g, ')')
    .trim();
}

const PLAIN = /^[ -~]*$/;

function unraised(character: string): string {
  if (character === '⁻') return '-';
  if (character === '⁺') return '';
  return String(SUPERSCRIPTS.indexOf(character));
}
