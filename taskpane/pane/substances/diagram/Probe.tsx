import { useId } from 'react';
import { onScale, type UnitWriter } from '../facts/unitWriter';
import type { Crossing } from './crossings';
import { pixelX, pixelY, type Frame } from './frame';

export interface ProbeProps {
  readonly frame: Frame;
  readonly writer: UnitWriter;
  readonly temperatureK: number;
  readonly crossings: readonly Crossing[];
}

/** Half the length of the mark that shows a slope, pixels. */
const HALF_TANGENT = 20;

/** The line of one temperature: a dot with its slope on every curve, brackets between neighbours. */
export function Probe({ frame, writer, temperatureK, crossings }: ProbeProps) {
  const clip = useId();
  const { temperature, heat } = writer;
  const x = pixelX(frame, onScale(temperatureK, temperature));
  const dots = crossings.map((crossing) => ({ ...crossing, y: pixelY(frame, onScale(crossing.enthalpy, heat)) }));
  const brackets = dots.slice(1).map((upper, i) => {
    const lower = dots[i] ?? upper;
    return { from: lower.y, to: upper.y };
  });
  const tangent = (slope: number) => {
    const perPixel = (frame.xTo - frame.xFrom) / (frame.width - frame.left - frame.right);
    const rise = ((slope * heat.scale) / temperature.scale) * perPixel;
    const down = (rise / (frame.yTo - frame.yFrom)) * (frame.height - frame.top - frame.bottom);
    const half = HALF_TANGENT / Math.hypot(1, down);
    return { x: half, y: half * down };
  };
  return (
    <g clipPath={`url(#${clip})`}>
      <clipPath id={clip}>
        <rect
          x={frame.left - 7}
          y={0}
          width={frame.width - frame.left - frame.right + 14}
          height={frame.height - frame.bottom + 7}
        />
      </clipPath>
      <line
        x1={x}
        x2={x}
        y1={frame.top}
        y2={frame.height - frame.bottom}
        stroke="var(--plotAxis)"
        strokeWidth={1}
        strokeDasharray="1 3"
      />
      {brackets.map(({ from, to }, i) => (
        <line key={i} x1={x} x2={x} y1={from} y2={to} stroke="var(--plotLine)" strokeWidth={1.6} />
      ))}
      {dots.map(({ name, y, slope, stable }) => {
        const way = slope === undefined ? undefined : tangent(slope);
        return (
          <g key={name}>
            {way !== undefined && (
              <line
                x1={x - way.x}
                y1={y + way.y}
                x2={x + way.x}
                y2={y - way.y}
                stroke="var(--plotAxis)"
                strokeWidth={1.6}
                strokeLinecap="round"
              />
            )}
            <circle
              cx={x}
              cy={y}
              r={stable ? 5 : 4}
              fill={stable ? 'var(--plotLine)' : 'var(--paper)'}
              stroke="var(--plotAxis)"
              strokeWidth={1.4}
            />
          </g>
        );
      })}
    </g>
  );
}
