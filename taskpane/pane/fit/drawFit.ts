import { number } from '../look/number';
import { areaY, dot, line, plot, ruleX, ruleY } from '@observablehq/plot';

export interface DrawnPoint {
  readonly x: number;
  readonly y: number;
  readonly residual: number;
}

export interface BandPoint {
  readonly x: number;
  readonly y: number;
  readonly low: number;
  readonly high: number;
}

export interface FitPicture {
  readonly points: readonly DrawnPoint[];
  readonly band: readonly BandPoint[];
  readonly xLabel: string;
  readonly yLabel: string;
  readonly width: number;
  /** What a person who cannot see the picture is told. */
  readonly words: string;
}

const style = {
  background: 'transparent',
  color: 'var(--plotAxis)',
  fontFamily: 'inherit',
  fontSize: '12px',
  overflow: 'visible',
  maxWidth: '100%',
};

/** One picture with one name: groups inside it may not carry names of their own. */
const image = (svg: SVGSVGElement | HTMLElement, words: string) => {
  for (const group of svg.querySelectorAll('[aria-label]')) group.removeAttribute('aria-label');
  svg.setAttribute('role', 'img');
  svg.setAttribute('aria-label', words);
  return svg;
};

/** Draws the points with line and band, and the strip of residuals below; both share one temperature axis. */
export function drawFit({ points, band, xLabel, yLabel, width, words }: FitPicture): (SVGSVGElement | HTMLElement)[] {
  const tickFormat = (value: number) => number(value);
  const x = { label: null, nice: false, inset: 6, tickFormat, ticks: Math.max(3, Math.floor(width / 70)) } as const;
  const shared = { width, marginLeft: 54, marginRight: 8, style } as const;
  const radius = points.length > 400 ? 1.3 : 3;
  const mark = {
    x: 'x',
    r: radius,
    fill: 'var(--plotPoint)',
    stroke: 'var(--paper)',
    strokeWidth: radius > 2 ? 0.8 : 0,
  } as const;
  const top = plot({
    ...shared,
    height: 220,
    marginTop: 24,
    marginBottom: 22,
    x,
    y: { label: yLabel, tickFormat, labelArrow: 'none', grid: true, ticks: 5, inset: 4, labelAnchor: 'top' },
    marks: [
      areaY(band, { x: 'x', y1: 'low', y2: 'high', fill: 'var(--plotBand)' }),
      line(band, { x: 'x', y: 'y', stroke: 'var(--plotLine)', strokeWidth: 2 }),
      dot(points, { ...mark, y: 'y' }),
    ],
  });
  const strip = plot({
    ...shared,
    height: 116,
    marginTop: 24,
    marginBottom: 36,
    x: { ...x, label: xLabel, labelArrow: 'none', labelAnchor: 'center' },
    y: {
      label: 'residual, same unit',
      tickFormat,
      labelArrow: 'none',
      grid: true,
      ticks: 3,
      inset: 4,
      labelAnchor: 'top',
    },
    marks: [
      ruleY([0], { stroke: 'var(--plotLine)', strokeWidth: 1.5 }),
      ruleX(points, {
        x: 'x',
        y1: 0,
        y2: 'residual',
        stroke: 'var(--plotPoint)',
        strokeOpacity: points.length > 400 ? 0 : 0.5,
      }),
      dot(points, { ...mark, y: 'residual' }),
    ],
  });
  return [image(top, words), image(strip, 'Residuals of the same points against temperature')];
}
