import { defineSlotRecipe } from '@chakra-ui/react';

const heavy = '1.5px solid var(--dfl-colors-ink)';
const hair = '1px solid var(--dfl-colors-rule)';

/** Rules above, below and under the head; units on a line of their own; a hairline at each fifth row. */
export const tableRecipe = defineSlotRecipe({
  slots: ['scroll', 'root', 'unit', 'sort', 'filter', 'foot', 'cards'],
  base: {
    scroll: { overflowX: 'auto', marginRight: { base: '-20px', md: 0 }, paddingRight: { base: '20px', md: 0 } },
    root: {
      borderCollapse: 'collapse',
      width: '100%',
      textStyle: 'table',
      fontFeatureSettings: '"tnum", "kern"',
      borderTop: heavy,
      borderBottom: heavy,
      '& th': {
        textStyle: 'tableHead',
        color: 'ink2',
        textAlign: 'left',
        verticalAlign: 'bottom',
        padding: { base: '7px 12px 7px 0', lg: '7px 20px 7px 0' },
        borderBottom: '1px solid',
        borderColor: 'ink',
      },
      '& tbody th': { borderBottom: 'none', color: 'ink', fontWeight: 400, fontSize: '14px', lineHeight: '20px' },
      '& td, & tbody th': { padding: { base: '4px 12px 4px 0', lg: '4px 20px 4px 0' }, verticalAlign: 'baseline' },
      '& tr > :last-child': { paddingRight: 0 },
      '& .n': { textAlign: 'right', whiteSpace: 'nowrap' },
      '& tbody tr.fifth td, & tbody tr.fifth th': { borderTop: hair },
      '& tr.emphasis td, & tr.emphasis th': { fontWeight: 600 },
      '& tr[aria-selected=true]': { background: 'accentTint' },
      '& .wide-only': { display: { base: 'none', md: 'table-cell' } },
      '& .pad': { visibility: 'hidden' },
      '& caption': { position: 'absolute', width: '1px', height: '1px', overflow: 'hidden', clipPath: 'inset(50%)' },
      '& tbody tr:focus-visible': { outlineOffset: '-2px' },
    },
    unit: { display: 'block', fontWeight: 400, color: 'ink3' },
    sort: {
      background: 'none',
      cursor: 'pointer',
      fontWeight: 500,
      textAlign: 'inherit',
      color: 'inherit',
      _hover: { color: 'accent' },
    },
    filter: { display: 'inline-flex', alignItems: 'baseline', gap: '8px', textStyle: 'small' },
    foot: {
      display: 'flex',
      flexWrap: 'wrap',
      gap: '2px 16px',
      textStyle: 'caption',
      color: 'ink2',
      marginTop: '10px',
    },
    cards: {},
  },
  variants: {
    allColumns: {
      true: { root: { '& .wide-only': { display: 'table-cell' }, minWidth: { base: '760px', md: 'auto' } } },
    },
    dense: { true: { root: { '& td, & th': { paddingRight: '13px' } } } },
  },
});

/** The list of released sheets: one row a sheet, two lines a sheet on a narrow screen. */
export const sheetListRecipe = defineSlotRecipe({
  slots: ['root'],
  base: {
    root: {
      '& table': { marginTop: '14px' },
      '& table td': { paddingBlock: { base: 0, md: '3px' }, lineHeight: '21px', paddingRight: { base: 0, md: '13px' } },
      '& table th': { paddingRight: '13px' },
      '& table td.pair': { whiteSpace: { base: 'normal', md: 'nowrap' } },
      '& table td.pair a': { fontWeight: 500, textDecorationColor: 'transparent' },
      '& table tbody tr:hover td': { background: 'sunk' },
      '& table tbody tr:hover td.pair a': { textDecorationColor: 'accent' },
      '& .formula': {
        color: 'ink3',
        fontSize: '12.5px',
        marginLeft: '6px',
        whiteSpace: 'nowrap',
        display: { base: 'inline-block', md: 'none', lg: 'inline' },
      },
      '& table td.value': { fontWeight: 600 },
      '& .extent': { color: 'ink2' },
      '& table .side': { display: { base: 'none', lg: 'table-cell' } },
      '& table thead': { display: { base: 'none', md: 'table-header-group' } },
      '& table tbody tr': {
        display: { base: 'grid', md: 'table-row' },
        gridTemplateColumns: '1fr auto auto',
        gap: { base: '0 12px', md: 0 },
        padding: { base: '9px 0', md: 0 },
        borderTop: { base: hair, md: 'none' },
      },
      '& table td.pair, & table td.word': { gridColumn: { base: '1 / 3' } },
      '& table td.value, & table td.version': { textAlign: 'right' },
      '& table td.rule': { gridRow: { base: 2 }, gridColumn: { base: 1 } },
    },
  },
});

