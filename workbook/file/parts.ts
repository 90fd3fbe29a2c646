import { fileProblem } from './fileProblem';
import { inflatePart } from './inflatePart';
import { DEFAULT_LIMITS, type FileLimits } from './limits';
import { decodeXml } from './decodeXml';
import { type ZipEntry, readZipDirectory } from './zipDirectory';

/** The original parts of a package, still packed; what nobody asks for is never unpacked. */
export interface Parts {
  readonly entries: readonly ZipEntry[];
  has(name: string): boolean;
  bytes(name: string): Uint8Array;
  /** The part as text; an absent one is `''`. */
  text(name: string): string;
}

/**
 * Opens a file as a package.
 *
 * @param bytes - the file
 * @param limits - what it may cost
 * @throws Problem for a file over the size limit, encrypted, not a package, cut short, or over a limit inside
 */
export function openParts(bytes: Uint8Array, limits: FileLimits = DEFAULT_LIMITS): Parts {
  if (bytes.length > limits.fileBytes) {
    throw fileProblem(`at most ${limits.fileBytes} bytes`, `${bytes.length} bytes`);
  }
  if (bytes[0] === 0xd0 && bytes[1] === 0xcf && bytes[2] === 0x11 && bytes[3] === 0xe0) {
    throw fileProblem(
      'an .xlsx workbook without a password',
      'an encrypted workbook, or one in the older binary format',
    );
  }
  const entries = readZipDirectory(bytes, limits);
  const byName = new Map(entries.map((entry) => [entry.name.toLowerCase(), entry]));
  const find = (name: string) => byName.get(name.toLowerCase());
  return {
    entries,
    has: (name) => find(name) !== undefined,
    bytes: (name) => {
      const entry = find(name);
      if (entry === undefined) throw fileProblem('a whole .xlsx workbook', 'a package without this part', name);
      return inflatePart(entry);
    },
    text: (name) => {
      const entry = find(name);
      return entry === undefined ? '' : decodeXml(inflatePart(entry));
    },
  };
}
