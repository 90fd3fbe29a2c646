import { Button, Field, Input } from '@fluentui/react-components';
import { useEffect, useState } from 'react';
import { Problem } from '../../../core/problem';
import { DEFAULT_SETTINGS, settingsRows, type Settings } from '../../../functions/settings/settings';
import { formatReference, parseArea } from '../../hosts/address';
import { parseRanges } from '../../plan/parseRanges';
import { planFit, type InsertAs } from '../../plan/planFit';
import { planUnits } from '../../plan/planUnits';
import { UNITS_SHEET, within } from '../../plan/unitsBlock';
import type { Change, HostError, Ref, WorkbookHost } from '../../port';
import { Notice } from '../look/Notice';
import { useLook } from '../look/useLook';
import { wordsOf } from '../look/wordsOf';
import type { FitChoice } from './fitChoice';
import { besideData, fitInsert } from './fitInsert';
import type { FitView } from './fitView';
import type { FitData } from './useFitData';

export interface InsertFitProps {
  readonly host: WorkbookHost;
  readonly data: FitData;
  readonly view: FitView;
  readonly choice: FitChoice;
  readonly settings: Settings;
  /** True where the workbook has no Units block: one is made in the same step, since the formulas pass it. */
  readonly withoutUnits: boolean;
}

type Outcome =
  | { readonly state: 'done'; readonly at: Ref }
  | { readonly state: 'failed'; readonly text: string }
  | {
      readonly state: 'occupied';
      readonly errors: readonly HostError[];
      readonly as: InsertAs;
      readonly free: Ref | undefined;
    };

/** Puts the fit into cells that are free, as formulas or as values; what stands in the way is shown before anything is written. */
export function InsertFit({ host, data, view, choice, settings, withoutUnits }: InsertFitProps) {
  const look = useLook();
  const [target, setTarget] = useState('');
  const [outcome, setOutcome] = useState<Outcome>();
  const usual = besideData(data);
  useEffect(() => {
    setTarget('');
    setOutcome(undefined);
  }, [data]);

  const plan = (at: Ref, as: InsertAs): Change[] => {
    const fit = planFit(fitInsert(at, data, view, choice, settings), as);
    const units = withoutUnits && as === 'formulas' ? planUnits([], settingsRows(DEFAULT_SETTINGS)) : [];
    return [...units, ...fit];
  };

  async function insert(as: InsertAs, given?: Ref): Promise<void> {
    try {
      const at = given ?? targetCell(target, usual);
      const errors = await host.check(plan(at, as));
      if (errors.length > 0) {
        setOutcome({ state: 'occupied', errors, as, free: await freePlace(at, (ref) => host.check(plan(ref, as))) });
        return;
      }
      await host.apply(plan(at, as), 'ΔCp fit');
      setOutcome({ state: 'done', at });
    } catch (error) {
      setOutcome({ state: 'failed', text: wordsOf(error) });
    }
  }

  return (
    <form
      className={look.stack}
      onSubmit={(event) => {
        event.preventDefault();
        void insert('formulas');
      }}
    >
      <Field
        label="First cell"
        hint={usual === undefined ? '' : `${formatReference(usual)} when left blank, beside the data`}
      >
        <Input
          className={look.narrow}
          input={{ style: { minWidth: 0, width: '100%' }, spellCheck: false, autoComplete: 'off' }}
          value={target}
          onChange={(_, { value }) => setTarget(value)}
        />
      </Field>
      <div className={look.row}>
        <Button type="submit" appearance="primary">
          Insert live formulas
        </Button>
        <Button type="button" onClick={() => void insert('values')}>
          Insert values
        </Button>
      </div>
      <p className={look.quiet}>
        Live formulas follow the data and the units; values stay as they are now.
        {withoutUnits && ' The formulas need the Units sheet: it is made in the same step.'}
      </p>
      <div role="status">
        {outcome?.state === 'done' && (
          <Notice>
            <span>Inserted from {formatReference(outcome.at)} on.</span>
            <Button
              size="small"
              type="button"
              onClick={() => {
                host
                  .reveal(outcome.at)
                  .catch((error: unknown) => setOutcome({ state: 'failed', text: wordsOf(error) }));
              }}
            >
              Show these cells
            </Button>
          </Notice>
        )}
      </div>
      {outcome?.state === 'failed' && <Notice tone="error">Nothing was written: {outcome.text}.</Notice>}
      {outcome?.state === 'occupied' && (
        <Notice tone="error">
          <span>Nothing was written. In the way:</span>
          <ul className={look.list}>
            {outcome.errors.map((error) => (
              <li key={error.reason + formatReference(error.ref)}>{error.text}</li>
            ))}
          </ul>
          {outcome.free !== undefined && (
            <Button size="small" type="button" onClick={() => void insert(outcome.as, outcome.free)}>
              Use the free cells from {formatReference(outcome.free)} on
            </Button>
          )}
        </Notice>
      )}
    </form>
  );
}

function targetCell(text: string, usual: Ref | undefined): Ref {
  if (text.trim() === '' && usual !== undefined) return usual;
  const [ref] = parseRanges(text, usual?.sheet);
  const area = ref === undefined ? null : parseArea(ref.address);
  if (ref === undefined || area === null || area.rows * area.columns > 1) {
    throw new Problem({
      code: 'argument',
      argument: 'first cell',
      allowed: 'one cell, as Data!E2',
      received: `"${text}"`,
    });
  }
  return ref;
}

const TRIES = 12;

/** The first place to the right of `at` where nothing is in the way, if there is one near. */
async function freePlace(at: Ref, check: (ref: Ref) => Promise<HostError[]>): Promise<Ref | undefined> {
  for (let right = 1; right <= TRIES; right++) {
    const ref = within(at, 0, right);
    const errors = await check(ref);
    if (errors.length === 0) return ref;
    if (errors.some(({ reason, ref: where }) => reason !== 'occupied' || where.sheet === UNITS_SHEET)) return undefined;
  }
  return undefined;
}
