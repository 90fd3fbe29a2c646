import { Field, Input, Select } from '@fluentui/react-components';
import { useEffect, useRef, useState } from 'react';
import type { SettingRow } from '../../../functions/settings/schema';
import { useLook } from '../look/useLook';
import { prettyUnit } from '../look/number';

const OTHER = 'another unit';

const WORDS: Readonly<Record<string, string>> = { '.': 'point, as 1.5', ',': 'comma, as 1,5' };

export interface SettingFieldProps {
  readonly row: SettingRow;
  readonly value: string;
  readonly error: string | undefined;
  readonly onChange: (value: string) => void;
}

/** One setting: a list of the usual values, a text where there is no list or another unit is wanted. */
export function SettingField({ row, value, error, onChange }: SettingFieldProps) {
  const look = useLook();
  const [typing, setTyping] = useState(false);
  const input = useRef<HTMLInputElement>(null);
  useEffect(() => {
    if (typing) input.current?.select();
  }, [typing]);
  const listed = row.choices.length > 0 && !typing;
  const hint = row.kind === 'barometer' ? 'Absolute; gauge pressures are counted from it' : undefined;
  const message = error === undefined ? {} : { validationState: 'error' as const, validationMessage: error };
  return (
    <Field label={row.label} {...message} {...(hint === undefined ? {} : { hint })}>
      {listed ? (
        <Select
          className={look.narrow}
          value={value}
          onChange={(_, data) => (data.value === OTHER ? setTyping(true) : onChange(data.value))}
        >
          {!row.choices.includes(value) && <option value={value}>{prettyUnit(value)}</option>}
          {row.choices.map((choice) => (
            <option key={choice} value={choice}>
              {WORDS[choice] ?? prettyUnit(choice)}
            </option>
          ))}
          {row.kind === 'unit' && <option value={OTHER}>another…</option>}
        </Select>
      ) : (
        <Input
          className={look.narrow}
          input={{ ref: input, style: { minWidth: 0, width: '100%' } }}
          value={value}
          onChange={(_, data) => onChange(data.value)}
          onBlur={() => setTyping(row.kind === 'unit' && error !== undefined)}
        />
      )}
    </Field>
  );
}
