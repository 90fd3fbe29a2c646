import { STANDARD_ATMOSPHERE_PA } from '../../../core/atmosphere';
import { Badge, Field, Input } from '@fluentui/react-components';
import { useMemo, useState } from 'react';
import type { CatalogueEntry } from '../../../core/substance';
import type { Settings } from '../../../functions/settings/settings';
import type { WorkbookHost } from '../../port';
import { number } from '../look/number';
import { useLook } from '../look/useLook';
import { captionWords } from './diagram/captionWords';
import { crossings } from './diagram/crossings';
import { Diagram } from './diagram/Diagram';
import { diagramOf } from './diagram/diagramOf';
import { diagramRows } from './diagram/diagramRows';
import { DiagramTable } from './diagram/DiagramTable';
import { IDEAL_GAS } from './diagram/idealGas';
import { niceStep, onStep } from './diagram/niceStep';
import { PartOfDiagram } from './diagram/PartOfDiagram';
import { sidesOf } from './diagram/sidesOf';
import { sliderWords } from './diagram/sliderWords';
import { TemperatureSlider } from './diagram/TemperatureSlider';
import { Facts } from './facts/Facts';
import { stateWords } from './facts/stateWords';
import { onScale, roundTemperature, unitWriter, written } from './facts/unitWriter';
import { useInsert } from './insert/useInsert';
import { Constants } from './known/Constants';
import { DisagreementLine } from './known/DisagreementLine';
import { Known } from './known/Known';
import { QuantityField } from './QuantityField';
import { useCard } from './useCard';
import { problemWords } from './facts/problemWords';

export interface SubstanceCardProps {
  readonly host: WorkbookHost;
  readonly entry: CatalogueEntry;
  readonly settings: Settings;
  readonly withoutUnits: boolean;
}

