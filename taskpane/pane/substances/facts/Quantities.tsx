import { Button, makeStyles } from '@fluentui/react-components';
import { useLook } from '../../look/useLook';
import { InsertNotice } from '../insert/InsertNotice';
import type { Inserting } from '../insert/useInsert';
import type { Quantity } from './quantity';
import { writeValue, type UnitWriter } from './unitWriter';
import { problemWords } from './problemWords';

const useStyles = makeStyles({
  label: { width: '38%' },
  action: { width: '1%', whiteSpace: 'nowrap' },
  button: { minWidth: 0 },
});

export interface QuantitiesProps {
  readonly caption?: string;
  readonly quantities: readonly Quantity[];
  readonly writer: UnitWriter;
  readonly inserting: Inserting;
}

/** Lines of a card: what, how much, and a button that puts the formula for it into the selected cell. */
export function Quantities({ caption, quantities, writer, inserting }: QuantitiesProps) {
  const look = useLook();
  const styles = useStyles();
  return (
    <table className={look.table}>
      {caption !== undefined && (
        <caption style={{ textAlign: 'left', paddingTop: 6 }}>
          <strong>{caption}</strong>
        </caption>
      )}
      <tbody>
        {quantities.map(({ label, name, fact, ask }) => {
          const { last } = inserting;
          const notice = last?.name === name ? last.outcome : undefined;
          return [
            <tr key={name}>
              <th scope="row" className={styles.label}>
                {label}
              </th>
              {fact.problem === undefined ? (
                <ValueCells fact={fact.answer} writer={writer} />
              ) : (
                <td colSpan={2} className={look.quiet}>
                  {problemWords(fact.problem, writer)}
                </td>
              )}
              {fact.problem === undefined && (
                <td className={styles.action}>
                  <Button
                    size="small"
                    type="button"
                    className={styles.button}
                    aria-label={`Insert formula: ${name}`}
                    onClick={() => void inserting.insert(name, ask)}
                  >
                    Insert
                  </Button>
                </td>
              )}
            </tr>,
            notice !== undefined && (
              <tr key={`${name}, inserted`}>
                <td colSpan={3}>
                  <InsertNotice outcome={notice} inserting={inserting} />
                </td>
              </tr>
            ),
          ];
        })}
      </tbody>
    </table>
  );
}

function ValueCells({
  fact,
  writer,
}: {
  readonly fact: NonNullable<Quantity['fact']['answer']>;
  readonly writer: UnitWriter;
}) {
  const look = useLook();
  const { text, unit, full } = writeValue(fact, writer);
  return (
    <td title={full}>
      <span className={look.strong}>
        {text} <span style={{ whiteSpace: 'nowrap' }}>{unit}</span>
      </span>
      {fact.marks.map(({ code, text: words }) => (
        <span key={code + words} className={look.quiet}>
          <br />
          {words}
        </span>
      ))}
    </td>
  );
}
