import { Problem } from '../../core/problem';
import { withEntries, type Entry } from './settingsDraft';
import type { Settings } from './settingsType';

/**
 * Reads settings written as `key=value; key=value` (semicolons or new lines) onto other settings.
 *
 * @param text keys in any case, with or without spaces and underscores; values may hold spaces; empty parts don't count
 * @param base settings that hold where the text is silent
 * @param allowedOptions option keys that are known here beside the unit settings
 * @throws Problem `argument` for a part without `=`, an unknown key (with the nearest), a key given twice, or a value that
 * can't be read
 * @example
 * parseSettingsText('Temperature = K; heat=kJ/mol', DEFAULT_SETTINGS).units.heat.symbol // => 'kJ/mol'
 */
export function parseSettingsText(text: string, base: Settings, allowedOptions: readonly string[] = []): Settings {
  const entries: Entry[] = [];
  for (const part of text.split(/[;\r\n]/)) {
    if (part.trim() === '') continue;
    const at = part.indexOf('=');
    const key = part.slice(0, Math.max(at, 0)).trim();
    if (key === '') {
      throw new Problem({
        code: 'argument',
        argument: 'settings',
        allowed: 'key=value; key=value, as temperature=K',
        received: `"${part.trim()}"`,
      });
    }
    entries.push({ key, value: part.slice(at + 1).trim(), where: `settings key ${key}` });
  }
  return entries.length === 0 ? base : withEntries(base, entries, allowedOptions);
}
