import { Button } from '@fluentui/react-components';
import { useMemo, useRef, useState } from 'react';
import { SETTINGS } from '../../../functions/settings/schema';
import { formatReference } from '../../hosts/address';
import { planUnits } from '../../plan/planUnits';
import { planUnitsAnew } from '../../plan/planUnitsAnew';
import { UNITS_SHEET } from '../../plan/unitsBlock';
import type { Change, WorkbookHost } from '../../port';
import { Notice } from '../look/Notice';
import { useLook } from '../look/useLook';
import { wordsOf } from '../look/wordsOf';
import { checkDraft, draftOf, textsOf, type Draft } from './draft';
import { previewText } from './previewText';
import { SettingField } from './SettingField';
import { UnitsState } from './UnitsState';
import { useStore, useUnitsBlock } from './useUnits';

const SPARE_SHEET = 'Latentry units';

type Outcome = { readonly tone: 'done' | 'error'; readonly text: string; readonly spareSheet?: boolean };

/** The units that the whole workbook works in, as they stand on its sheet. */
export function UnitsSection({ host }: { readonly host: WorkbookHost }) {
  const look = useLook();
  const form = useRef<HTMLFormElement>(null);
  const state = useStore();
  const [turn, setTurn] = useState(0);
  const block = useUnitsBlock(host, state, turn);
  const [edits, setEdits] = useState<Draft>({});
  const [outcome, setOutcome] = useState<Outcome>();
  const draft = useMemo(() => ({ ...draftOf(block), ...edits }), [block, edits]);
  const { settings, errors } = useMemo(() => checkDraft(draft), [draft]);
  const preview = useMemo(() => (settings === undefined ? undefined : previewText(settings)), [settings]);

  async function write(changes: readonly Change[], sheet: string): Promise<void> {
    try {
      const inTheWay = (await host.check(changes)).filter((error) => block === null || error.reason !== 'occupied');
      if (inTheWay.length > 0) {
        const spareSheet =
          block === null && sheet === UNITS_SHEET && inTheWay.some(({ reason }) => reason === 'occupied');
        setOutcome({
          tone: 'error',
          text: `Nothing was written: ${inTheWay.map(({ text }) => text).join('; ')}.`,
          spareSheet,
        });
        return;
      }
      await host.apply(changes, 'Units');
      await host.recalculate(changes.flatMap((change) => (change.kind === 'cells' ? [change.ref] : [])));
      setEdits({});
      setTurn((n) => n + 1);
      setOutcome({
        tone: 'done',
        text: `Written to the sheet ${block?.ref.sheet ?? sheet}, and the workbook recalculated.`,
      });
    } catch (error) {
      setOutcome({ tone: 'error', text: `Nothing was written: ${wordsOf(error)}.` });
    }
  }

  async function apply(sheet: string = UNITS_SHEET): Promise<void> {
    const bad = SETTINGS.find(({ key }) => errors[key] !== undefined);
    if (bad !== undefined) {
      setOutcome({ tone: 'error', text: `Nothing was written: ${bad.label} can't be read.` });
      form.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus();
      return;
    }
    const changes = planUnits(block === null ? [] : [block], textsOf(draft), sheet);
    if (changes.length === 0) setOutcome({ tone: 'done', text: 'The sheet holds these settings already.' });
    else await write(changes, sheet);
  }

  return (
    <form
      ref={form}
      className={look.stack}
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void apply();
      }}
    >
      <h2 className={look.title}>Units of the workbook</h2>
      <UnitsState
        state={state}
        block={block}
        onRepairValue={(key, value) =>
          void write(
            planUnits(block === null ? [] : [block], textsOf({ ...draftOf(block), [key]: value })),
            UNITS_SHEET,
          )
        }
        onRepairAll={() => {
          if (block !== null && settings !== undefined)
            void write(planUnitsAnew(block, textsOf(draft)), block.ref.sheet);
        }}
      />
      {state.state !== 'unread' && (
        <>
          <div className={look.pair}>
            {SETTINGS.map((row) => (
              <SettingField
                key={row.key}
                row={row}
                value={draft[row.key] ?? row.default}
                error={errors[row.key]}
                onChange={(value) => {
                  setEdits((before) => ({ ...before, [row.key]: value }));
                  setOutcome(undefined);
                }}
              />
            ))}
          </div>
          <p className={look.text} role="status" data-testid="preview">
            {preview ?? 'The example line returns when every setting can be read.'}
          </p>
          <div className={look.row}>
            <Button appearance="primary" type="submit">
              {block === null ? 'Create the Units sheet' : 'Apply'}
            </Button>
            {Object.keys(edits).length > 0 && (
              <Button type="button" onClick={() => setEdits({})}>
                Take changes back
              </Button>
            )}
          </div>
          <p className={look.quiet}>
            Answers follow the units. Numbers that were typed as inputs are not converted: check them after a change.
            {block !== null && ` The settings stand in ${formatReference(block.ref)}.`}
          </p>
        </>
      )}
      <div role="status">{outcome?.tone === 'done' && <Notice>{outcome.text}</Notice>}</div>
      {outcome?.tone === 'error' && (
        <Notice tone="error">
          <span>{outcome.text}</span>
          {outcome.spareSheet === true && (
            <Button size="small" type="button" onClick={() => void apply(SPARE_SHEET)}>
              Use a sheet named “{SPARE_SHEET}”
            </Button>
          )}
        </Notice>
      )}
    </form>
  );
}
