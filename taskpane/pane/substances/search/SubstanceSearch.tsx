import { Badge, Field, Input, makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { useEffect, useId, useMemo, useRef, useState, type KeyboardEvent } from 'react';
import type { CatalogueEntry } from '../../../../core/substance';
import { useLook } from '../../look/useLook';
import { nearestEntry } from './nearestEntry';
import { resultWords } from './resultWords';
import { searchEntries, type Hit } from './searchEntries';

const useStyles = makeStyles({
  list: {
    margin: '2px 0 0',
    padding: '2px',
    listStyleType: 'none',
    maxHeight: '250px',
    overflowY: 'auto',
    border: `1px solid ${tokens.colorNeutralStroke1}`,
    backgroundColor: tokens.colorNeutralBackground1,
  },
  option: {
    display: 'flex',
    flexWrap: 'wrap',
    columnGap: '8px',
    alignItems: 'baseline',
    padding: '4px 8px',
    cursor: 'pointer',
    borderLeft: '3px solid transparent',
    '@media (forced-colors: active)': { borderLeftColor: 'Canvas' },
    ':hover': { backgroundColor: tokens.colorNeutralBackground2 },
  },
  active: {
    backgroundColor: tokens.colorNeutralBackground2,
    borderLeftColor: 'var(--warmAccent)',
    '@media (forced-colors: active)': { outline: '2px solid Highlight', outlineOffset: '-2px' },
  },
  by: { color: tokens.colorNeutralForeground3, fontSize: '12px', overflowWrap: 'anywhere' },
});

export interface SubstanceSearchProps {
  readonly entries: readonly CatalogueEntry[];
  readonly chosen: CatalogueEntry | undefined;
  readonly onChoose: (entry: CatalogueEntry) => void;
}

/** Finds a substance by any of its names: type, go down with the arrow, Enter. */
export function SubstanceSearch({ entries, chosen, onChoose }: SubstanceSearchProps) {
  const look = useLook();
  const styles = useStyles();
  const base = useId();
  const list = useRef<HTMLUListElement>(null);
  const [text, setText] = useState('');
  const [open, setOpen] = useState(false);
  const [active, setActive] = useState(-1);
  const hits = useMemo(() => searchEntries(entries, text), [entries, text]);
  const meant = useMemo(() => (hits.length === 0 ? nearestEntry(entries, text) : undefined), [entries, hits, text]);
  const shown: readonly Hit[] = meant === undefined ? hits : [{ entry: meant, by: 'nearest name' }];
  useEffect(() => {
    list.current?.children[active]?.scrollIntoView({ block: 'nearest' });
  }, [active]);

  const choose = (entry: CatalogueEntry) => {
    setOpen(false);
    setActive(-1);
    setText(entry.name);
    onChoose(entry);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'Enter') {
      const hit = shown[active] ?? (text.trim() === '' ? undefined : shown[0]);
      if (hit !== undefined && (open || hit.entry !== chosen)) choose(hit.entry);
    } else if (event.key === 'Escape') setOpen(false);
    else if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      const way = event.key === 'ArrowDown' ? 1 : -1;
      if (open) setActive((active + way + shown.length) % Math.max(1, shown.length));
      else {
        setOpen(true);
        setActive(0);
      }
    } else return;
    event.preventDefault();
  };

  return (
    <div className={look.tight}>
      <Field label="Find a substance" hint="By name, formula, CAS number or another name for it">
        <Input
          className={look.narrow}
          role="combobox"
          aria-expanded={open}
          aria-controls={`${base}-list`}
          aria-autocomplete="list"
          {...(open && active >= 0 ? { 'aria-activedescendant': `${base}-${active}` } : {})}
          input={{ style: { minWidth: 0, width: '100%' }, spellCheck: false, autoComplete: 'off' }}
          value={text}
          onChange={(_, { value }) => {
            setText(value);
            setOpen(true);
            setActive(-1);
          }}
          onFocus={(event) => event.currentTarget.select()}
          onClick={() => setOpen(true)}
          onBlur={() => setOpen(false)}
          onKeyDown={onKeyDown}
        />
      </Field>
      <ul
        ref={list}
        id={`${base}-list`}
        role="listbox"
        aria-label="Substances"
        className={styles.list}
        hidden={!open || shown.length === 0}
      >
        {open &&
          shown.map(({ entry, by }, place) => (
            <li
              key={`${entry.group} ${entry.name}`}
              id={`${base}-${place}`}
              role="option"
              aria-selected={place === active}
              className={mergeClasses(styles.option, place === active && styles.active)}
              // The field keeps the focus, so that its list is still open when the click comes.
              onMouseDown={(event) => event.preventDefault()}
              onClick={() => choose(entry)}
            >
              <span>{entry.name}</span>
              <span className={styles.by}>{by ?? entry.formula}</span>
              {entry.group === 'house' && (
                <Badge size="small" appearance="outline">
                  house
                </Badge>
              )}
            </li>
          ))}
      </ul>
      <p className={look.quiet} role="status">
        {open || hits.length === 0 ? resultWords(text, hits, meant?.name) : ''}
      </p>
    </div>
  );
}
