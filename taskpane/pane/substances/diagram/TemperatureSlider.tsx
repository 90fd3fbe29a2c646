import { makeStyles, tokens } from '@fluentui/react-components';
import type { KeyboardEvent } from 'react';
import type { Window } from './temperatureWindow';
import { onScale, type Scale } from '../facts/unitWriter';
import { onStep } from './niceStep';

export interface TemperatureSliderProps {
  readonly window: Window;
  readonly temperatureK: number;
  readonly scale: Scale;
  readonly step: number;
  /** What the place means, read out with each move. */
  readonly words: string;
  readonly onTemperature: (temperatureK: number) => void;
}

const useStyles = makeStyles({
  slider: {
    display: 'block',
    boxSizing: 'border-box',
    // Under the frame of the diagram, so that the thumb stands below the line that it moves.
    width: 'calc(100% - 64px + 16px)',
    margin: '0 2px 0 46px',
    height: '24px',
    accentColor: tokens.colorCompoundBrandBackground,
    cursor: 'ew-resize',
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '1px' },
    '@media (forced-colors: active)': { accentColor: 'Highlight' },
  },
});

const STEPS: Readonly<Record<string, number>> = {
  ArrowRight: 1,
  ArrowUp: 1,
  ArrowLeft: -1,
  ArrowDown: -1,
  PageUp: 10,
  PageDown: -10,
};

/** The temperature as a slider: arrows move by a step, page keys by ten, Home and End to the edges of the diagram. */
export function TemperatureSlider({ window, temperatureK, scale, step, words, onTemperature }: TemperatureSliderProps) {
  const styles = useStyles();
  const kelvin = (shown: number) => Math.min(window.toK, Math.max(window.fromK, (shown - scale.offset) / scale.scale));
  const value = onScale(temperatureK, scale);
  const onKeyDown = (event: KeyboardEvent) => {
    const steps = STEPS[event.key];
    const next =
      event.key === 'Home'
        ? window.fromK
        : event.key === 'End'
          ? window.toK
          : steps === undefined
            ? undefined
            : kelvin(moved(value, steps, step));
    if (next === undefined) return;
    event.preventDefault();
    onTemperature(next);
  };
  return (
    <input
      type="range"
      className={styles.slider}
      aria-label="Temperature"
      aria-valuetext={words}
      min={onScale(window.fromK, scale)}
      max={onScale(window.toK, scale)}
      step="any"
      value={value}
      onKeyDown={onKeyDown}
      onChange={(event) => onTemperature(kelvin(onStep(event.currentTarget.valueAsNumber, step)))}
    />
  );
}

/** The next multiples of the step: from between two of them, the first step leads to the neighbour. */
function moved(value: number, steps: number, step: number): number {
  const place = value / step;
  const near = Math.round(place);
  const even = Math.abs(place - near) < 1e-6 ? near : steps > 0 ? Math.floor(place) : Math.ceil(place);
  return onStep((even + steps) * step, step);
}
