import { mkdtemp, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';

const matrix = (name: string, more: object = {}) => ({ name, type: 'any', dimensionality: 'matrix', ...more });
const settings = matrix('settings', { optional: true, repeating: true });

const list = {
  functions: [
    {
      id: 'ECHO',
      name: 'ECHO',
      parameters: [matrix('first'), matrix('second', { optional: true }), settings],
      options: { requiresAddress: true, requiresParameterAddresses: true },
    },
    { id: 'COLUMN', name: 'COLUMN', parameters: [matrix('length')] },
    { id: 'REFUSE', name: 'REFUSE', parameters: [matrix('code'), matrix('words')] },
    { id: 'MIXED', name: 'MIXED', parameters: [] },
    { id: 'CRASH', name: 'CRASH', parameters: [] },
    { id: 'LATE', name: 'LATE', parameters: [matrix('value')] },
    { id: 'LATEREFUSE', name: 'LATEREFUSE', parameters: [] },
    { id: 'NOTNUMBER', name: 'NOTNUMBER', parameters: [] },
    { id: 'HOUSE', name: 'HOUSE', parameters: [] },
    { id: 'SETTING', name: 'SETTING', parameters: [matrix('key')] },
    { id: 'GONE', name: 'GONE', parameters: [] },
  ],
};

/** A functions bundle made by hand: just enough to see how cells, values and errors pass. */
const source = `
const later = (give) => new Promise((resolve, reject) => setTimeout(() => give(resolve, reject), 5));
let state = { state: 'unread' };
let house = { state: 'unread' };
const parse = (text, base) => {
  const settings = { ...base };
  for (const part of text.split(';')) {
    const [key, value] = part.split('=').map((word) => word.trim());
    if (!(key in base)) {
      throw Object.assign(new Error('unknown key ' + key), { data: { code: 'argument', argument: 'settings', allowed: 'temperature', received: key } });
    }
    settings[key] = value;
  }
  return settings;
};
const block = (rows, base) => {
  rows.forEach((row, i) => {
    if (row[1] === 'parsec') {
      throw Object.assign(new Error('bad'), { data: { code: 'argument', argument: 'Units row ' + (i + 1) + ' (' + row[0] + ')', allowed: 'degC, K', received: '"parsec"' } });
    }
  });
  return { ...base, ...Object.fromEntries(rows.map(([key, value]) => [String(key).toLowerCase(), value])) };
};
globalThis.Latentry = {
  edition: '0.0.1',
  settings: { current: () => state, publish: (next) => { const changed = JSON.stringify(next) !== JSON.stringify(state); state = next; return changed; } },
  defaultSettings: { temperature: 'degC', units: {}, barometerPa: 101325, outOfRange: 'refuse', decimal: '.', options: {} },
  parseSettingsText: parse,
  parseSettingsBlock: block,
  settingsRows: (settings) => Object.entries(settings),
  house: { current: () => house, publish: (next) => { const changed = JSON.stringify(next) !== JSON.stringify(house); house = next; return changed; } },
  readHouseBlock: (block) => ({ state: 'ready', house: block, stamp: JSON.stringify(block) }),
};
const is = (cell) => cell[0][0];
CustomFunctions.associate('ECHO', (...args) => JSON.stringify(args));
CustomFunctions.associate('COLUMN', (length) => Array.from({ length: is(length) }, (_, i) => [i + 1, 'n' + (i + 1)]));
CustomFunctions.associate('REFUSE', (code, words) => { throw new CustomFunctions.Error(is(code), is(words)); });
CustomFunctions.associate('MIXED', () => [[1, new CustomFunctions.Error(CustomFunctions.ErrorCode.notAvailable, 'second is missing')], [null, NaN], [true, '']]);
CustomFunctions.associate('CRASH', () => undefined.length);
CustomFunctions.associate('LATE', (value) => later((resolve) => resolve([[is(value) * 2]])));
CustomFunctions.associate('LATEREFUSE', () => later((_, reject) => reject(new CustomFunctions.Error('#N/A', 'came to nothing'))));
CustomFunctions.associate('NOTNUMBER', () => Infinity);
CustomFunctions.associate('HOUSE', () => JSON.stringify(house));
CustomFunctions.associate('SETTING', (key) => {
  if (state.state === 'broken') throw new CustomFunctions.Error('#VALUE!', state.cell + ': ' + state.message + '; ' + state.text);
  return String((state.settings ?? Latentry.defaultSettings)[is(key)]);
});
`;

/** Writes the small bundle to a new directory; gives the path of its `functions.js`. */
export async function smallBundle(): Promise<string> {
  const directory = await mkdtemp(path.join(tmpdir(), 'latentry-bundle-'));
  await writeFile(path.join(directory, 'functions.json'), JSON.stringify(list));
  await writeFile(path.join(directory, 'functions.js'), source);
  return path.join(directory, 'functions.js');
}
