import { HOUSE_FORMS, readForm, type FormWord } from '../../../../core/house/readForm';
import { Problem } from '../../../../core/problem';

const COEFFICIENTS: Readonly<Record<FormWord, string>> = {
  constant: 'One number',
  polynomial: 'c0; c1; c2 … in powers of T in K',
  table: 'Temperature:value, as 20:2.1; 40:2.15',
  Watson: 'Heat; its temperature; critical temperature, in K',
  Antoine: 'A; B; C of log10 p = A − B/(C + t)',
  'Majer-Svoboda': 'A; alpha; beta; critical temperature in K',
  'mass fractions': 'As water 0.6; carbohydrate 0.3; ash 0.1',
  text: 'The text itself',
};

/** How the coefficients of a form are written; of none, what the property suggests. */
export function coefficientsHint(form: string): string {
  try {
    const { word } = readForm(form, HOUSE_FORMS);
    return word === undefined ? 'A number, or pairs as 20:2.1; 40:2.15' : COEFFICIENTS[word];
  } catch (error) {
    if (error instanceof Problem) return '';
    throw error;
  }
}

const WITHOUT_UNIT = [
  'composition',
  'solid composition',
  'acentric factor',
  'formula',
  'cas',
  'synonym',
  'replaces built-in',
];

/** Which unit a property takes; a word that is no property yet is not told that it has none. */
export function unitHint(property: string): string {
  const plain = property.toLowerCase();
  if (/vapou?r pressure|sublimation pressure/.test(plain)) return 'Of pressure and temperature, as kPa; degC';
  if (/heat capacity/.test(plain)) return 'As kJ/(kg K)';
  if (/^heat of/.test(plain)) return 'As kJ/kg';
  if (/temperature/.test(plain)) return 'As degC';
  if (/pressure/.test(plain)) return 'As kPa';
  if (plain === 'molar mass') return 'As g/mol';
  return WITHOUT_UNIT.some((word) => plain.trim() === word) ? 'None' : 'As the property asks';
}
