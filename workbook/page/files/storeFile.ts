const TYPE = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

interface Writable {
  write(data: Blob): Promise<void>;
  close(): Promise<void>;
}

interface FileHandle {
  readonly name: string;
  createWritable(): Promise<Writable>;
}

type Picker = (options: object) => Promise<FileHandle>;

/** Where a file went; null when the person called it off. */
export type Stored = { readonly name: string } | null;

/** Saves a file where the person says; where the browser has no such dialogue, among the downloads. */
export async function storeFile(name: string, bytes: Uint8Array): Promise<Stored> {
  const blob = new Blob([bytes as Uint8Array<ArrayBuffer>], { type: TYPE });
  const picker = (globalThis as { showSaveFilePicker?: Picker }).showSaveFilePicker;
  if (picker === undefined) {
    download(name, blob);
    return { name };
  }
  try {
    const types = [{ description: 'Workbook', accept: { [TYPE]: ['.xlsx'] } }];
    const handle = await picker({ suggestedName: name, types });
    const writable = await handle.createWritable();
    await writable.write(blob);
    await writable.close();
    return { name: handle.name };
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') return null;
    throw error;
  }
}

function download(name: string, blob: Blob): void {
  const link = document.createElement('a');
  link.href = URL.createObjectURL(blob);
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(link.href), 60_000);
}
