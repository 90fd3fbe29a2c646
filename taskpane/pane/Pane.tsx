import { FluentProvider, makeStyles, tokens } from '@fluentui/react-components';
import { lazy, Suspense } from 'react';
import type { WorkbookHost } from '../port';
import { FitSection } from './fit/FitSection';
import { Footer } from './look/Footer';
import { Header } from './look/Header';
import { Sections } from './look/Sections';
import { StaleNotice } from './look/StaleNotice';
import { useTheme } from './look/useTheme';
import { UnitsSection } from './units/UnitsSection';

/** Fetched when it is first shown: the pane does not wait for it. */
const SubstancesSection = lazy(() =>
  import('./substances/SubstancesSection').then(
    (module) => ({ default: module.SubstancesSection }),
    () => ({ default: () => <p>The substances could not be fetched. Close the pane and open it again.</p> }),
  ),
);

const useStyles = makeStyles({
  page: {
    display: 'flex',
    flexDirection: 'column',
    boxSizing: 'border-box',
    minHeight: '100%',
    minWidth: 0,
    backgroundColor: 'var(--paper)',
    color: tokens.colorNeutralForeground1,
    fontSize: '14px',
    lineHeight: '20px',
  },
  column: { display: 'flex', flexDirection: 'column', flexGrow: 1, minWidth: 0, maxWidth: '560px' },
});

/** The whole pane: its name, the sections, the caution. */
export function Pane({ host }: { readonly host: WorkbookHost }) {
  const styles = useStyles();
  const theme = useTheme();
  return (
    <FluentProvider theme={theme} className={styles.page}>
      <section className={styles.column} aria-label="Latentry">
        <Header />
        <StaleNotice host={host} />
        <Sections
          sections={[
            { id: 'units', label: 'Units', content: <UnitsSection host={host} /> },
            { id: 'fit', label: 'ΔCp fit', content: <FitSection host={host} /> },
            {
              id: 'substances',
              label: 'Substances',
              late: true,
              content: (
                <Suspense fallback={<p>Fetching the substances…</p>}>
                  <SubstancesSection host={host} />
                </Suspense>
              ),
            },
          ]}
        />
        <Footer />
      </section>
    </FluentProvider>
  );
}
