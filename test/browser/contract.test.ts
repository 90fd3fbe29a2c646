import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchChromium } from './support/launchChromium';

/** The built bundle in a real browser under the platform's own custom-functions runtime script. */
const dist = path.resolve(import.meta.dirname, '../../dist');
const runtime = createRequire(import.meta.url).resolve('@microsoft/office-js/dist/custom-functions-runtime.js');
const list = JSON.parse(readFileSync(path.join(dist, 'functions.json'), 'utf8')) as {
  functions: { id: string; parameters: { name: string; optional?: boolean; repeating?: boolean }[] }[];
};

let browser: Browser;
let page: Page;

beforeAll(async () => {
  browser = await launchChromium();
  page = await browser.newPage();
  // The platform's script insists on its own file name, so everything comes from addresses that lead to files here.
  const files: Readonly<Record<string, string>> = {
    '/custom-functions-runtime.js': readFileSync(runtime, 'utf8'),
    '/o15apptofilemappingtable.js': '',
    '/functions.js': readFileSync(path.join(dist, 'functions.js'), 'utf8'),
  };
  const html =
    '<!doctype html><meta charset="utf-8"><title>host</title><script src="custom-functions-runtime.js"></script><script src="functions.js"></script>';
  await page.route('**/*', (route) => {
    const url = new URL(route.request().url());
    if (url.hostname !== 'host.test') return route.abort();
    const script = files[url.pathname];
    return script === undefined
      ? route.fulfill({ contentType: 'text/html', body: html })
      : route.fulfill({ contentType: 'text/javascript', body: script });
  });
  await page.goto('http://host.test/');
  await page.evaluate(() => {
    Latentry.house.publish({ state: 'absent' });
    Latentry.settings.publish({ state: 'absent' });
  });
});

afterAll(() => browser.close());

interface Outcome {
  value?: unknown;
  error?: { code: string; message: string; own: boolean };
}

/** Calls an associated function in the page; errors come back as data. */
async function call(id: string, ...args: unknown[]): Promise<Outcome> {
  return page.evaluate(
    async ([name, values]) => {
      interface Platform {
        _association: { mappings: Record<string, (...a: unknown[]) => unknown> };
        Error: new () => { code: string; message: string };
      }
      const platform = (globalThis as unknown as { CustomFunctions: Platform }).CustomFunctions;
      const plain = (value: unknown): unknown =>
        value instanceof platform.Error
          ? { code: value.code, message: value.message }
          : Array.isArray(value)
            ? value.map(plain)
            : value;
      try {
        const fn = platform._association.mappings[name];
        if (fn === undefined) throw new Error(`${name} is not associated`);
        return { value: plain(await fn(...values)) };
      } catch (thrown) {
        const error = thrown as { code: string; message: string };
        return { error: { code: error.code, message: error.message, own: thrown instanceof platform.Error } };
      }
    },
    [id, args] as const,
  );
}

/** Arguments that a function answers a number, a text or a table to. */
const ANSWERING: Readonly<Record<string, readonly unknown[]>> = {
  CONSTANT: [[['water']], [['molar mass']]],
  DELTACP: [[['water']], [['vaporization']], [[25]]],
  DISAGREEMENT: [[['ethanol']], [['vaporization']], [[25]], [[70]]],
  EDITION: [],
  ENTHALPY: [[['water']], [[25]]],
  ESTIMATE: [
    [['riedel']],
    [
      ['boiling temperature', 80],
      ['critical temperature', 289],
      ['critical pressure', '48.95 bar'],
      ['molar mass', 78],
    ],
  ],
  FITDELTACP: [
    [[0], [20], [40], [60]],
    [[2500], [2453], [2406], [2358]],
  ],
  HEAT: [[['water']], [[-20]], [[150]]],
  HEATCAP: [[['water']], [['liquid']], [[25]]],
  HEATSTEPS: [[['water']], [[-20]], [[150]]],
  KIRCHHOFF: [[[2256.4]], [[100]], [[25]], [[-2.47]]],
  LATENT: [[['water']], [['vaporization']], [[60]]],
  SATPRESSURE: [[['water']], [[-20]]],
  SATTEMPERATURE: [[['water']], [[101.325]]],
  SELFCHECK: [],
  SOURCE: [[['water']], [['vaporization']]],
  TOUNITS: [[[1]], [['kcal_th/mol']], [['kJ/mol']]],
  UNITS: [],
};

