import { Field, Select } from '@fluentui/react-components';
import type { Ladder } from '../../../../core/substance';
import { useLook } from '../../look/useLook';

export interface PartProps {
  readonly ladder: Ladder;
  readonly around: number | undefined;
  readonly onAround: (place: number | undefined) => void;
  readonly label: (temperatureK: number) => string;
}

/** Draws all changes, or goes to one of them and draws what lies around it. */
export function PartOfDiagram({ ladder, around, onAround, label }: PartProps) {
  const look = useLook();
  return (
    <Field label="Part of the diagram">
      <Select
        className={look.narrow}
        value={around === undefined ? '' : String(around)}
        onChange={(_, { value }) => onAround(value === '' ? undefined : Number(value))}
      >
        <option value="">all changes</option>
        {ladder.gaps.map(({ change, temperatureK }, place) => (
          <option key={place} value={place}>
            around {change}, {label(temperatureK)}
          </option>
        ))}
      </Select>
    </Field>
  );
}
