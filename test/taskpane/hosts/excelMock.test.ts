import { OfficeMockObject } from 'office-addin-mock';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { fileState } from '../../../taskpane/hosts/excel/fileState';
import { runExcel } from '../../../taskpane/hosts/excel/runExcel';
import { selectedRef } from '../../../taskpane/hosts/excel/selectedRef';

/** An unloaded property of the mock reads as this text instead of failing. */
const UNLOADED = /Error, /;

function mockExcel(workbook: object): void {
  const shape: object = { workbook };
  const context = new OfficeMockObject(shape, 'excel' as never);
  vi.stubGlobal('Excel', { run: (_: unknown, batch: (c: unknown) => Promise<unknown>) => batch(context) });
}

interface WithSetting {
  setting: unknown;
  noSetting: unknown;
}

describe('the Excel host over the published Office mock', () => {
  afterEach(() => {
    vi.unstubAllGlobals();
  });

  it('loads and syncs before it reads a setting', async () => {
    const added: [string, string][] = [];
    mockExcel({
      settings: {
        setting: { value: 'abc', isNullObject: false },
        noSetting: { value: '', isNullObject: true },
        getItemOrNullObject: function (this: WithSetting, key: string) {
          const item = (key === 'latentry.stamp' ? this.setting : this.noSetting) as OfficeMockObject;
          item.load('isNullObject');
          return item;
        },
        add: (key: string, value: string) => added.push([key, value]),
      },
    });
    const value = await fileState('stamp');
    expect(value).not.toMatch(UNLOADED);
    expect(value).toBe('abc');
    expect(await fileState('other')).toBeNull();
    expect(await fileState('stamp', 'new')).toBe('new');
    expect(added).toEqual([['latentry.stamp', 'new']]);
  });

  it('loads and syncs before it reads the selection', async () => {
    mockExcel({
      range: { address: 'Data!B2:C9', isEntireColumn: false, isEntireRow: false },
      getSelectedRange: function (this: { range: unknown }) {
        return this.range;
      },
    });
    expect(await runExcel(selectedRef)).toEqual({ sheet: 'Data', address: 'B2:C9' });
  });

  it('would show a forgotten load: the mock gives its error text', async () => {
    mockExcel({
      range: { address: 'Data!B2:C9' },
      getSelectedRange: function (this: { range: unknown }) {
        return this.range;
      },
    });
    const read = await runExcel(async (context) => {
      const range = context.workbook.getSelectedRange();
      await context.sync();
      return range.address;
    });
    expect(read).toMatch(UNLOADED);
  });
});
