import { makeStyles, tokens } from '@fluentui/react-components';
import { DATA_EDITION, EDITION } from '../../../functions/edge/editionText';

const useStyles = makeStyles({
  footer: {
    marginTop: 'auto',
    padding: '10px 14px 14px',
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    color: tokens.colorNeutralForeground3,
    fontSize: '12px',
    lineHeight: '17px',
    '& p': { margin: '0 0 4px' },
  },
});

/** What the answers are not for, and which edition gave them. */
export function Footer() {
  const styles = useStyles();
  return (
    <footer className={styles.footer}>
      <p>
        For engineering calculation only. Work with pressure, steam, cryogens or flammable vapour, the sizing of relief
        and refrigeration, and food and drug processes are ruled by local codes and licensed practice.
      </p>
      <p>
        Edition {EDITION}, data {DATA_EDITION}
      </p>
    </footer>
  );
}
