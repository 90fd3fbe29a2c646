import { Button, Field, Input, Select } from '@fluentui/react-components';
import { useId, useRef, useState } from 'react';
import { HOUSE_PROPERTIES } from '../../../../core/house/houseProperty';
import type { HouseColumn } from '../../../../core/house/houseRow';
import { HOUSE_FORMS } from '../../../../core/house/readForm';
import type { Decimal } from '../../../../core/units/parseNumber';
import type { WorkbookHost } from '../../../port';
import { Notice } from '../../look/Notice';
import { useLook } from '../../look/useLook';
import { EMPTY_DRAFT, type RowDraft } from './draftRow';
import { coefficientsHint, unitHint } from './rowHints';
import { useAddRow } from './useAddRow';

export interface AddSubstanceProps {
  readonly host: WorkbookHost;
  readonly decimal: Decimal;
  /** Shows the card of a substance that was added. */
  readonly onShow: (name: string) => void;
}

/** Writes one property of a substance of the team's own onto the Substances sheet. */
export function AddSubstance({ host, decimal, onShow }: AddSubstanceProps) {
  const look = useLook();
  const form = useRef<HTMLFormElement>(null);
  const [draft, setDraft] = useState<RowDraft>(EMPTY_DRAFT);
  const { outcome, errors, add, forget } = useAddRow(host, decimal);
  const put = (column: HouseColumn) => (value: string) => {
    setDraft((before) => ({ ...before, [column]: value }));
    forget();
  };
  const submit = async () => {
    const next = await add(draft);
    // The next property of the same substance usually has the same source.
    if (next.state === 'done')
      setDraft({ ...EMPTY_DRAFT, substance: draft.substance, source: draft.source, revision: draft.revision });
    if (next.state === 'refused') {
      requestAnimationFrame(() => form.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus());
    }
  };
  const text = (column: HouseColumn, label: string, hint: string) => (
    <TextField label={label} hint={hint} value={draft[column]} error={errors[column]} onChange={put(column)} />
  );
  return (
    <details>
      <summary className={look.summary}>Add a substance of your own</summary>
      <form
        ref={form}
        className={look.stack}
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          void submit();
        }}
      >
        <p className={look.text}>
          One property at a time. It is written as a row of the Substances sheet, and every function knows it from then
          on.
        </p>
        {text('substance', 'Name', 'As formulas will call it')}
        <PropertyField value={draft.property} error={errors.property} onChange={put('property')} />
        <Field label="Form" {...invalid(errors.form)}>
          <Select className={look.narrow} value={draft.form} onChange={(_, { value }) => put('form')(value)}>
            <option value="">as the coefficients look</option>
            {HOUSE_FORMS.map((word) => (
              <option key={word} value={word}>
                {word}
              </option>
            ))}
          </Select>
        </Field>
        {text('coefficients', 'Coefficients', coefficientsHint(draft.form))}
        {text('unit', 'Unit', unitHint(draft.property))}
        <div className={look.pair}>
          {text('valid from', 'Valid from', '')}
          {text('valid to', 'Valid to', '')}
        </div>
        <p className={look.quiet}>
          As 280 K; a bare number is in the unit of the sheet’s header, °C where it says none.
        </p>
        {text('source', 'Source', 'Where the number comes from')}
        {text('revision', 'Revision', 'Yours to count')}
        <div className={look.row}>
          <Button type="submit" appearance="primary">
            Add to the Substances sheet
          </Button>
        </div>
        {outcome?.state === 'refused' && <Notice tone="error">Nothing was written: see the marked fields.</Notice>}
        {outcome?.state === 'failed' && <Notice tone="error">Nothing was written: {outcome.text}.</Notice>}
        <div role="status">
          {outcome?.state === 'done' && (
            <Notice>
              <span>Written to {outcome.at}.</span>
              {outcome.warnings.map((warning) => (
                <span key={warning}>{warning}.</span>
              ))}
              <Button size="small" type="button" onClick={() => onShow(outcome.substance)}>
                Show {outcome.substance}
              </Button>
            </Notice>
          )}
        </div>
      </form>
    </details>
  );
}

const invalid = (error: string | undefined) =>
  error === undefined ? {} : { validationState: 'error' as const, validationMessage: error };

interface TextFieldProps {
  readonly label: string;
  readonly hint: string;
  readonly value: string;
  readonly error: string | undefined;
  readonly onChange: (value: string) => void;
}

function TextField({ label, hint, value, error, onChange }: TextFieldProps) {
  const look = useLook();
  return (
    <Field label={label} {...(hint === '' ? {} : { hint })} {...invalid(error)}>
      <Input
        className={look.narrow}
        input={{ style: { minWidth: 0, width: '100%' }, autoComplete: 'off', spellCheck: false }}
        value={value}
        onChange={(_, data) => onChange(data.value)}
      />
    </Field>
  );
}

/** The usual properties are offered; others, as `heat of alpha-beta`, are typed. */
function PropertyField({ value, error, onChange }: Omit<TextFieldProps, 'label' | 'hint'>) {
  const look = useLook();
  const list = useId();
  return (
    <Field label="Property" hint="As liquid heat capacity, heat of fusion, heat of alpha-beta" {...invalid(error)}>
      <Input
        className={look.narrow}
        input={{ style: { minWidth: 0, width: '100%' }, autoComplete: 'off', spellCheck: false, list }}
        value={value}
        onChange={(_, data) => onChange(data.value)}
        contentAfter={
          <datalist id={list}>
            {HOUSE_PROPERTIES.map((property) => (
              <option key={property} value={property} />
            ))}
          </datalist>
        }
      />
    </Field>
  );
}
