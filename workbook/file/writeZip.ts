import { deflateSync } from 'fflate';
import { crc32 } from './crc32';
import type { ZipEntry } from './zipDirectory';

/** 1 January 1980, 0:00: the same book gives the same bytes on every day. */
const FIXED_STAMP = 0x00210000;

/** Packs one new part. */
export function packPart(name: string, content: Uint8Array): ZipEntry {
  const packed = deflateSync(content, { level: 6 });
  const deflated = packed.length < content.length;
  return {
    name,
    method: deflated ? 8 : 0,
    crc: crc32(content),
    size: content.length,
    stamp: FIXED_STAMP,
    packed: deflated ? packed : content,
  };
}

/**
 * Writes packed parts as a zip package; parts that came from another package keep their packed bytes.
 *
 * @param entries - the parts, in order
 * @returns the file
 * @see PKWARE, .ZIP File Format Specification (APPNOTE.TXT), 4.3
 */
export function writeZip(entries: readonly ZipEntry[]): Uint8Array {
  const names = entries.map((entry) => new TextEncoder().encode(entry.name));
  const nameBytes = names.reduce((sum, name) => sum + name.length, 0);
  const dataBytes = entries.reduce((sum, entry) => sum + entry.packed.length, 0);
  const out = new Uint8Array(dataBytes + 2 * nameBytes + 76 * entries.length + 22);
  const view = new DataView(out.buffer);
  const offsets: number[] = [];
  let at = 0;
  const common = (entry: ZipEntry, name: Uint8Array) => {
    view.setUint16(at, 20, true);
    view.setUint16(at + 2, 0x0800, true);
    view.setUint16(at + 4, entry.method, true);
    view.setUint32(at + 6, entry.stamp, true);
    view.setUint32(at + 10, entry.crc, true);
    view.setUint32(at + 14, entry.packed.length, true);
    view.setUint32(at + 18, entry.size, true);
    view.setUint16(at + 22, name.length, true);
    at += 26;
  };
  entries.forEach((entry, i) => {
    const name = names[i] ?? new Uint8Array();
    offsets.push(at);
    view.setUint32(at, 0x04034b50, true);
    at += 4;
    common(entry, name);
    out.set(name, at);
    out.set(entry.packed, at + name.length);
    at += name.length + entry.packed.length;
  });
  const start = at;
  entries.forEach((entry, i) => {
    const name = names[i] ?? new Uint8Array();
    view.setUint32(at, 0x02014b50, true);
    view.setUint16(at + 4, 20, true);
    at += 6;
    common(entry, name);
    // After the shared fields: extra, comment, disk, attributes (all zero), then the place of the part.
    view.setUint32(at + 10, offsets[i] ?? 0, true);
    at += 14;
    out.set(name, at);
    at += name.length;
  });
  view.setUint32(at, 0x06054b50, true);
  view.setUint16(at + 8, entries.length, true);
  view.setUint16(at + 10, entries.length, true);
  view.setUint32(at + 12, at - start, true);
  view.setUint32(at + 16, start, true);
  return out;
}
