import { describe, expect, it } from 'vitest';
import { FakeExcel } from './fakeExcel';
import { MemoryWorkbook } from '../memoryWorkbook';

/** The fake is only worth something if it fails where Excel would. */
describe('the fake Excel', () => {
  const run = (batch: (context: Excel.RequestContext) => Promise<unknown>) => {
    const { Excel: fake } = new FakeExcel(new MemoryWorkbook()).globals() as { Excel: typeof Excel };
    return fake.run(batch);
  };

  it('fails when a property is read before it was loaded', async () => {
    await expect(
      run(async (context) => {
        const range = context.workbook.worksheets.getItem('Sheet1').getRange('A1');
        await context.sync();
        return range.values;
      }),
    ).rejects.toThrow('Range.values was read before load and sync');
  });

  it('fails when a property is read between load and sync', async () => {
    await expect(
      run((context) => {
        const range = context.workbook.worksheets.getItem('Sheet1').getRange('A1').load('values');
        return Promise.resolve(range.values);
      }),
    ).rejects.toThrow('before load and sync');
  });

  it('fails on members and properties that are not there', async () => {
    const range = (context: Excel.RequestContext) => context.workbook.worksheets.getItem('Sheet1').getRange('A1');
    await expect(run((context) => Promise.resolve(range(context).load('valeus')))).rejects.toThrow('no property');
    await expect(
      run((context) => Promise.resolve((range(context) as unknown as { paint: unknown }).paint)),
    ).rejects.toThrow('no member "paint"');
  });

  it('fails at sync on a sheet that is not there, and on values in another shape', async () => {
    await expect(
      run(async (context) => {
        context.workbook.worksheets.getItem('Nowhere');
        await context.sync();
      }),
    ).rejects.toMatchObject({ code: 'ItemNotFound' });
    await expect(
      run(async (context) => {
        context.workbook.worksheets.getItem('Sheet1').getRange('A1:A2').formulas = [[1]];
        await context.sync();
      }),
    ).rejects.toMatchObject({ code: 'InvalidArgument' });
  });
});
