import { useMemo } from 'react';
import type { Substance } from '../../../../core/substance';
import { useLook } from '../../look/useLook';
import { writeValue, written, type UnitWriter } from '../facts/unitWriter';
import { disagreements } from './disagreements';
import { percent } from './percent';
import { problemWords } from '../facts/problemWords';

/** How far the data for latent heat and heat capacities disagree between 25 °C and the boiling point. */
export function DisagreementLine({
  substance,
  writer,
}: {
  readonly substance: Substance;
  readonly writer: UnitWriter;
}) {
  const look = useLook();
  const found = useMemo(() => disagreements(substance), [substance]);
  if (found.length === 0) return null;
  return (
    <>
      <h4 className={look.subtitle}>Do its data agree?</h4>
      {found.map(({ change, fromK, toK, fact, share }) => {
        const between = `Between ${written(fromK, writer.temperature, writer.decimal)} and the boiling point, ${written(toK, writer.temperature, writer.decimal)}`;
        if (fact.answer === undefined) {
          return (
            <p key={change} className={look.text}>
              {between}: not known. {problemWords(fact.problem, writer)}.
            </p>
          );
        }
        const { text, unit } = writeValue(fact.answer, writer);
        return (
          <p key={change} className={look.text}>
            {between}, the latent heat of {change} and the heat capacities of its phases differ by{' '}
            <span className={look.strong}>
              {text} {unit}
            </span>
            {share !== undefined && fact.answer.value !== 0 && ` (${percent(share, writer.decimal)} of it)`}.{' '}
            <span className={look.quiet}>{fact.answer.method}.</span>
          </p>
        );
      })}
    </>
  );
}
