export type { Settings } from './settingsType';
export { DEFAULT_SETTINGS } from './defaultSettings';
export { parseSettingsText } from './parseSettingsText';
export { parseSettingsBlock } from './parseSettingsBlock';
export { readSettingsBlock, type ReadSettings, type SettingsFault } from './readSettingsBlock';
export { settingsFor } from './settingsFor';
export { settingsRows, settingsText } from './settingsRows';
export { settingsStamp } from './settingsStamp';
