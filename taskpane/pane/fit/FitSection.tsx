import { useMemo, useState } from 'react';
import { Problem } from '../../../core/problem';
import type { Settings } from '../../../functions/settings/settings';
import type { WorkbookHost } from '../../port';
import { Notice } from '../look/Notice';
import { number, prettyUnit } from '../look/number';
import { roundToUncertainty } from '../look/roundToUncertainty';
import { useLook } from '../look/useLook';
import { settingsOf, useStore } from '../units/useUnits';
import { Columns } from './Columns';
import { DataSource } from './DataSource';
import { choiceFor, FIRST_CHOICE } from './fitChoice';
import { chosenUnit, fitView, referenceOf, type FitView } from './fitView';
import { InsertFit } from './InsertFit';
import { KindTable } from './KindTable';
import { Meaning } from './Meaning';
import { PlotBlock } from './PlotBlock';
import { Result } from './Result';
import { useFitData, type FitData } from './useFitData';

/** Fits the temperature slope of latent heats that stand in the workbook. */
export function FitSection({ host }: { readonly host: WorkbookHost }) {
  const look = useLook();
  const store = useStore();
  const settings = settingsOf(store);
  const [choice, setChoice] = useState(FIRST_CHOICE);
  const source = useFitData(host, ({ found }) => setChoice((before) => choiceFor(found, before)));
  return (
    <div className={look.stack}>
      <h2 className={look.title}>ΔCp from latent heats</h2>
      <p className={look.text}>Fits a straight line through latent heats at several temperatures.</p>
      <DataSource source={source} />
      {source.data !== undefined && settings === undefined && (
        <Notice tone="error">
          The unit settings of the workbook can’t be read. Repair them in the section Units first.
        </Notice>
      )}
      {source.data !== undefined && settings !== undefined && (
        <Fitted
          host={host}
          data={source.data}
          settings={settings}
          withoutUnits={store.state === 'absent'}
          choice={choice}
          onChoice={setChoice}
        />
      )}
    </div>
  );
}

interface FittedProps {
  readonly host: WorkbookHost;
  readonly data: FitData;
  readonly settings: Settings;
  readonly withoutUnits: boolean;
  readonly choice: typeof FIRST_CHOICE;
  readonly onChoice: (choice: typeof FIRST_CHOICE) => void;
}

function Fitted({ host, data, settings, withoutUnits, choice, onChoice }: FittedProps) {
  const look = useLook();
  const { found } = data;
  const unit = attempt(
    () => chosenUnit(placed(data, choice.temperature), 'temperature', choice.temperatureUnit, settings).unit,
  );
  const temperatureUnit = unit.done ?? settings.units.temperature;
  const reference = attempt(() => referenceOf(choice.reference, temperatureUnit, settings));
  const outcome = useMemo(() => attempt(() => fitView(found.columns, choice, settings)), [found, choice, settings]);
  const view = outcome.done;
  const failure = reference.failure === undefined ? outcome.failure : undefined;
  return (
    <>
      <Columns found={found} choice={choice} settings={settings} onChoice={onChoice} />
      <Meaning
        choice={choice}
        onChoice={onChoice}
        temperatureSymbol={temperatureUnit.symbol}
        usualReference={referenceOf('', temperatureUnit, settings)}
        referenceError={reference.failure}
      />
      {failure !== undefined && <Notice tone="error">{failure}</Notice>}
      <p className={look.text} role="status">
        {view === undefined ? '' : summary(view)}
      </p>
      {view !== undefined && (
        <>
          <h3 className={look.subtitle}>Result</h3>
          <Result view={view} />
          <PlotBlock view={view} />
          <h3 className={look.subtitle}>Which slope this is</h3>
          <KindTable view={view} choice={choice} />
          <h3 className={look.subtitle}>Insert into the workbook</h3>
          <InsertFit
            host={host}
            data={data}
            view={view}
            choice={choice}
            settings={settings}
            withoutUnits={withoutUnits}
          />
        </>
      )}
    </>
  );
}

function placed({ found }: FitData, place: number | undefined) {
  return place === undefined ? undefined : found.columns[place];
}

function summary({ fit, units }: FitView): string {
  const { slopeFactor, heatCapacity, heat, temperature } = units;
  const u = fit.uSlope === undefined ? undefined : Math.abs(slopeFactor) * fit.uSlope;
  const slope = roundToUncertainty(slopeFactor * fit.slope, u).text;
  return (
    `Fitted ${fit.count} points: slope ${slope} ${prettyUnit(heatCapacity.symbol)}, ` +
    `ΔH ${roundToUncertainty(fit.latent, fit.uLatent).text} ${prettyUnit(heat.symbol)} ` +
    `at ${number(fit.reference)} ${prettyUnit(temperature.symbol)}.`
  );
}

type Attempt<T> =
  { readonly done: T; readonly failure?: undefined } | { readonly done?: undefined; readonly failure: string };

function attempt<T>(work: () => T): Attempt<T> {
  try {
    return { done: work() };
  } catch (error) {
    if (error instanceof Problem) return { failure: error.message };
    throw error;
  }
}
