const table = new Uint32Array(256);
for (let n = 0; n < 256; n++) {
  let c = n;
  for (let k = 0; k < 8; k++) c = c & 1 ? 0xedb88320 ^ (c >>> 1) : c >>> 1;
  table[n] = c;
}

/**
 * The check sum of zip packages: CRC-32 of ISO 3309, polynomial 0xEDB88320 reflected.
 *
 * @param bytes - the data
 * @returns an unsigned 32-bit integer
 * @example
 * crc32(new TextEncoder().encode('123456789')) // => 0xcbf43926
 */
export function crc32(bytes: Uint8Array): number {
  let crc = 0xffffffff;
  // Counted, not iterated: an iterator costs several times the work on each byte.
  for (let at = 0; at < bytes.length; at++) crc = (table[(crc ^ (bytes[at] ?? 0)) & 0xff] ?? 0) ^ (crc >>> 8);
  return (crc ^ 0xffffffff) >>> 0;
}
