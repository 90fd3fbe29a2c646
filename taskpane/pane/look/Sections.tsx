import { makeStyles, Tab, TabList, tokens } from '@fluentui/react-components';
import { useId, useState, type ReactNode } from 'react';

export interface SectionSpec {
  readonly id: string;
  readonly label: string;
  readonly content: ReactNode;
}

const useStyles = makeStyles({
  tabs: {
    flexWrap: 'wrap',
    borderBottom: `1px solid ${tokens.colorNeutralStroke1}`,
    paddingLeft: '6px',
    paddingRight: '6px',
  },
  panel: { padding: '14px', minWidth: 0 },
});

/** The switch between the pane's sections; a section keeps what was typed while another is shown. */
export function Sections({ sections }: { readonly sections: readonly SectionSpec[] }) {
  const styles = useStyles();
  const base = useId();
  const [shown, show] = useState(sections[0]?.id);
  return (
    <>
      <TabList
        className={styles.tabs}
        aria-label="Sections"
        selectedValue={shown}
        selectTabOnFocus
        onTabSelect={(_, data) => show(String(data.value))}
      >
        {sections.map(({ id, label }) => (
          <Tab key={id} value={id} id={`${base}-tab-${id}`} aria-controls={`${base}-panel-${id}`}>
            {label}
          </Tab>
        ))}
      </TabList>
      {sections.map(({ id, content }) => (
        <div
          key={id}
          className={styles.panel}
          role="tabpanel"
          id={`${base}-panel-${id}`}
          aria-labelledby={`${base}-tab-${id}`}
          hidden={id !== shown}
        >
          {content}
        </div>
      ))}
    </>
  );
}