/** One substance: its diagram with a movable temperature, the numbers there, and what stands behind them. */
export function SubstanceCard({ host, entry, settings, withoutUnits }: SubstanceCardProps) {
  const substance = entry.make();
  const look = useLook();
  const card = useCard(substance);
  const { ladder, pressurePa, temperatureK, window } = card;
  const writer = useMemo(() => unitWriter(settings, substance.molarMass), [settings, substance]);
  const house = substance.group === 'house';
  const [cell, setCell] = useState('');
  const { temperature, pressure, decimal } = writer;
  const pressureText = `${plain(onScale(pressurePa, pressure), decimal)} ${settings.units.pressure.symbol}`;
  const inserting = useInsert(
    host,
    {
      temperature: onScale(temperatureK, temperature),
      pressure: {
        value: onScale(pressurePa, pressure),
        text: pressureText,
        usual: pressurePa === STANDARD_ATMOSPHERE_PA,
      },
      units: writer.ownUnits,
      house,
    },
    cell,
    withoutUnits,
  );
  const diagram = useMemo(
    () => (ladder === undefined ? undefined : diagramOf(substance, ladder, window, sidesOf(ladder, card.around))),
    [substance, ladder, window, card.around],
  );
  const here = useMemo(() => {
    if (ladder === undefined) return [];
    const shown = sidesOf(ladder, card.around);
    return crossings(substance, ladder, temperatureK).filter(
      ({ name, stable }) => stable || shown === undefined || shown.includes(name === IDEAL_GAS ? 'gas' : name),
    );
  }, [substance, ladder, temperatureK, card.around]);
  const marks = [...new Set(here.flatMap((crossing) => crossing.marks))];
  const step = niceStep(Math.abs(temperature.scale) * (window.toK - window.fromK), 200);
  const stepBy = (steps: number) => {
    const shown = onStep(onScale(temperatureK, temperature) + steps * step, step);
    card.goTo(Math.max(0, (shown - temperature.offset) / temperature.scale));
  };
  const rounded = (kelvin: number) => roundTemperature(kelvin, temperature, decimal);
  return (
    <article className={look.stack} aria-label={substance.name}>
      <header className={look.tight}>
        <h3 className={look.title}>
          {substance.name} {house && <Badge appearance="outline">house</Badge>}
        </h3>
        <p className={look.quiet}>
          {[substance.formula, substance.cas === '' ? '' : `CAS ${substance.cas}`, house ? '' : substance.group]
            .filter((word) => word !== '')
            .join(' · ')}
        </p>
      </header>
      {card.problem !== undefined && <p className={look.text}>No diagram: {problemWords(card.problem, writer)}.</p>}
      {ladder !== undefined && diagram !== undefined && (
        <figure className={look.tight} style={{ margin: 0 }}>
          <Diagram
            name={substance.name}
            diagram={diagram}
            crossings={here}
            writer={writer}
            temperatureK={temperatureK}
            step={step}
            onTemperature={card.setTemperature}
          />
          <TemperatureSlider
            window={window}
            temperatureK={temperatureK}
            scale={temperature}
            step={step}
            words={sliderWords(ladder, here, temperatureK, writer)}
            onTemperature={card.setTemperature}
          />
          {ladder.gaps.length > 0 && (
            <PartOfDiagram ladder={ladder} around={card.around} onAround={card.setAround} label={rounded} />
          )}
          <figcaption className={look.quiet}>
            {captionWords(diagram, ladder, writer)}
            {marks.length > 0 && ` Here: ${marks.join('; ')}.`}
          </figcaption>
          <details>
            <summary className={look.summary}>The diagram as a table</summary>
            <DiagramTable rows={diagramRows(ladder)} writer={writer} />
            <p className={look.quiet}>Zero of h: {substance.enthalpyReference}.</p>
          </details>
        </figure>
      )}
      <div className={look.pair}>
        <QuantityField
          label="Temperature"
          kind="temperature"
          settings={settings}
          scale={temperature}
          si={temperatureK}
          onValue={card.goTo}
          onStep={stepBy}
        />
        <QuantityField
          label="Pressure"
          kind="pressure"
          settings={settings}
          scale={pressure}
          si={pressurePa}
          onValue={card.setPressure}
        />
      </div>
      <h4 className={look.subtitle} data-testid="state">
        {stateWords(ladder, temperatureK, writer)}
      </h4>
      <Field
        label="Temperature in formulas"
        hint={`The number shown, ${number(onScale(temperatureK, temperature), decimal)}, when left blank; or a cell, as A2`}
      >
        <Input
          className={look.narrow}
          input={{ style: { minWidth: 0, width: '100%' }, spellCheck: false, autoComplete: 'off' }}
          value={cell}
          onChange={(_, { value }) => setCell(value)}
        />
      </Field>
      <Facts
        substance={substance}
        temperatureK={temperatureK}
        pressurePa={pressurePa}
        settings={settings}
        writer={writer}
        inserting={inserting}
      />
      {substance.constants.length > 0 && (
        <>
          <h4 className={look.subtitle}>Constants</h4>
          <Constants substance={substance} writer={writer} inserting={inserting} />
        </>
      )}
      {substance.synonyms.length > 0 && <p className={look.quiet}>Also found as {substance.synonyms.join(', ')}.</p>}
      <h4 className={look.subtitle}>What is known, and where from</h4>
      <Known substance={substance} pressurePa={pressurePa} writer={writer} />
      <DisagreementLine substance={substance} writer={writer} />
      {substance.notes.length > 0 && (
        <>
          <h4 className={look.subtitle}>Good to know</h4>
          <ul className={look.list}>
            {substance.notes.map((note) => (
              <li key={note}>{note}</li>
            ))}
          </ul>
        </>
      )}
      {substance.lambdaPoints !== undefined && substance.lambdaPoints.length > 0 && (
        <p className={look.text}>
          {substance.lambdaPoints
            .map((point) => `${point.name} at ${written(point.temperatureK, temperature, decimal)}`)
            .join(', ')}
          : the heat capacity peaks there, and there is no latent heat.
        </p>
      )}
    </article>
  );
}

/** A number for a setting: all its digits, with the workbook's decimal separator. */
function plain(value: number, decimal: '.' | ','): string {
  const text = Number(value.toPrecision(12)).toString();
  return decimal === ',' ? text.replace('.', ',') : text;
}
