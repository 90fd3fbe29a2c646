/** Whether the workbook starts the add-in when it opens; with `on` given, sets it first. */
export async function startupBehavior(on?: boolean): Promise<boolean> {
  if (on !== undefined) {
    await Office.addin.setStartupBehavior(on ? Office.StartupBehavior.load : Office.StartupBehavior.none);
  }
  return (await Office.addin.getStartupBehavior()) === Office.StartupBehavior.load;
}
