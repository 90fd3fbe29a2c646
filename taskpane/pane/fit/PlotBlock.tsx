import { useMemo } from 'react';
import { number } from '../look/number';
import { useLook } from '../look/useLook';
import { FitPlot } from './FitPlot';
import type { FitView } from './fitView';
import { pictureOf } from './pictureOf';

const MOST_ROWS = 200;

/** The picture of the fit, what it shows in words, and the same numbers as a table. */
export function PlotBlock({ view }: { readonly view: FitView }) {
  const look = useLook();
  const picture = useMemo(() => pictureOf(view), [view]);
  const rows = picture.points.slice(0, MOST_ROWS);
  return (
    <div className={look.stack}>
      <figure className={look.tight} style={{ margin: 0 }}>
        <FitPlot picture={picture} />
        <figcaption className={look.quiet}>
          Points, fitted line with its 95 % band, residuals below.
          {picture.thinned !== undefined && ` ${picture.thinned}`}
        </figcaption>
      </figure>
      <details>
        <summary className={look.summary}>The picture as a table</summary>
        <div className={look.scroll} tabIndex={0} role="group" aria-label="Points of the picture">
          <table className={look.table}>
            <thead>
              <tr>
                <th scope="col">{picture.xLabel}</th>
                <th scope="col">{picture.yLabel}</th>
                <th scope="col">line</th>
                <th scope="col">residual</th>
              </tr>
            </thead>
            <tbody>
              {rows.map(({ x, y, residual }, i) => (
                <tr key={i}>
                  <td>{number(x)}</td>
                  <td>{number(y)}</td>
                  <td>{number(y - residual)}</td>
                  <td>{Number(residual.toPrecision(3)).toString().replace('-', '−')}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
        {picture.points.length > MOST_ROWS && (
          <p className={look.quiet}>
            The first {MOST_ROWS} of {picture.points.length} points drawn.
          </p>
        )}
      </details>
    </div>
  );
}
