import type { Substance } from '../../../../core/substance';
import { useLook } from '../../look/useLook';
import { InsertNotice } from '../insert/InsertNotice';
import type { Inserting } from '../insert/useInsert';
import { writeValue, type UnitWriter } from '../facts/unitWriter';
import { Button } from '@fluentui/react-components';

/** The named constants of a substance, each with its source and standing. */
export function Constants({
  substance,
  writer,
  inserting,
}: {
  readonly substance: Substance;
  readonly writer: UnitWriter;
  readonly inserting: Inserting;
}) {
  const look = useLook();
  const sources = [...new Set(substance.constants.map(({ source }) => source))];
  return (
    <>
      <table className={look.table}>
        <tbody>
          {substance.constants.map((datum) => {
            const { text, unit, full } = writeValue(datum, writer);
            const name = `constant: ${datum.item}`;
            const { last } = inserting;
            return [
              <tr key={datum.item}>
                <th scope="row">{datum.item}</th>
                <td title={full}>
                  <span className={look.strong}>
                    {text} {unit}
                  </span>
                  <br />
                  <span className={look.quiet}>
                    source {sources.indexOf(datum.source) + 1}
                    {!datum.confirmed && '; unconfirmed: one source, or memory, stands behind it'}
                  </span>
                </td>
                <td style={{ width: '1%' }}>
                  <Button
                    size="small"
                    type="button"
                    style={{ minWidth: 0 }}
                    aria-label={`Insert formula: ${name}`}
                    onClick={() =>
                      void inserting.insert(name, {
                        name: 'CONSTANT',
                        arguments: [{ text: substance.name }, { text: datum.item }],
                      })
                    }
                  >
                    Insert
                  </Button>
                </td>
              </tr>,
              last?.name === name && (
                <tr key={`${name}, inserted`}>
                  <td colSpan={3}>
                    <InsertNotice outcome={last.outcome} inserting={inserting} />
                  </td>
                </tr>
              ),
            ];
          })}
        </tbody>
      </table>
      <ol className={look.quiet} style={{ paddingLeft: 20 }} aria-label="Sources of the constants">
        {sources.map((source) => (
          <li key={source}>{source}</li>
        ))}
      </ol>
    </>
  );
}
