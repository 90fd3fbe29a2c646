import { Field, Input } from '@fluentui/react-components';
import { useState, type KeyboardEvent } from 'react';
import { Problem } from '../../../core/problem';
import { parseQuantity } from '../../../core/units/parseQuantity';
import type { Settings } from '../../../functions/settings/settings';
import { number, prettyUnit } from '../look/number';
import { useLook } from '../look/useLook';
import { onScale, type Scale } from './facts/unitWriter';

export interface QuantityFieldProps {
  readonly label: string;
  readonly hint?: string;
  readonly kind: 'temperature' | 'pressure';
  readonly settings: Settings;
  readonly scale: Scale;
  readonly si: number;
  readonly onValue: (si: number) => void;
  /** Steps that the arrow keys ask for, up or down. */
  readonly onStep?: (steps: number) => void;
}

/** A temperature or a pressure in the workbook's unit, or with a unit of its own. */
export function QuantityField({ label, hint, kind, settings, scale, si, onValue, onStep }: QuantityFieldProps) {
  const look = useLook();
  const [draft, setDraft] = useState<string>();
  const [error, setError] = useState<string>();
  const unit = settings.units[kind];
  const type = (text: string) => {
    setDraft(text);
    try {
      onValue(typedQuantity(text, kind, settings));
      setError(undefined);
    } catch (failure) {
      if (!(failure instanceof Problem)) throw failure;
      setError(failure.message);
    }
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (onStep === undefined || (event.key !== 'ArrowUp' && event.key !== 'ArrowDown')) return;
    event.preventDefault();
    setDraft(undefined);
    setError(undefined);
    onStep(event.key === 'ArrowUp' ? 1 : -1);
  };
  return (
    <Field
      label={`${label}, ${prettyUnit(unit.symbol)}`}
      {...(hint === undefined ? {} : { hint })}
      {...(error === undefined ? {} : { validationState: 'error' as const, validationMessage: error })}
    >
      <Input
        className={look.narrow}
        input={{ style: { minWidth: 0, width: '100%' }, autoComplete: 'off', spellCheck: false }}
        value={draft ?? number(onScale(si, scale), settings.decimal)}
        onChange={(_, { value }) => type(value)}
        onKeyDown={onKeyDown}
        onBlur={() => {
          setDraft(undefined);
          setError(undefined);
        }}
      />
    </Field>
  );
}

/** A number is in the workbook's unit; anything with letters brings its own. @throws Problem where it can't be read */
export function typedQuantity(text: string, kind: 'temperature' | 'pressure', settings: Settings): number {
  const bare = !/[a-zA-Z°℃℉]/.test(text.replace(/\d[eE][+-]?\d/g, ''));
  return parseQuantity(bare ? `${text} ${settings.units[kind].symbol}` : text, kind, settings).si;
}
