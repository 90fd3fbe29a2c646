import { beforeEach, describe, expect, it } from 'vitest';
import { DEFAULT_SETTINGS, parseSettingsBlock, settingsRows } from '../../functions/settings/settings';
import { houseStore } from '../../functions/house/store';
import { settingsStore } from '../../functions/settings/store';
import { setBlankReader } from '../../functions/edge/blanks';
import { enthalpy } from '../../functions/enthalpy';
import { latent } from '../../functions/latent';
import { satPressure } from '../../functions/satPressure';
import { call, cellOf, faultOf, HostError } from './host';

const UNITS: string[][] = settingsRows(DEFAULT_SETTINGS);
const withUnits = (key: string, value: string): string[][] => UNITS.map((row) => (row[0] === key ? [key, value] : row));

/** h_fg at 60 degC, IAPWS R6-95(2018), to the digits the page promises. */
const AT_60 = 2357.65;
const at60 = (value: unknown): void => {
  expect(value).toBeTypeOf('number');
  expect(Math.abs((value as number) - AT_60)).toBeLessThanOrEqual(0.005); // half of the last printed digit
};

beforeEach(() => {
  settingsStore.publish({ state: 'absent' });
  houseStore.publish({ state: 'absent' });
  setBlankReader(undefined);
});

describe('arguments', () => {
  it('takes a number in the unit of the settings and a text with its own unit', () => {
    at60(cellOf(call(latent, ['water', 'vaporization', 60])));
    at60(cellOf(call(latent, ['water', 'vaporization', '333.15 K'])));
    at60(cellOf(call(latent, ['water', 'vaporization', '140 degF'])));
    at60(cellOf(call(latent, ['water', 'vaporization', 333.15], ['temperature=K'])));
    at60(cellOf(call(latent, ['water', 'vaporization', 333.15], [withUnits('Temperature', 'K')])));
  });

  it('matches names without regard to case, spaces and synonyms, and turns the sign for the opposite direction', () => {
    at60(cellOf(call(latent, ['  WATER ', 'Evaporation', 60])));
    at60(cellOf(call(latent, ['7732-18-5', 'vaporisation', 60])));
    at60(-(cellOf(call(latent, ['H2O', 'condensation', 60])) as number));
  });

  it('names the nearest word of a near miss', () => {
    expect(faultOf(() => call(latent, ['watr', 'vaporization', 60]))).toEqual({
      code: '#VALUE!',
      message: expect.stringMatching(/^substance: allowed .*water.*; received "watr"; nearest: water$/) as string,
    });
    expect(faultOf(() => call(latent, ['water', 'vaporisaton', 60])).message).toMatch(/nearest: vaporisation/);
    expect(faultOf(() => call(latent, ['water', 'vaporization', 60], ['knd=standard'])).message).toMatch(
      /nearest: kind/,
    );
  });

  it('refuses ambiguous and unusable values with what is allowed and what came', () => {
    expect(faultOf(() => call(latent, ['water', 'vaporization', '140 F'])).message).toMatch(
      /temperature: allowed .*degF.*received "140 F"/,
    );
    expect(faultOf(() => call(latent, ['water', 'vaporization', true])).message).toMatch(
      /temperature: allowed a number \(degC\).*received true/,
    );
    expect(faultOf(() => call(latent, ['water', 'vaporization', '60'])).code).toBe('#VALUE!');
    expect(faultOf(() => call(latent, ['water', 'vaporization', undefined])).message).toMatch(/temperature/);
  });

  it('says the range in the unit of the workbook', () => {
    const fault = faultOf(() => call(latent, ['water', 'vaporization', 400]));
    expect(fault.code).toBe('#N/A');
    expect(fault.message).toMatch(/^temperature 400 degC is outside \[.*, 373.946 degC\] for vaporization of water/);
  });
});

describe('ranges', () => {
  it('spills in the shape of the range, with blanks, errors and texts each in their place', () => {
    const spill = call(latent, [
      'water',
      'vaporization',
      [[60], [null], [{ code: '#DIV/0!' }], ['140 degF'], [400]],
    ]) as unknown[][];
    at60(spill[0]?.[0]);
    expect(spill[1]?.[0]).toBe('');
    expect((spill[2]?.[0] as HostError).code).toBe('#DIV/0!');
    at60(spill[3]?.[0]);
    expect((spill[4]?.[0] as HostError).code).toBe('#N/A');
  });

  it('makes the grid of a row against a column', () => {
    const grid = call(latent, [[['water', 'water']], 'vaporization', [[60], [60], [60]]]) as unknown[][];
    expect(grid.length).toBe(3);
    for (const row of grid) for (const value of row) at60(value);
  });

  it('refuses two ranges that disagree and says both shapes', () => {
    const fault = faultOf(() => call(latent, [[['water'], ['water']], 'vaporization', [[60], [60], [60]]]));
    expect(fault.code).toBe('#VALUE!');
    expect(fault.message).toMatch(/2 × 1.*3 × 1|3 × 1.*2 × 1/);
  });
});

