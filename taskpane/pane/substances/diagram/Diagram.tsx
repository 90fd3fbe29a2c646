import { makeStyles, tokens } from '@fluentui/react-components';
import { useEffect, useMemo, useRef, useState, type PointerEvent } from 'react';
import { useLook } from '../../look/useLook';
import { onScale, type UnitWriter } from '../facts/unitWriter';
import type { Crossing } from './crossings';
import type { Diagram as DiagramData } from './diagramOf';
import { diagramWords } from './diagramWords';
import { drawnPixels } from './drawnPixels';
import { DIAGRAM_HEIGHT, frameOf, pixelX, valueAtX, type Frame } from './frame';
import { Labels } from './Labels';
import { labelsOf } from './labelsOf';
import { onStep } from './niceStep';
import { Probe } from './Probe';
import { probeLabels } from './probeLabels';
import { useWidth } from '../../look/useWidth';

export interface DiagramProps {
  readonly name: string;
  readonly diagram: DiagramData;
  readonly crossings: readonly Crossing[];
  readonly writer: UnitWriter;
  readonly temperatureK: number;
  /** Step of the temperature in the workbook's unit. */
  readonly step: number;
  readonly onTemperature: (temperatureK: number) => void;
}

const useStyles = makeStyles({
  frame: {
    position: 'relative',
    minHeight: `${DIAGRAM_HEIGHT}px`,
    minWidth: 0,
    touchAction: 'pan-y',
    userSelect: 'none',
  },
  drawn: { cursor: 'ew-resize', ':hover': { outline: `1px solid ${tokens.colorNeutralStroke2}` } },
});

/** This near to a transition, pixels, a drag takes the transition itself. */
const CATCH = 4;

/** The enthalpy-temperature diagram with its movable temperature; the drawing code is fetched with the first card. */
export function Diagram({ name, diagram, crossings, writer, temperatureK, step, onTemperature }: DiagramProps) {
  const look = useLook();
  const styles = useStyles();
  const box = useRef<HTMLDivElement>(null);
  const picture = useRef<HTMLDivElement>(null);
  const width = useWidth(box);
  const [failed, setFailed] = useState(false);
  const frame = useMemo(() => (width === 0 ? undefined : frameIn(diagram, width, writer)), [diagram, width, writer]);
  const labels = useMemo(() => (frame === undefined ? [] : labelsOf(diagram, frame, writer)), [diagram, frame, writer]);
  useEffect(() => {
    if (frame === undefined) return undefined;
    let current = true;
    const words = diagramWords(name, diagram, writer);
    import('./drawDiagram').then(
      ({ drawDiagram }) => {
        if (current) picture.current?.replaceChildren(drawDiagram({ diagram, frame, writer, words }));
      },
      () => {
        if (current) setFailed(true);
      },
    );
    return () => {
      current = false;
    };
  }, [name, diagram, frame, writer]);

  const drawn = useMemo(
    () => (frame === undefined ? [] : drawnPixels(diagram, frame, writer)),
    [diagram, frame, writer],
  );
  const numbers = useMemo(
    () => (frame === undefined ? [] : probeLabels(frame, crossings, temperatureK, writer, labels, drawn)),
    [frame, crossings, temperatureK, writer, labels, drawn],
  );

  const move = (event: PointerEvent<HTMLDivElement>) => {
    if (frame === undefined || !event.currentTarget.hasPointerCapture(event.pointerId)) return;
    onTemperature(temperatureAt(event.clientX - event.currentTarget.getBoundingClientRect().left));
  };
  const temperatureAt = (pixel: number): number => {
    if (frame === undefined) return temperatureK;
    const near = diagram.gaps.find(
      (gap) => Math.abs(pixelX(frame, onScale(gap.temperatureK, writer.temperature)) - pixel) <= CATCH,
    );
    if (near !== undefined) return near.temperatureK;
    const { scale, offset } = writer.temperature;
    const held = (onStep(valueAtX(frame, pixel), step) - offset) / scale;
    return Math.min(diagram.window.toK, Math.max(diagram.window.fromK, held));
  };
  const { fromK, toK } = diagram.window;
  return (
    <>
      <div
        ref={box}
        className={`${styles.frame} ${frame === undefined ? '' : styles.drawn}`}
        data-testid="diagram"
        onPointerDown={(event) => {
          if (event.button !== 0) return;
          event.currentTarget.setPointerCapture(event.pointerId);
          move(event);
        }}
        onPointerMove={move}
      >
        <div ref={picture} />
        {frame !== undefined && (
          <svg
            width={frame.width}
            height={frame.height}
            aria-hidden="true"
            focusable="false"
            style={{ position: 'absolute', inset: 0, overflow: 'visible', pointerEvents: 'none' }}
          >
            {temperatureK >= fromK && temperatureK <= toK && (
              <Probe frame={frame} writer={writer} temperatureK={temperatureK} crossings={crossings} />
            )}
            <Labels labels={[...labels, ...numbers]} />
          </svg>
        )}
      </div>
      {failed && <p className={look.quiet}>The picture could not be loaded. The table below holds the same numbers.</p>}
    </>
  );
}

function frameIn(diagram: DiagramData, width: number, { temperature, heat }: UnitWriter): Frame {
  return frameOf(diagram, width, {
    x: (kelvin) => onScale(kelvin, temperature),
    y: (enthalpy) => onScale(enthalpy, heat),
  });
}
