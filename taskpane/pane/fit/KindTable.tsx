import { number, prettyUnit } from '../look/number';
import { roundToUncertainty } from '../look/roundToUncertainty';
import { useLook } from '../look/useLook';
import type { FitChoice } from './fitChoice';
import type { FitView } from './fitView';
import { slopeWords } from './fitWords';
import { kindRows, type Kinds } from './kindRows';

/** Which kind the slope is, and the other kinds beside it where the substance is known. */
export function KindTable({ view, choice }: { readonly view: FitView; readonly choice: FitChoice }) {
  const look = useLook();
  const kinds = kindRows(view, choice);
  return (
    <div className={look.stack}>
      <p className={look.text}>{slopeWords(choice.kind)}</p>
      {kinds === undefined ? (
        <p className={look.quiet}>Name the substance above to see the other kinds of slope beside yours.</p>
      ) : (
        <Table view={view} choice={choice} kinds={kinds} />
      )}
    </div>
  );
}

function Table({ view, choice, kinds }: { readonly view: FitView; readonly choice: FitChoice; readonly kinds: Kinds }) {
  const look = useLook();
  const u = view.fit.uSlope === undefined ? undefined : Math.abs(view.units.slopeFactor) * view.fit.uSlope;
  const unit = prettyUnit(view.units.heatCapacity.symbol);
  const at = `${number(view.fit.centre)} ${prettyUnit(view.units.temperature.symbol)}`;
  return (
    <>
      <table className={look.table}>
        <caption className={look.quiet} style={{ textAlign: 'left', paddingBottom: 4 }}>
          Slopes for {choice.change} of {choice.substance} in {unit}, at the mean temperature of the data, {at}
        </caption>
        <thead>
          <tr>
            <th scope="col">Kind</th>
            <th scope="col">Your data</th>
            <th scope="col">Catalogue</th>
          </tr>
        </thead>
        <tbody>
          {kinds.rows.map(({ kind, own, catalogue, fitted }) => (
            <tr key={kind}>
              <th scope="row">{own ? <strong>{kind} (yours)</strong> : kind}</th>
              <td title={fitted === undefined ? undefined : String(fitted)}>
                {fitted === undefined ? '–' : roundToUncertainty(fitted, u).text}
              </td>
              <td>{typeof catalogue === 'number' ? number(catalogue) : catalogue}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className={look.quiet}>
        {typeof kinds.term === 'number'
          ? `Along the line, ${number(kinds.term)} ${unit} of the slope is volume and pressure changing, not a heat capacity.`
          : `The part of the slope that is no heat capacity is not known here: ${kinds.term}.`}{' '}
        Other kinds than yours are your slope moved by the catalogue’s difference. Combine a latent heat only with the
        slope of its own kind.
      </p>
    </>
  );
}
