import { readFileSync } from 'node:fs';
import path from 'node:path';
import { inflateSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';
import { drawMark, markSvg, SIZES } from '../../manifest/icons/drawIcons.mjs';
import { nodesAt, xmlTree } from './xmlTree';

const folder = path.resolve(import.meta.dirname, '../../manifest');

/** Pixels of an eight-bit RGBA picture whose rows use no filter, as ours do. */
function readPng(file: string): { width: number; height: number; rgba: Buffer } {
  const bytes = readFileSync(file);
  // Signature and chunk layout: W3C, Portable Network Graphics (PNG) Specification, 5.2 and 5.3.
  expect(bytes.subarray(0, 8)).toEqual(Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]));
  const width = bytes.readUInt32BE(16);
  const height = bytes.readUInt32BE(20);
  const data: Buffer[] = [];
  for (let at = 8; at < bytes.length;) {
    const length = bytes.readUInt32BE(at);
    if (bytes.toString('latin1', at + 4, at + 8) === 'IDAT') data.push(bytes.subarray(at + 8, at + 8 + length));
    at += 12 + length;
  }
  const rows = inflateSync(Buffer.concat(data));
  const stride = width * 4;
  const rgba = Buffer.concat(
    Array.from({ length: height }, (_, y) => rows.subarray(y * (stride + 1) + 1, (y + 1) * (stride + 1))),
  );
  return { width, height, rgba };
}

describe('icons', () => {
  it.each(SIZES)('of %i px has that size and is the mark as drawn', (size) => {
    const { width, height, rgba } = readPng(path.join(folder, `icons/icon-${size}.png`));
    expect([width, height]).toEqual([size, size]);
    expect(rgba.equals(drawMark(size))).toBe(true);
  });

  it('shows ground, curves and gap, with clear corners', () => {
    const { width, rgba } = readPng(path.join(folder, 'icons/icon-128.png'));
    const at = (x: number, y: number) => [...rgba.subarray((y * width + x) * 4, (y * width + x) * 4 + 4)];
    expect(at(0, 0)[3]).toBe(0);
    expect(at(64, 8)).toEqual([0x12, 0x33, 0x3f, 255]);
    expect(at(46, 64)).toEqual([0xf2, 0xb4, 0x41, 255]);
  });

  it('has the same mark as SVG', () => {
    expect(readFileSync(path.join(folder, 'icons/mark.svg'), 'utf8')).toBe(markSvg());
  });

  it('is named in the manifest with its true size', () => {
    const manifest = xmlTree(readFileSync(path.join(folder, 'manifest.xml'), 'utf8'));
    const urls = new Map(
      nodesAt(manifest, '**/bt:Images/bt:Image').map(({ attributes }) => [attributes.id, attributes.DefaultValue]),
    );
    const used = nodesAt(manifest, '**/Icon/bt:Image');
    expect(used.length).toBeGreaterThan(0);
    for (const { attributes } of used) {
      expect(urls.get(attributes.resid)).toBe(`https://localhost:3000/icons/icon-${attributes.size}.png`);
      expect(SIZES).toContain(Number(attributes.size));
    }
    // Sizes of the two pictures in the list of add-ins: documentation of IconUrl and HighResolutionIconUrl.
    expect(nodesAt(manifest, 'IconUrl')[0]?.attributes.DefaultValue).toMatch(/icon-32\.png$/);
    expect(nodesAt(manifest, 'HighResolutionIconUrl')[0]?.attributes.DefaultValue).toMatch(/icon-64\.png$/);
  });
});
