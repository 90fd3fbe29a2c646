import { HOUSE_PROPERTIES } from '../../core/house/houseProperty';
import { HOUSE_FORMS } from '../../core/house/readForm';
import { SETTINGS } from '../../functions/settings/schema';
import type { BookCell, BookSheet } from '../book';
import { emptySheet } from '../emptySheet';
import { put } from './place';

/** Everything with a list of usual entries, a column each. */
const withChoices: readonly { readonly key: string; readonly label: string; readonly choices: readonly string[] }[] = [
  ...SETTINGS.filter(({ choices }) => choices.length > 0),
  { key: 'property', label: 'Property', choices: HOUSE_PROPERTIES },
  { key: 'form', label: 'Form', choices: HOUSE_FORMS },
];
const columnOf = (index: number) => String.fromCharCode(65 + index);

/** The cells that hold the choices of a setting, or of a column of the Substances sheet: a rule's own text can hold neither a comma nor a long list. */
export function choiceSource(key: string): string {
  const index = withChoices.findIndex((setting) => setting.key === key);
  const column = columnOf(index);
  return `Lists!$${column}$2:$${column}$${(withChoices[index]?.choices.length ?? 0) + 1}`;
}

/** A hidden sheet with the choices of every list, a column each. */
export function listsSheet(): BookSheet {
  const cells: Record<string, BookCell> = {};
  withChoices.forEach(({ label, choices }, index) => {
    put(cells, `${columnOf(index)}1`, label, 'heading');
    choices.forEach((choice, i) => put(cells, `${columnOf(index)}${i + 2}`, choice, 'label', '@'));
  });
  return { ...emptySheet('Lists'), cells, hidden: true };
}
