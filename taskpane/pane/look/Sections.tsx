import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { useId, useRef, useState, type KeyboardEvent, type ReactNode } from 'react';

export interface SectionSpec {
  readonly id: string;
  readonly label: string;
  readonly content: ReactNode;
  /** True for a section that is made when it is first shown, so that the pane does not wait for it. */
  readonly late?: boolean;
}

const useStyles = makeStyles({
  tabs: {
    display: 'flex',
    flexWrap: 'wrap',
    gap: '2px',
    padding: '0 10px',
    borderBottom: `1px solid ${tokens.colorNeutralStroke1}`,
  },
  tab: {
    padding: '8px 12px 7px',
    border: '1px solid transparent',
    borderBottom: 'none',
    borderRadius: '3px 3px 0 0',
    marginBottom: '-1px',
    backgroundColor: 'transparent',
    color: tokens.colorNeutralForeground2,
    font: 'inherit',
    cursor: 'pointer',
    ':hover': { color: tokens.colorNeutralForeground1, textDecorationLine: 'underline', textUnderlineOffset: '4px' },
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '-3px' },
  },
  shown: {
    borderTopColor: tokens.colorNeutralStroke1,
    borderLeftColor: tokens.colorNeutralStroke1,
    borderRightColor: tokens.colorNeutralStroke1,
    backgroundColor: 'var(--paper)',
    color: tokens.colorBrandForeground1,
    fontWeight: 600,
    boxShadow: `inset 0 3px 0 ${tokens.colorBrandStroke1}`,
    '@media (forced-colors: active)': { outline: '2px solid CanvasText', outlineOffset: '-4px' },
  },
  panel: { padding: '14px', minWidth: 0 },
});

/** Which tab a key leads to: arrows go round, Home and End to the ends. */
function nextPlace(key: string, place: number, count: number): number | undefined {
  switch (key) {
    case 'ArrowRight':
      return (place + 1) % count;
    case 'ArrowLeft':
      return (place + count - 1) % count;
    case 'Home':
      return 0;
    case 'End':
      return count - 1;
    default:
      return undefined;
  }
}

/** The switch between the pane's sections; a section keeps what was typed while another is shown. */
export function Sections({ sections }: { readonly sections: readonly SectionSpec[] }) {
  const styles = useStyles();
  const base = useId();
  const tabs = useRef<HTMLDivElement>(null);
  const [shown, setShown] = useState(0);
  const [visited, setVisited] = useState<ReadonlySet<number>>(new Set());
  const show = (place: number) => {
    setShown(place);
    setVisited((before) => new Set(before).add(place));
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const next = nextPlace(event.key, shown, sections.length);
    if (next === undefined) return;
    event.preventDefault();
    show(next);
    tabs.current?.querySelectorAll<HTMLElement>('[role="tab"]')[next]?.focus();
  };
  return (
    <>
      <div ref={tabs} className={styles.tabs} role="tablist" aria-label="Sections" onKeyDown={onKeyDown}>
        {sections.map(({ id, label }, place) => (
          <button
            key={id}
            type="button"
            role="tab"
            id={`${base}-tab-${id}`}
            aria-controls={`${base}-panel-${id}`}
            aria-selected={place === shown}
            tabIndex={place === shown ? 0 : -1}
            className={mergeClasses(styles.tab, place === shown && styles.shown)}
            onClick={() => show(place)}
          >
            {label}
          </button>
        ))}
      </div>
      {sections.map(({ id, content, late }, place) => (
        <div
          key={id}
          className={styles.panel}
          role="tabpanel"
          id={`${base}-panel-${id}`}
          aria-labelledby={`${base}-tab-${id}`}
          hidden={place !== shown}
        >
          {(late !== true || visited.has(place)) && content}
        </div>
      ))}
    </>
  );
}