describe('the built functions bundle under the platform runtime', () => {
  it('associates every id of functions.json and nothing else', async () => {
    const associated = await page.evaluate(() =>
      Object.keys(
        (globalThis as unknown as { CustomFunctions: { _association: { mappings: object } } }).CustomFunctions
          ._association.mappings,
      ),
    );
    expect(associated.sort()).toEqual(list.functions.map((f) => f.id).sort());
  });

  it.each(list.functions.map((f) => f.id).filter((id) => id !== 'FITLATENT'))('%s answers', async (id) => {
    const args = ANSWERING[id];
    expect(args, `${id} has no call here`).toBeDefined();
    const { value, error } = await call(id, ...(args ?? []), { functionName: id });
    expect(error).toBeUndefined();
    const first = (value as unknown[][])[0]?.[0];
    expect(typeof first === 'number' ? Number.isFinite(first) : typeof first === 'string' && first !== '').toBe(true);
  });

  it('FITLATENT answers from the table of FITDELTACP', async () => {
    const fit = await call('FITDELTACP', ...(ANSWERING['FITDELTACP'] ?? []), {});
    const { value, error } = await call('FITLATENT', fit.value, [[30]], {});
    expect(error).toBeUndefined();
    expect(Math.abs(((value as number[][])[0]?.[0] ?? NaN) - 2430)).toBeLessThan(5); // between the neighbours of the data
  });

  it('every signature ends with repeating settings, or takes none', () => {
    for (const { id, parameters } of list.functions) {
      const last = parameters.at(-1);
      if (id === 'EDITION' || id === 'SELFCHECK') expect(parameters).toEqual([]);
      else expect([id, last?.name, last?.repeating]).toEqual([id, 'settings', true]);
    }
  });

  it('takes blanks as null and as "", and a real 0 as 0', async () => {
    for (const blank of [null, '']) {
      const { value } = await call('LATENT', [['water']], [['vaporization']], [[60], [blank]], {});
      expect((value as unknown[][])[1]?.[0]).toBe('');
      expect((await call('LATENT', [['water']], [['vaporization']], [[blank]], {})).error?.message).toMatch(
        /blank cell/,
      );
    }
    const { error } = await call('LATENT', [['water']], [['vaporization']], [[0]], {});
    expect(error).toBeUndefined(); // supercooled by 0.01 K and marked, not refused as a blank
  });

  it('tells a real 0 degC from a blank that came as 0', async () => {
    await page.evaluate(() =>
      Latentry.setBlankReader((address) => Promise.resolve(address === 'S!A1:A2' ? [[false], [true]] : [[true]])),
    );
    const range = await call('SATPRESSURE', [['water']], [[0], [0]], null, { parameterAddresses: [null, 'S!A1:A2'] });
    const spill = range.value as unknown[][];
    expect(spill[0]?.[0]).toBeTypeOf('number');
    expect(spill[1]?.[0]).toBe('');
    const scalar = await call('SATPRESSURE', [['water']], [[0]], null, { parameterAddresses: [null, 'S!A2'] });
    expect(scalar.error).toMatchObject({ code: '#VALUE!', own: true });
    await page.evaluate(() => Latentry.setBlankReader(undefined));
  });

  it('finds the invocation where an older functions.json leaves it', async () => {
    for (const tail of [
      [{ functionName: 'LATENT' }],
      [null, { functionName: 'LATENT' }],
      [[], { functionName: 'LATENT' }],
    ]) {
      const { value } = await call('LATENT', [['water']], [['vaporization']], [[60]], ...tail);
      expect(Math.abs(((value as number[][])[0]?.[0] ?? NaN) - 2357.65)).toBeLessThan(0.005); // IAPWS R6-95, last printed digit
    }
    const short = await call('LATENT', [['water']], [['fusion']], { functionName: 'LATENT' });
    expect(short.error).toBeUndefined();
  });

  it("throws the platform's own error class with words, and puts it inside spills", async () => {
    const thrown = await call('LATENT', [['wate']], [['vaporization']], [[60]], {});
    expect(thrown.error).toMatchObject({ code: '#VALUE!', own: true });
    expect(thrown.error?.message).toMatch(/nearest: water/);
    const spill = await call('LATENT', [['water']], [['vaporization']], [[60], [900]], {});
    expect((spill.value as { code: string }[][])[1]?.[0]).toMatchObject({ code: '#N/A' });
  });

  it('waits for unread settings and answers when they come', async () => {
    await page.evaluate(() => {
      Latentry.settings.publish({ state: 'unread' });
      setTimeout(() => Latentry.settings.publish({ state: 'absent' }), 50);
    });
    const { value } = await call('LATENT', [['water']], [['vaporization']], [[60]], {});
    expect(Math.abs(((value as number[][])[0]?.[0] ?? NaN) - 2357.65)).toBeLessThan(0.005); // IAPWS R6-95, last printed digit
  });
});