describe('blanks', () => {
  it('refuses a blank single cell', () => {
    expect(faultOf(() => call(latent, ['water', 'vaporization', [[null]]])).message).toMatch(/received a blank cell/);
    expect(faultOf(() => call(latent, ['water', 'vaporization', [['']]])).message).toMatch(/received a blank cell/);
  });

  it('tells a real 0 from an empty cell where the host hands both over as 0', async () => {
    setBlankReader((address) => Promise.resolve(address === 'Sheet1!A1:A2' ? [[false], [true]] : [[false]]));
    const invocation = { parameterAddresses: [null, null, 'Sheet1!A1:A2'] };
    const answered: unknown = latent([['water']], [['vaporization']], [[0], [0]], undefined, invocation as never);
    const spill = (await (answered as Promise<unknown>)) as unknown[][];
    expect(spill[0]?.[0]).toBeTypeOf('number');
    expect(spill[1]?.[0]).toBe('');
  });

  it('checks every 0, also one that the last call gave', async () => {
    const state = (address: string): unknown =>
      enthalpy([['water']], [[0]], undefined, undefined, { parameterAddresses: [null, address] } as never);
    setBlankReader((address) => Promise.resolve([[address === 'S!A2']]));
    expect(await state('S!A1')).toEqual([[expect.any(Number)]]);
    await expect(Promise.resolve(state('S!A2'))).rejects.toMatchObject({ code: '#VALUE!' });
  });

  it('takes an optional empty cell without an address as left out', () => {
    const invocation = { parameterAddresses: [null, null, null] };
    const value = latent([['water']], [['fusion']], [['']], undefined, invocation as never) as unknown[][];
    expect(value[0]?.[0]).toBeTypeOf('number');
  });
});

describe('the call itself', () => {
  it('finds the invocation wherever the host puts it', () => {
    const invocation = { address: 'Sheet1!B2' };
    at60(cellOf(latent([['water']], [['vaporization']], [[60]], invocation as never)));
    at60(cellOf(latent([['water']], [['vaporization']], [[60]], [], invocation)));
    at60(cellOf(latent([['water']], [['vaporization']], [[60]], [[['heat=kJ/kg']]], invocation)));
  });

  it('unwraps rich values and refuses entities', () => {
    at60(
      cellOf(
        call(latent, ['water', 'vaporization', [[{ type: 'FormattedNumber', basicType: 'Double', basicValue: 60 }]]]),
      ),
    );
    const entity = { type: 'Entity', basicType: 'Error', basicValue: '#VALUE!' };
    expect(faultOf(() => call(latent, ['water', 'vaporization', [[entity]]])).message).toMatch(/data-type cell/);
  });
});

describe('settings', () => {
  it('waits while they are unread, and takes the block without waiting', async () => {
    settingsStore.publish({ state: 'unread' });
    at60(cellOf(call(latent, ['water', 'vaporization', 60], [UNITS])));
    const pending = call(latent, ['water', 'vaporization', 333.15]) as Promise<unknown>;
    expect(pending).toBeInstanceOf(Promise);
    settingsStore.publish({
      state: 'ready',
      settings: parseSettingsBlock(withUnits('Temperature', 'K'), DEFAULT_SETTINGS),
      stamp: '',
    });
    at60(cellOf(await pending));
  });

  it('takes settings in the place of an optional quantity that is left out', () => {
    const atMelting = 333.4265169; // kJ/kg, IAPWS R6-95 with R10-06 at 101.325 kPa
    for (const settings of ['heat=kJ/kg', UNITS]) {
      const value = cellOf(call(latent, ['water', 'fusion', settings])) as number;
      expect(Math.abs(value - atMelting)).toBeLessThanOrEqual(5e-8); // half of the last published digit
    }
    expect(faultOf(() => call(latent, ['water', 'vaporization', 'heat=kJ/kg'])).message).toMatch(
      /temperature: allowed a temperature/,
    );
  });

  it('never replaces a damaged setting by a default', () => {
    settingsStore.publish({ state: 'broken', cell: 'Units!B2', text: 'degX', message: 'degC, K, degF or degR' });
    expect(faultOf(() => call(latent, ['water', 'vaporization', 60])).message).toMatch(/Units!B2.*degX/);
    at60(cellOf(call(latent, ['water', 'vaporization', 60], [UNITS])));
    expect(
      faultOf(() => call(latent, ['water', 'vaporization', 60], [withUnits('Temperature', 'degX')])).message,
    ).toMatch(/degX/);
    // A block that lost a row falls back on the workbook's settings, not on a default.
    expect(faultOf(() => call(latent, ['water', 'vaporization', 60], [UNITS.slice(1)])).message).toMatch(/degX/);
  });

  it('extends out of range only when told, and says so', () => {
    const text = cellOf(call(satPressure, ['water', 380], ['answer=status'])) as string;
    expect(text).toMatch(/^#N\/A temperature 380 degC is outside/);
    expect(faultOf(() => call(satPressure, ['water', 380])).code).toBe('#N/A');
  });

  it('shows the parts of one record', () => {
    const part = (p: string): unknown => cellOf(call(latent, ['water', 'vaporization', 60], [`answer=${p}`]));
    at60(part('value'));
    expect(part('kind')).toMatch(/^coexistence/);
    expect(part('source')).toMatch(/IAPWS/);
    expect(part('status')).toBe('ok');
    expect(part('range')).toMatch(/degC/);
    expect(faultOf(() => part('uncertainy')).message).toMatch(/nearest: uncertainty/);
  });
});