/** Series with an in/out switch; the reason of what is left out on a second line. */
export const ledgerRecipe = defineSlotRecipe({
  slots: ['root', 'switch', 'reason'],
  base: {
    root: { '& td, & th': { paddingRight: '13px' } },
    switch: {
      display: 'inline-flex',
      gap: '3px',
      alignItems: 'center',
      background: 'none',
      cursor: 'pointer',
      borderBottom: '1.5px solid',
      borderColor: 'control',
      lineHeight: '20px',
      minWidth: '52px',
      whiteSpace: 'nowrap',
      paddingBlock: { base: '6px', md: '2px' },
      '&[aria-pressed=false]': { color: 'ink2', borderBottomStyle: 'dashed' },
    },
    reason: {
      color: 'ink2',
      fontSize: '13px',
      lineHeight: '18px',
      '& b': { fontWeight: 600, color: 'ink', marginRight: '6px' },
    },
  },
});

/** Per column two sub-columns: as pasted, and as understood; doubtful cells tinted and numbered. */
export const pastedGridRecipe = defineSlotRecipe({
  slots: ['root', 'pasted', 'understood', 'doubt', 'number', 'legend', 'swatch'],
  base: {
    root: { minWidth: { base: '860px', md: 'auto' }, '& td, & th': { paddingRight: '8px' } },
    pasted: { textStyle: 'pasted', color: 'ink3', textAlign: 'right', whiteSpace: 'nowrap' },
    understood: { textAlign: 'right', whiteSpace: 'nowrap', paddingRight: '13px' },
    doubt: {
      position: 'relative',
      background: 'warnTint',
      boxShadow: 'inset 0 -1.5px 0 var(--dfl-colors-warn)',
      '&[data-part=pasted]': { color: 'ink2' },
      '&[data-open]': { fontWeight: 600, color: 'warn' },
    },
    number: {
      color: 'warn',
      fontWeight: 600,
      fontSize: '11.5px',
      lineHeight: '10px',
      position: 'absolute',
      right: '2px',
      top: '11px',
    },
    legend: {
      display: 'flex',
      flexWrap: 'wrap',
      gap: '2px 24px',
      textStyle: 'caption',
      color: 'ink2',
      marginTop: '8px',
    },
    swatch: {
      display: 'inline-block',
      width: '22px',
      height: '14px',
      verticalAlign: '-2px',
      marginRight: '7px',
      background: 'warnTint',
      boxShadow: 'inset 0 -1.5px 0 var(--dfl-colors-warn)',
    },
  },
});

/** An uncertainty budget in two groups, with a bar on the scale of the largest share. */
export const budgetRecipe = defineSlotRecipe({
  slots: ['root', 'group', 'bar'],
  base: {
    root: { '& td': { paddingBlock: '5px' } },
    group: { '& td': { paddingTop: '9px', color: 'ink' }, '& b': { fontWeight: 600, fontSize: '13px' } },
    bar: { height: '8px', background: 'ink3', '&[data-longest]': { background: 'ink' } },
  },
});

/** Two versions side by side: numbers that changed in weight 500. */
export const versionDiffRecipe = defineSlotRecipe({
  slots: ['root', 'words'],
  base: {
    root: { '& td:nth-of-type(2), & td:nth-of-type(3)': { fontWeight: 500 } },
    words: { maxWidth: '680px', '& p': { marginBottom: '14px' } },
  },
});
