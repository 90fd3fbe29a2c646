// Draws the icons anew from the mark: node manifest/icons/drawIcons.mjs
import { writeFileSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { COLOURS, CORNER, STROKES } from './mark.mjs';
import { png } from './png.mjs';

export const SIZES = [16, 32, 64, 80, 128];
const SAMPLES = 4;

const rgb = (hex) => [1, 3, 5].map((at) => Number.parseInt(hex.slice(at, at + 2), 16));

function distance(x, y, [x1, y1], [x2, y2]) {
  const [dx, dy] = [x2 - x1, y2 - y1];
  const length2 = dx * dx + dy * dy;
  const t = length2 === 0 ? 0 : Math.min(1, Math.max(0, ((x - x1) * dx + (y - y1) * dy) / length2));
  return Math.hypot(x - x1 - t * dx, y - y1 - t * dy);
}

function inGround(x, y) {
  const cx = Math.min(Math.max(x, CORNER), 1 - CORNER);
  const cy = Math.min(Math.max(y, CORNER), 1 - CORNER);
  return Math.hypot(x - cx, y - cy) <= CORNER;
}

function colourAt(x, y) {
  if (!inGround(x, y)) return null;
  for (const { points, half, colour } of [...STROKES].reverse()) {
    for (let i = 1; i < points.length; i += 1) {
      if (distance(x, y, points[i - 1], points[i]) <= half) return rgb(colour);
    }
  }
  return rgb(COLOURS.ground);
}

/** The picture of one size as bytes, each pixel the mean of its samples. */
export function drawMark(size) {
  const rgba = new Uint8Array(size * size * 4);
  for (let py = 0; py < size; py += 1) {
    for (let px = 0; px < size; px += 1) {
      const sum = [0, 0, 0];
      let hits = 0;
      for (let s = 0; s < SAMPLES * SAMPLES; s += 1) {
        const x = (px + ((s % SAMPLES) + 0.5) / SAMPLES) / size;
        const y = (py + (Math.floor(s / SAMPLES) + 0.5) / SAMPLES) / size;
        const colour = colourAt(x, y);
        if (colour === null) continue;
        hits += 1;
        for (let k = 0; k < 3; k += 1) sum[k] += colour[k];
      }
      const at = (py * size + px) * 4;
      if (hits === 0) continue;
      for (let k = 0; k < 3; k += 1) rgba[at + k] = Math.round(sum[k] / hits);
      rgba[at + 3] = Math.round((255 * hits) / (SAMPLES * SAMPLES));
    }
  }
  return rgba;
}

/** The same mark as SVG. */
export function markSvg() {
  const n = (value) => Number((value * 128).toFixed(2));
  const lines = STROKES.map(({ points, half, colour }) => {
    const d = points.map(([x, y], i) => `${i === 0 ? 'M' : 'L'}${n(x)} ${n(y)}`).join('');
    return `<path d="${d}" stroke="${colour}" stroke-width="${n(2 * half)}"/>`;
  });
  return `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 128 128"><rect width="128" height="128" rx="${n(CORNER)}" fill="${COLOURS.ground}"/><g fill="none" stroke-linecap="round" stroke-linejoin="round">${lines.join('')}</g></svg>\n`;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const here = path.dirname(fileURLToPath(import.meta.url));
  for (const size of SIZES) writeFileSync(path.join(here, `icon-${size}.png`), png(size, drawMark(size)));
  writeFileSync(path.join(here, 'mark.svg'), markSvg());
}
