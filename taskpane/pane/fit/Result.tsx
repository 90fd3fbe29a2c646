import type { Interval } from '../../../core/fit/fitTypes';
import type { Unit } from '../../../core/units/unit';
import { number, prettyUnit } from '../look/number';
import { roundToUncertainty } from '../look/roundToUncertainty';
import { useLook } from '../look/useLook';
import type { FitView } from './fitView';
import { curvatureWords } from './fitWords';

/** The numbers of a fit in plain words, rounded to their uncertainty; all digits on demand. */
export function Result({ view }: { readonly view: FitView }) {
  const look = useLook();
  const { fit } = view;
  const { slopeFactor, heatCapacity, heat, temperature } = view.units;
  const percent = `${Math.round(fit.coverage * 100)} %`;
  const rows = [
    {
      label: 'Slope d(ΔH)/dT',
      value: slopeFactor * fit.slope,
      u: scaled(slopeFactor, fit.uSlope),
      interval: scaledInterval(slopeFactor, fit.slopeInterval),
      unit: heatCapacity,
    },
    {
      label: `ΔH at ${number(fit.reference)} ${prettyUnit(temperature.symbol)}`,
      value: fit.latent,
      u: fit.uLatent,
      interval: fit.latentInterval,
      unit: heat,
    },
  ];
  const latentSymbol = prettyUnit(heat.symbol);
  return (
    <div className={look.stack}>
      <table className={look.table}>
        <caption className={look.quiet} style={{ textAlign: 'left', paddingBottom: 4 }}>
          {fit.count} points from {number(fit.lowest)} to {number(fit.highest)} {prettyUnit(temperature.symbol)}; ± is
          the standard uncertainty (k = 1)
        </caption>
        <tbody>
          {rows.map(({ label, value, u, interval, unit }) => (
            <Quantity key={label} label={label} value={value} u={u} interval={interval} unit={unit} percent={percent} />
          ))}
          <tr>
            <th scope="row">Scatter about the line</th>
            <td>
              {fit.residualSd === undefined
                ? 'two points leave none'
                : `${number(fit.residualSd, '.')} ${latentSymbol} (residual standard deviation)`}
            </td>
          </tr>
          <tr>
            <th scope="row">R²</th>
            <td>
              {fit.rSquared === undefined
                ? 'all latent heats are equal'
                : Number(fit.rSquared.toPrecision(6)).toString()}
            </td>
          </tr>
          <tr>
            <th scope="row">Curvature</th>
            <td>{curvatureWords(fit.curvature())}</td>
          </tr>
          {fit.leftOut.length > 0 && (
            <tr>
              <th scope="row">Rows left out</th>
              <td>{leftOutWords(fit.leftOut)}</td>
            </tr>
          )}
        </tbody>
      </table>
      <details>
        <summary className={look.summary}>All digits</summary>
        <table className={look.table}>
          <tbody>
            {rows.flatMap(({ label, value, u, unit }) => [
              <tr key={label}>
                <th scope="row">{label}</th>
                <td>
                  {value} {prettyUnit(unit.symbol)}
                </td>
              </tr>,
              u !== undefined && (
                <tr key={`u ${label}`}>
                  <th scope="row">its standard uncertainty</th>
                  <td>{u}</td>
                </tr>
              ),
            ])}
          </tbody>
        </table>
      </details>
    </div>
  );
}

interface QuantityProps {
  readonly label: string;
  readonly value: number;
  readonly u: number | undefined;
  readonly interval: Interval | undefined;
  readonly unit: Unit;
  readonly percent: string;
}

function Quantity({ label, value, u, interval, unit, percent }: QuantityProps) {
  const look = useLook();
  const shown = roundToUncertainty(value, u);
  const uncertainty = u === undefined || u === 0 ? undefined : roundToUncertainty(u, u).text;
  return (
    <tr>
      <th scope="row">{label}</th>
      <td title={shown.full}>
        <span className={look.strong}>
          {shown.text}
          {uncertainty !== undefined && ` ± ${uncertainty}`} {prettyUnit(unit.symbol)}
        </span>
        <br />
        <span className={look.quiet}>
          {interval === undefined
            ? 'no uncertainty: two points fix the line'
            : `${percent} interval ${roundToUncertainty(interval.lower, u).text} to ${roundToUncertainty(interval.upper, u).text}`}
        </span>
      </td>
    </tr>
  );
}

function scaled(factor: number, value: number | undefined): number | undefined {
  return value === undefined ? undefined : Math.abs(factor) * value;
}

function scaledInterval(factor: number, interval: Interval | undefined): Interval | undefined {
  if (interval === undefined) return undefined;
  const ends = [factor * interval.lower, factor * interval.upper] as const;
  return { lower: Math.min(...ends), upper: Math.max(...ends) };
}

const MOST_NAMED = 6;

function leftOutWords(leftOut: readonly { readonly row: number; readonly reason: string }[]): string {
  const named = leftOut.slice(0, MOST_NAMED).map(({ row, reason }) => `row ${row} (${reason})`);
  const more = leftOut.length - named.length;
  return named.join(', ') + (more > 0 ? ` and ${more} more` : '');
}
