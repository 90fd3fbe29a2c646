/** A file that a person chose or dropped. */
export interface PickedFile {
  readonly name: string;
  readonly bytes: Uint8Array;
}

/** Asks for a file; null when the person chose none. */
export function pickFile(input: HTMLInputElement): Promise<PickedFile | null> {
  return new Promise((resolve, reject) => {
    input.value = '';
    input.onchange = () => {
      const file = input.files?.[0];
      if (file === undefined) resolve(null);
      else pickedFile(file).then(resolve, reject);
    };
    input.oncancel = () => resolve(null);
    input.click();
  });
}

/** Reads a file from disk. */
export async function pickedFile(file: File): Promise<PickedFile> {
  return { name: file.name, bytes: new Uint8Array(await file.arrayBuffer()) };
}
