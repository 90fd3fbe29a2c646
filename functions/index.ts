/**
 * Entry of the functions bundle: every cell function, and what hosts need beside them on `globalThis.Latentry`.
 */
import { setBlankReader } from './edge/blanks';
import { DATA_EDITION, EDITION } from './edge/editionText';
import { currentRegistry } from './house/currentRegistry';
import { readHouseBlock } from './house/readHouseBlock';
import { houseStore } from './house/store';
import { DEFAULT_SETTINGS, parseSettingsBlock, parseSettingsText, settingsRows } from './settings/settings';
import { settingsStore } from './settings/store';
import './constant';
import './deltaCp';
import './disagreement';
import './edition';
import './enthalpy';
import './estimate';
import './fitDeltaCp';
import './fitLatent';
import './heat';
import './heatCap';
import './heatSteps';
import './kirchhoff';
import './latent';
import './satPressure';
import './satTemperature';
import './selfCheck';
import './source';
import './toUnits';
import './units';

/** The bundle's surface for hosts that load it as a file. */
export interface LatentryBundle {
  readonly edition: string;
  readonly dataEdition: string;
  readonly settings: typeof settingsStore;
  readonly defaultSettings: typeof DEFAULT_SETTINGS;
  readonly parseSettingsText: typeof parseSettingsText;
  readonly parseSettingsBlock: typeof parseSettingsBlock;
  readonly settingsRows: typeof settingsRows;
  readonly setBlankReader: typeof setBlankReader;
  readonly house: typeof houseStore;
  readonly readHouseBlock: typeof readHouseBlock;
  readonly currentRegistry: typeof currentRegistry;
}

declare global {
  var Latentry: LatentryBundle;
}

globalThis.Latentry = {
  edition: EDITION,
  dataEdition: DATA_EDITION,
  settings: settingsStore,
  defaultSettings: DEFAULT_SETTINGS,
  parseSettingsText,
  parseSettingsBlock,
  settingsRows,
  setBlankReader,
  house: houseStore,
  readHouseBlock,
  currentRegistry,
};
