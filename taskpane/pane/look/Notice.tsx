import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import type { ReactNode } from 'react';

const useStyles = makeStyles({
  notice: {
    display: 'flex',
    flexDirection: 'column',
    gap: '8px',
    alignItems: 'flex-start',
    padding: '8px 10px',
    borderLeft: `4px solid ${tokens.colorBrandStroke1}`,
    backgroundColor: tokens.colorNeutralBackground2,
    color: tokens.colorNeutralForeground1,
    overflowWrap: 'anywhere',
  },
  caution: { borderLeftColor: 'var(--warmAccent)' },
  error: { borderLeftColor: tokens.colorStatusDangerBorder2, borderLeftStyle: 'double', borderLeftWidth: '6px' },
});

export type NoticeTone = 'plain' | 'caution' | 'error';

/** A few words with a bar beside them; an error is read out at once. */
export function Notice({ tone = 'plain', children }: { readonly tone?: NoticeTone; readonly children: ReactNode }) {
  const styles = useStyles();
  const look = tone === 'plain' ? undefined : styles[tone];
  return (
    <div className={mergeClasses(styles.notice, look)} role={tone === 'error' ? 'alert' : undefined}>
      {children}
    </div>
  );
}
