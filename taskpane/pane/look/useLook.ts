import { makeStyles, tokens } from '@fluentui/react-components';
import { headingFamily } from './theme';

/** Styles that several sections share: headings, stacks, tables, numbers. */
export const useLook = makeStyles({
  stack: { display: 'flex', flexDirection: 'column', gap: '12px', minWidth: 0 },
  tight: { display: 'flex', flexDirection: 'column', gap: '4px', minWidth: 0 },
  row: { display: 'flex', flexWrap: 'wrap', gap: '8px', alignItems: 'center' },
  pair: { display: 'grid', gridTemplateColumns: 'repeat(2, minmax(0, 1fr))', gap: '10px', alignItems: 'start' },
  narrow: { minWidth: 0, width: '100%' },
  title: { margin: 0, fontFamily: headingFamily, fontWeight: 600, fontSize: '18px', lineHeight: '24px' },
  subtitle: {
    margin: '4px 0 0',
    paddingTop: '10px',
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    fontFamily: headingFamily,
    fontWeight: 600,
    fontSize: '15px',
    lineHeight: '20px',
  },
  text: { margin: 0, lineHeight: '20px', overflowWrap: 'anywhere' },
  quiet: {
    margin: 0,
    color: tokens.colorNeutralForeground3,
    fontSize: '12px',
    lineHeight: '17px',
    overflowWrap: 'anywhere',
  },
  strong: { fontWeight: 600, fontVariantNumeric: 'tabular-nums' },
  list: { margin: 0, paddingLeft: '18px', lineHeight: '20px' },
  table: {
    width: '100%',
    borderCollapse: 'collapse',
    fontSize: '13px',
    fontVariantNumeric: 'tabular-nums',
    '& th, & td': {
      padding: '4px 6px 4px 0',
      borderBottom: `1px solid ${tokens.colorNeutralStroke2}`,
      textAlign: 'left',
      verticalAlign: 'top',
    },
    '& thead th': { color: tokens.colorNeutralForeground3, fontWeight: 600, fontSize: '12px' },
    '& tbody th': { fontWeight: 400, minWidth: '76px' },
  },
  scroll: { overflow: 'auto', maxHeight: '280px', maxWidth: '100%' },
  summary: { cursor: 'pointer', color: tokens.colorBrandForeground1, lineHeight: '22px' },
});
