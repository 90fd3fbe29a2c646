import { Inflate } from 'fflate';
import { crc32 } from './crc32';
import { fileProblem } from './fileProblem';
import type { ZipEntry } from './zipDirectory';

const CHUNK = 64 * 1024;

/**
 * Unpacks one part in a stream, never further than the size that the directory states, which was held against the
 * limits before.
 *
 * @param entry - a part from `readZipDirectory`
 * @returns its bytes, checked against their CRC-32
 * @throws Problem where the part is damaged, packed in an unknown way, or larger than it says
 */
export function inflatePart(entry: ZipEntry): Uint8Array {
  const bytes = entry.method === 0 ? entry.packed : entry.method === 8 ? inflate(entry) : null;
  if (bytes === null) throw fileProblem('parts stored or deflated', `packing method ${entry.method}`, entry.name);
  if (bytes.length !== entry.size || crc32(bytes) !== entry.crc) throw damaged(entry);
  return bytes;
}

const damaged = (entry: ZipEntry) => fileProblem('a whole .xlsx workbook', 'a damaged part', entry.name);

function inflate(entry: ZipEntry): Uint8Array {
  const out = new Uint8Array(entry.size);
  let length = 0;
  const stream = new Inflate((chunk) => {
    if (length + chunk.length > out.length) throw fileProblem(`${entry.size} bytes as stated`, 'more', entry.name);
    out.set(chunk, length);
    length += chunk.length;
  });
  try {
    let at = 0;
    do {
      stream.push(entry.packed.subarray(at, at + CHUNK), at + CHUNK >= entry.packed.length);
      at += CHUNK;
    } while (at < entry.packed.length);
  } catch (error) {
    // The library throws plain errors for bad streams; the refusal above keeps its words.
    if (error instanceof Error && error.name === 'Problem') throw error;
    throw damaged(entry);
  }
  if (length !== out.length) throw damaged(entry);
  return out;
}
