import { number } from '../../look/number';
import { useLook } from '../../look/useLook';
import { onScale, written, type UnitWriter } from '../facts/unitWriter';
import type { DiagramRow } from './diagramRows';

/** The numbers of the diagram from cold to hot. */
export function DiagramTable({ rows, writer }: { readonly rows: readonly DiagramRow[]; readonly writer: UnitWriter }) {
  const look = useLook();
  const { temperature, heat, heatCapacity, decimal } = writer;
  const at = (kelvin: number) => number(onScale(kelvin, temperature), decimal);
  return (
    <div className={look.scroll} tabIndex={0} role="group" aria-label="Numbers of the diagram">
      <table className={look.table}>
        <thead>
          <tr>
            <th scope="col">phase or change</th>
            <th scope="col">T / {temperature.unit}</th>
            <th scope="col">mean slope, or heat across</th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row, i) => (
            <tr key={i}>
              <th scope="row">{row.name}</th>
              <td>{row.of === 'phase' ? `${at(row.fromK)} to ${at(row.toK)}` : at(row.atK)}</td>
              <td>
                {row.of === 'transition'
                  ? written(row.latent, heat, decimal)
                  : row.slope === undefined
                    ? 'known at this temperature only'
                    : written(row.slope, heatCapacity, decimal)}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
