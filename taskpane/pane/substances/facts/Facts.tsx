import { useMemo } from 'react';
import type { Substance } from '../../../../core/substance';
import type { Settings } from '../../../../functions/settings/settings';
import { useLook } from '../../look/useLook';
import type { Inserting } from '../insert/useInsert';
import { latentFacts, type ChangeFacts, type KindFacts } from './latentFacts';
import { lineFacts } from './lineFacts';
import { heatCapacityFacts } from './phaseFacts';
import { withoutEchoes } from './withoutEchoes';
import { Quantities } from './Quantities';
import type { Quantity } from './quantity';
import { written, type UnitWriter } from './unitWriter';

export interface FactsProps {
  readonly substance: Substance;
  readonly temperatureK: number;
  readonly pressurePa: number;
  readonly settings: Settings;
  readonly writer: UnitWriter;
  readonly inserting: Inserting;
}

/** Everything that the core says of a substance at one temperature and pressure. */
export function Facts({ substance, temperatureK, pressurePa, settings, writer, inserting }: FactsProps) {
  const look = useLook();
  const facts = useMemo(() => {
    const at = {
      temperatureK,
      pressurePa,
      pressureText: written(pressurePa, writer.pressure, writer.decimal),
      outOfRange: settings.outOfRange,
    };
    return {
      changes: latentFacts(substance, at),
      capacities: heatCapacityFacts(substance, at),
      lines: lineFacts(substance, at),
      pressureText: at.pressureText,
    };
  }, [substance, temperatureK, pressurePa, settings, writer]);
  const shared = { writer, inserting };
  return (
    <div className={look.stack}>
      {facts.changes.map((change) => (
        <ChangeBlock key={change.change} {...change} {...shared} />
      ))}
      <Quantities
        caption={`Heat capacity at ${facts.pressureText}`}
        quantities={withoutEchoes(facts.capacities)}
        {...shared}
      />
      <Quantities caption="With its vapour, and by itself" quantities={withoutEchoes(facts.lines)} {...shared} />
      <p className={look.quiet}>± is the standard uncertainty (k = 1), where one is known.</p>
    </div>
  );
}

function ChangeBlock({
  change,
  kinds,
  writer,
  inserting,
}: ChangeFacts & { readonly writer: UnitWriter; readonly inserting: Inserting }) {
  const look = useLook();
  const [usual, ...others] = kinds;
  return (
    <div>
      <Quantities
        caption={`Heat of ${change}`}
        quantities={usual === undefined ? [] : lines(usual)}
        writer={writer}
        inserting={inserting}
      />
      {others.length > 0 && (
        <details>
          <summary className={look.summary}>Other kinds of this heat</summary>
          <Quantities quantities={others.flatMap(lines)} writer={writer} inserting={inserting} />
        </details>
      )}
    </div>
  );
}

/** Latent heat and slope; one line where both are lacking. */
function lines({ latent, slope }: KindFacts): Quantity[] {
  return latent.fact.problem !== undefined && slope.fact.problem !== undefined ? [latent] : [latent, slope];
}
