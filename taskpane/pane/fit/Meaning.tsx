import { Field, Input, Select } from '@fluentui/react-components';
import type { LatentKind } from '../../../core/answer';
import { currentRegistry } from '../../../functions/house/currentRegistry';
import { number, prettyUnit } from '../look/number';
import { useLook } from '../look/useLook';
import { withChange, type FitChoice } from './fitChoice';
import { KIND_NAMES } from './fitWords';

export interface MeaningProps {
  readonly choice: FitChoice;
  readonly onChoice: (choice: FitChoice) => void;
  /** Symbol of the temperature unit of the data. */
  readonly temperatureSymbol: string;
  /** The reference used where none is typed, in that unit. */
  readonly usualReference: number;
  readonly referenceError: string | undefined;
}

/** What the data are: substance, change and kind, and the temperature that the latent heat is given at. */
export function Meaning({ choice, onChoice, temperatureSymbol, usualReference, referenceError }: MeaningProps) {
  const look = useLook();
  const registry = currentRegistry();
  // one of the team's own may be gone from its sheet
  const changes = registry.entry(choice.substance)?.make().changes ?? [];
  const message =
    referenceError === undefined ? {} : { validationState: 'error' as const, validationMessage: referenceError };
  return (
    <div className={look.stack}>
      <div className={look.pair}>
        <Field label="Substance">
          <Select
            className={look.narrow}
            value={choice.substance}
            onChange={(_, data) => {
              const next = { ...choice, substance: data.value };
              onChoice(data.value === '' ? next : withChange(next, choice.change));
            }}
          >
            <option value="">not named</option>
            {registry.entries.map(({ name }) => (
              <option key={name} value={name}>
                {name}
              </option>
            ))}
          </Select>
        </Field>
        {changes.length > 0 && (
          <Field label="Change">
            <Select
              className={look.narrow}
              value={choice.change}
              onChange={(_, data) => onChoice(withChange(choice, data.value))}
            >
              {changes.map((change) => (
                <option key={change} value={change}>
                  {change}
                </option>
              ))}
            </Select>
          </Field>
        )}
      </div>
      <Field label="Kind of these latent heats">
        <Select
          className={look.narrow}
          value={choice.kind}
          onChange={(_, data) => onChoice({ ...choice, kind: data.value as LatentKind })}
        >
          {Object.entries(KIND_NAMES).map(([kind, name]) => (
            <option key={kind} value={kind}>
              {name}
            </option>
          ))}
        </Select>
      </Field>
      <Field
        label={`Reference temperature, ${prettyUnit(temperatureSymbol)}`}
        hint={`${number(usualReference)} when left blank (298.15 K)`}
        {...message}
      >
        <Input
          className={look.narrow}
          input={{ style: { minWidth: 0, width: '100%' }, autoComplete: 'off' }}
          value={choice.reference}
          onChange={(_, data) => onChoice({ ...choice, reference: data.value })}
        />
      </Field>
    </div>
  );
}
