import { fileProblem } from './fileProblem';
import type { FileLimits } from './limits';

/** One part as it stands packed in the file. */
export interface ZipEntry {
  readonly name: string;
  /** 0 stored, 8 deflated. */
  readonly method: number;
  readonly crc: number;
  readonly size: number;
  /** MS-DOS date in the high half, time in the low half. */
  readonly stamp: number;
  readonly packed: Uint8Array;
}

const SIGNATURE = { end: 0x06054b50, central: 0x02014b50, local: 0x04034b50, end64: 0x06064b50, locator64: 0x07064b50 };
const FULL16 = 0xffff;
const FULL32 = 0xffffffff;

const damaged = (what: string) => fileProblem('a whole .xlsx workbook', what);

/**
 * Reads the directory of a zip package and hands out its parts still packed. Nothing is unpacked here: sizes, places
 * and overlaps are checked first, against the bytes and the limits.
 *
 * @param bytes - the file
 * @param limits - what a file may cost
 * @returns the parts in the order of the directory
 * @throws Problem for a file that is no zip package, cut short, encrypted, overlapping or over a limit
 * @see PKWARE, .ZIP File Format Specification (APPNOTE.TXT), 4.3 and 4.5.3
 */
export function readZipDirectory(bytes: Uint8Array, limits: FileLimits): ZipEntry[] {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const directory = findDirectory(view);
  if (directory.count > limits.parts) throw fileProblem(`at most ${limits.parts} parts`, `${directory.count} parts`);
  const entries: ZipEntry[] = [];
  const spans: { from: number; to: number }[] = [];
  const seen = new Set<string>();
  let total = 0;
  let at = directory.start;
  for (let i = 0; i < directory.count; i++) {
    if (at + 46 > directory.end || view.getUint32(at, true) !== SIGNATURE.central)
      throw damaged('a damaged list of parts');
    const nameLength = view.getUint16(at + 28, true);
    const extraLength = view.getUint16(at + 30, true);
    const next = at + 46 + nameLength + extraLength + view.getUint16(at + 32, true);
    if (next > directory.end) throw damaged('a damaged list of parts');
    const name = new TextDecoder()
      .decode(bytes.subarray(at + 46, at + 46 + nameLength))
      .replace(/\\/g, '/')
      .replace(/^\/+/, '');
    const { size, packedSize, offset } = sizesOf(view, at, at + 46 + nameLength, extraLength);
    if ((view.getUint16(at + 8, true) & 1) !== 0)
      throw fileProblem('a workbook without a password', 'an encrypted package');
    if (size > limits.partBytes) throw tooLarge(`${limits.partBytes} bytes in one part`, `${size} bytes in ${name}`);
    if (size > limits.ratioFromBytes && size > limits.ratio * Math.max(packedSize, 1)) {
      throw fileProblem(
        `parts packed at most ${limits.ratio} to 1`,
        `${name} packed ${Math.round(size / Math.max(packedSize, 1))} to 1`,
      );
    }
    total += size;
    if (total > limits.totalBytes)
      throw tooLarge(`${limits.totalBytes} bytes unpacked`, 'a package that unpacks to more');
    const from = dataStart(view, offset, directory.start);
    if (from + packedSize > directory.start) throw damaged(`a file cut short in ${name}`);
    spans.push({ from: offset, to: from + packedSize });
    if (seen.has(name.toLowerCase())) throw damaged(`${name} more than once`);
    seen.add(name.toLowerCase());
    if (!name.endsWith('/')) {
      entries.push({
        name,
        method: view.getUint16(at + 10, true),
        crc: view.getUint32(at + 16, true),
        size,
        stamp: view.getUint32(at + 12, true),
        packed: bytes.subarray(from, from + packedSize),
      });
    }
    at = next;
  }
  refuseOverlaps(spans);
  return entries;
}

const tooLarge = (allowed: string, received: string) => fileProblem(`at most ${allowed}`, received);

function findDirectory(view: DataView): { count: number; start: number; end: number } {
  const oldest = Math.max(0, view.byteLength - 22 - FULL16);
  for (let at = view.byteLength - 22; at >= oldest; at--) {
    if (view.getUint32(at, true) !== SIGNATURE.end) continue;
    const count = view.getUint16(at + 10, true);
    const start = view.getUint32(at + 16, true);
    const place = count === FULL16 || start === FULL32 ? directory64(view, at) : { count, start, end: at };
    if (place.start > place.end) throw damaged('a file cut short or joined to another');
    return place;
  }
  const zip = view.byteLength >= 4 && view.getUint32(0, true) === SIGNATURE.local;
  if (zip) throw damaged('a file cut short');
  throw fileProblem('an .xlsx workbook', view.byteLength === 0 ? 'an empty file' : 'a file that is not a zip package');
}

function directory64(view: DataView, end: number): { count: number; start: number; end: number } {
  const locator = end - 20;
  if (locator < 0 || view.getUint32(locator, true) !== SIGNATURE.locator64) throw damaged('a damaged list of parts');
  const at = Number(view.getBigUint64(locator + 8, true));
  if (at + 56 > locator || view.getUint32(at, true) !== SIGNATURE.end64) throw damaged('a damaged list of parts');
  return {
    count: Number(view.getBigUint64(at + 32, true)),
    start: Number(view.getBigUint64(at + 48, true)),
    end: at,
  };
}

function sizesOf(view: DataView, at: number, extra: number, extraLength: number) {
  let packedSize = view.getUint32(at + 20, true);
  let size = view.getUint32(at + 24, true);
  let offset = view.getUint32(at + 42, true);
  for (let field = extra; field + 4 <= extra + extraLength;) {
    const length = view.getUint16(field + 2, true);
    if (view.getUint16(field, true) === 1) {
      let place = field + 4;
      const wide = (value: number) => {
        if (value !== FULL32) return value;
        if (place + 8 > field + 4 + length) throw damaged('a damaged list of parts');
        place += 8;
        return Number(view.getBigUint64(place - 8, true));
      };
      size = wide(size);
      packedSize = wide(packedSize);
      offset = wide(offset);
    }
    field += 4 + length;
  }
  return { packedSize, size, offset };
}

function dataStart(view: DataView, offset: number, end: number): number {
  if (offset + 30 > end || view.getUint32(offset, true) !== SIGNATURE.local)
    throw damaged('a file cut short or damaged');
  return offset + 30 + view.getUint16(offset + 26, true) + view.getUint16(offset + 28, true);
}

function refuseOverlaps(spans: { from: number; to: number }[]): void {
  spans.sort((a, b) => a.from - b.from);
  for (let i = 1; i < spans.length; i++) {
    if ((spans[i]?.from ?? 0) < (spans[i - 1]?.to ?? 0)) throw damaged('parts that overlap');
  }
}
