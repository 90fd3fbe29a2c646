import { DataValidationErrorStyle, DataValidationRenderMode, DataValidationType, type IRange } from '@univerjs/core';
import type { ISheetDataValidationRule } from '@univerjs/core';
import type { BookList } from '../../book';
import { rangeOf } from './rangeOf';

/**
 * Choices of a cell as a rule of the grid. It warns and doesn't block: a damaged setting is answered in words. Where the
 * choices are usual ones only, the rule informs.
 */
export function listRule(list: BookList, uid: string): ISheetDataValidationRule | null {
  const range = rangeOf(list.range);
  if (range === null) return null;
  return {
    uid,
    type: DataValidationType.LIST,
    ranges: [range],
    formula1: choices(list),
    errorStyle: list.open === true ? DataValidationErrorStyle.INFO : DataValidationErrorStyle.WARNING,
    renderMode: DataValidationRenderMode.ARROW,
    allowBlank: true,
    ...(list.prompt === undefined ? {} : { showInputMessage: true, prompt: list.prompt }),
  };
}

/** The grid parts choices at commas: those that hold one stand in an array constant. */
function choices({ values, source }: BookList): string {
  if (source !== undefined) return `=${source}`;
  if (!values.some((value) => value.includes(','))) return values.join(',');
  return `={${values.map((value) => `"${value.replaceAll('"', '""')}"`).join(';')}}`;
}

/** The choices of a rule, one entry for each of its ranges; undefined for rules of other kinds. */
export function bookLists(rule: ISheetDataValidationRule, address: (range: IRange) => string): BookList[] | undefined {
  const list: string = DataValidationType.LIST;
  if (rule.type !== list) return undefined;
  const formula = rule.formula1 ?? '';
  const prompt = rule.prompt === undefined || rule.prompt === '' ? {} : { prompt: rule.prompt };
  const what = choicesOf(formula);
  const open = isOpen(rule) ? { open: true } : {};
  return rule.ranges.map((range) => ({ range: address(range), ...what, ...prompt, ...open }));
}

/** True where a rule only offers choices, and takes other entries too. */
export function isOpen({ errorStyle }: Pick<ISheetDataValidationRule, 'errorStyle'>): boolean {
  return errorStyle === DataValidationErrorStyle.INFO;
}

function choicesOf(formula: string): Pick<BookList, 'values' | 'source'> {
  const constant = /^=\{(.*)\}$/.exec(formula)?.[1];
  if (constant !== undefined) {
    return {
      values: [...constant.matchAll(/"((?:[^"]|"")*)"/g)].map((match) => (match[1] ?? '').replaceAll('""', '"')),
    };
  }
  if (formula.startsWith('=')) return { values: [], source: formula.slice(1) };
  return { values: formula.split(',').filter((value) => value !== '') };
}
