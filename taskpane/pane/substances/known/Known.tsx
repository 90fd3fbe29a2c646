import { makeStyles, tokens } from '@fluentui/react-components';
import { useMemo } from 'react';
import type { Substance } from '../../../../core/substance';
import { number } from '../../look/number';
import { useLook } from '../../look/useLook';
import { onScale, written, type UnitWriter } from '../facts/unitWriter';
import { knownOf, type KnownCurve } from './knownOf';
import { percent } from './percent';
import { problemWords } from '../facts/problemWords';

const useStyles = makeStyles({
  item: { borderBottom: `1px solid ${tokens.colorNeutralStroke2}`, '& dl': { margin: '2px 0 8px 14px' } },
  line: { cursor: 'pointer', lineHeight: '26px' },
  range: { color: tokens.colorNeutralForeground3, fontSize: '12px', fontVariantNumeric: 'tabular-nums' },
  flag: { color: 'var(--warmAccent)', fontSize: '12px', fontWeight: 600 },
});

/** What is known of a substance, over which range and from where; and what is not. */
export function Known({
  substance,
  pressurePa,
  writer,
}: {
  readonly substance: Substance;
  readonly pressurePa: number;
  readonly writer: UnitWriter;
}) {
  const look = useLook();
  const { known, unknown } = useMemo(() => knownOf(substance, pressurePa), [substance, pressurePa]);
  return (
    <div>
      {known.map((one) => (
        <KnownItem key={one.item} one={one} writer={writer} />
      ))}
      {unknown.length > 0 && (
        <details>
          <summary className={look.summary}>Not in the catalogue: {unknown.length}</summary>
          <ul className={look.list}>
            {unknown.map(({ item, problem }) => (
              <li key={item}>
                {item}: {problemWords(problem, writer)}
              </li>
            ))}
          </ul>
        </details>
      )}
    </div>
  );
}

function KnownItem({ one, writer }: { readonly one: KnownCurve; readonly writer: UnitWriter }) {
  const styles = useStyles();
  const { curve, uncertainties, marks, unconfirmed } = one;
  const { decimal } = writer;
  const axis = writer[curve.axis];
  return (
    <details className={styles.item}>
      <summary className={styles.line}>
        {one.item}{' '}
        <span className={styles.range}>
          {curve.from === curve.to
            ? `at ${written(curve.from, axis, decimal)} only`
            : `${number(onScale(curve.from, axis), decimal)} to ${written(curve.to, axis, decimal)}`}
        </span>{' '}
        {unconfirmed && <span className={styles.flag}>unconfirmed</span>}
      </summary>
      <dl>
        <Term name="Method">{curve.method}</Term>
        <Term name={curve.sources.length === 1 ? 'Source' : 'Sources'}>
          {curve.sources.map((source) => (
            <span key={source} style={{ display: 'block' }}>
              {source}
            </span>
          ))}
        </Term>
        <Term name="Standard uncertainty (k = 1)">
          {uncertainties.length === 0
            ? 'none stated'
            : uncertainties
                .map(({ x, share, uncertainty }) => {
                  const size =
                    share === undefined ? `${number(uncertainty, decimal)} ${curve.unit}` : percent(share, decimal);
                  return `${size} at ${written(x, axis, decimal)}`;
                })
                .join(', ')}
        </Term>
        {marks.length > 0 && <Term name="Marks">{marks.join('; ')}</Term>}
      </dl>
    </details>
  );
}

function Term({ name, children }: { readonly name: string; readonly children: React.ReactNode }) {
  const look = useLook();
  return (
    <>
      <dt className={look.quiet}>{name}</dt>
      <dd className={look.text} style={{ marginLeft: 0 }}>
        {children}
      </dd>
    </>
  );
}
