import { Field, Select } from '@fluentui/react-components';
import { SETTINGS } from '../../../functions/settings/schema';
import type { Settings } from '../../../functions/settings/settings';
import type { FoundColumns } from '../../plan/findColumns';
import { prettyUnit } from '../look/number';
import { useLook } from '../look/useLook';
import type { FitChoice } from './fitChoice';

export interface ColumnsProps {
  readonly found: FoundColumns;
  readonly choice: FitChoice;
  readonly settings: Settings;
  readonly onChoice: (choice: FitChoice) => void;
}

const QUANTITIES = [
  { part: 'temperature', unit: 'temperatureUnit', kind: 'temperature', label: 'Temperatures' },
  { part: 'latent', unit: 'latentUnit', kind: 'heat', label: 'Latent heats' },
] as const;

/** Which columns are fitted, and the unit of each. */
export function Columns({ found, choice, settings, onChoice }: ColumnsProps) {
  const look = useLook();
  const { uLatent, uTemperature } = found.parts;
  const uncertain = [uLatent, uTemperature].flatMap((i) => (i === undefined ? [] : [found.columns[i]?.label ?? '']));
  return (
    <div className={look.stack}>
      {QUANTITIES.map(({ part, unit, kind, label }) => {
        const place = choice[part];
        const header = place === undefined ? undefined : found.columns[place]?.header;
        const stated = header?.unit?.kind === kind ? header.unit.symbol : undefined;
        const choices = SETTINGS.find((row) => row.unit === kind)?.choices ?? [];
        const unread = header?.unread?.message;
        const message =
          unread === undefined
            ? {}
            : { validationState: 'error' as const, validationMessage: `${unread}. Correct the header.` };
        return (
          <div key={part} className={look.tight}>
            <Field
              label={label}
              hint={stated === undefined ? '' : `in ${prettyUnit(stated)}, as its header says`}
              {...message}
            >
              <Select
                className={look.narrow}
                value={place === undefined ? '' : String(place)}
                onChange={(_, data) =>
                  onChoice({ ...choice, [part]: data.value === '' ? undefined : Number(data.value), [unit]: '' })
                }
              >
                {place === undefined && <option value="">choose a column</option>}
                {found.columns.map((column, i) => (
                  <option key={column.ref.sheet + column.ref.address} value={i}>
                    {column.label}
                  </option>
                ))}
              </Select>
            </Field>
            {stated === undefined && unread === undefined && (
              <Field
                label={`Unit of the ${label.toLowerCase()}`}
                hint={choice[unit] === '' ? 'The header names none, so the workbook’s unit is taken' : ''}
              >
                <Select
                  className={look.narrow}
                  value={choice[unit]}
                  onChange={(_, data) => onChoice({ ...choice, [unit]: data.value })}
                >
                  <option value="">{prettyUnit(settings.units[kind].symbol)} (workbook)</option>
                  {choices.map((symbol) => (
                    <option key={symbol} value={symbol}>
                      {prettyUnit(symbol)}
                    </option>
                  ))}
                </Select>
              </Field>
            )}
          </div>
        );
      })}
      {uncertain.length > 0 && (
        <p className={look.quiet}>
          Uncertainties found: {uncertain.join('; ')}. They are used with the weighted and both-variables methods, which
          come later; the line fitted here takes its uncertainties from the scatter.
        </p>
      )}
    </div>
  );
}
