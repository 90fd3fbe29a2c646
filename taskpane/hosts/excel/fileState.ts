import { runExcel } from './runExcel';

/** A small text kept in the workbook's settings part. */
export async function fileState(key: string, value?: string): Promise<string | null> {
  return runExcel(async (context) => {
    const { settings } = context.workbook;
    const name = `latentry.${key}`;
    if (value !== undefined) {
      settings.add(name, value);
      await context.sync();
      return value;
    }
    const item = settings.getItemOrNullObject(name).load('value');
    await context.sync();
    return item.isNullObject ? null : String(item.value);
  });
}
