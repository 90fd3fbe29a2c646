import { Problem } from '../../../core/problem';
import { parseSettingsBlock } from '../../../functions/settings/parseSettingsBlock';
import { SETTINGS } from '../../../functions/settings/schema';
import { DEFAULT_SETTINGS, type Settings } from '../../../functions/settings/settings';
import type { SettingTexts } from '../../plan/planUnits';
import { unitsRows } from '../../plan/unitsBlock';
import type { Block } from '../../port';

/** Text of every setting by its key, as it stands in the form. */
export type Draft = Readonly<Record<string, string>>;

/** What the sheet says, with the default where it is silent. */
export function draftOf(block: Block | null): Draft {
  const written = block === null ? [] : unitsRows(block);
  return Object.fromEntries(
    SETTINGS.map((row) => [row.key, written.find(({ key }) => key === row.key)?.value || row.default]),
  );
}

export function textsOf(draft: Draft): SettingTexts {
  return SETTINGS.map((row) => [row.label, draft[row.key] ?? row.default] as const);
}

export interface CheckedDraft {
  /** Undefined while a text can't be read. */
  readonly settings: Settings | undefined;
  /** What is wrong, by the key of the setting. */
  readonly errors: Readonly<Record<string, string>>;
}

/** Reads every text by itself, so that each error stands at its own field. */
export function checkDraft(draft: Draft): CheckedDraft {
  const errors: Record<string, string> = {};
  const rows = textsOf(draft);
  const decimal = rows.filter((_, i) => SETTINGS[i]?.kind === 'decimal');
  for (const [i, row] of rows.entries()) {
    const schema = SETTINGS[i];
    if (schema === undefined) continue;
    try {
      parseSettingsBlock(schema.kind === 'barometer' ? [row, ...decimal] : [row], DEFAULT_SETTINGS);
    } catch (error) {
      if (!(error instanceof Problem) || error.data.code !== 'argument') throw error;
      errors[schema.key] = `Allowed: ${error.data.allowed}. Received: ${error.data.received}.`;
    }
  }
  const settings = Object.keys(errors).length === 0 ? parseSettingsBlock(rows, DEFAULT_SETTINGS) : undefined;
  return { settings, errors };
}
