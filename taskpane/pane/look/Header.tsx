import { makeStyles, tokens } from '@fluentui/react-components';
import { headingFamily } from './theme';

const useStyles = makeStyles({
  header: {
    display: 'flex',
    alignItems: 'center',
    gap: '10px',
    padding: '12px 14px 8px',
    color: tokens.colorBrandForeground1,
  },
  name: { margin: 0, fontFamily: headingFamily, fontSize: '20px', lineHeight: '24px', fontWeight: 600 },
  motto: { margin: 0, fontSize: '12px', lineHeight: '16px', color: tokens.colorNeutralForeground3 },
});

/** The name with its mark: an enthalpy curve with a gap in it. */
export function Header() {
  const styles = useStyles();
  return (
    <header className={styles.header}>
      <svg width="34" height="34" viewBox="0 0 34 34" fill="none" aria-hidden="true" focusable="false">
        <path d="M3 30 L11 25 V14 L21 10" stroke="currentColor" strokeWidth="2.6" strokeLinejoin="round" />
        <path d="M21 10 V5 L31 2" stroke="var(--warmAccent)" strokeWidth="2.6" strokeLinejoin="round" />
        <circle cx="11" cy="19.5" r="2.6" fill="var(--paper)" stroke="currentColor" strokeWidth="1.6" />
      </svg>
      <div>
        <h1 className={styles.name}>Latentry</h1>
        <p className={styles.motto}>Heat of phase change, in cells</p>
      </div>
    </header>
  );
}
