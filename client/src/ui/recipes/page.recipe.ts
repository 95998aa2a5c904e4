import { defineSlotRecipe } from '@chakra-ui/react';

const edge = {
  base: '20px',
  md: '32px',
  lg: '72px',
  // Wider than 1440 the page stays 1440 wide, centred.
  xl: 'calc((100% - 1296px) / 2)',
};

export const mastheadRecipe = defineSlotRecipe({
  slots: ['root', 'word', 'nav', 'link', 'find', 'preferences', 'preference', 'menu', 'panel'],
  base: {
    root: {
      display: 'flex',
      flexWrap: { base: 'wrap', md: 'nowrap' },
      alignItems: 'baseline',
      justifyContent: 'space-between',
      gap: { base: '4px 16px', md: '24px', lg: '36px' },
      paddingInline: edge,
      paddingTop: { base: '14px', md: '22px' },
      paddingBottom: { base: '10px', md: '14px' },
      borderBottom: '2px solid',
      borderColor: 'ink',
      position: 'relative',
      zIndex: 4,
      _after: { content: '""', position: 'absolute', insetInline: 0, bottom: '-6px', height: '1px', background: 'ink' },
    },
    word: {
      fontSize: { base: '24px', md: '26px' },
      lineHeight: '28px',
      fontWeight: 600,
      letterSpacing: '-0.035em',
      textDecoration: 'none',
      '& i': { fontWeight: 500, color: 'accent', paddingRight: '0.045em' },
    },
    nav: {
      display: { base: 'none', md: 'flex' },
      '&[data-open]': { display: 'flex' },
      order: { base: 1, md: 0 },
      width: { base: '100%', md: 'auto' },
      flexDirection: { base: 'column', md: 'row' },
      gap: { base: '0', md: '16px', lg: '24px' },
      textStyle: 'control',
      whiteSpace: 'nowrap',
    },
    link: {
      textDecoration: 'none',
      paddingBlock: { base: '6px', md: 0 },
      _hover: { textDecoration: 'underline' },
      '&[aria-current]': {
        fontWeight: 600,
        textDecoration: 'underline',
        textDecorationColor: 'accent',
        textDecorationThickness: '2px',
        textUnderlineOffset: '6px',
      },
    },
    find: {
      flex: 1,
      display: { base: 'none', md: 'block' },
      '&[data-open]': { display: 'block' },
      order: { base: 2, md: 0 },
      minWidth: { base: '100%', md: '90px' },
      maxWidth: { base: 'none', md: '180px', lg: '300px' },
      marginLeft: 'auto',
      '& input': {
        width: '100%',
        background: 'none',
        borderBottom: '1px solid',
        borderColor: 'control',
        textStyle: 'control',
        textOverflow: 'ellipsis',
      },
    },
    preferences: {
      display: { base: 'none', md: 'flex' },
      '&[data-open]': { display: 'flex' },
      order: { base: 3, md: 0 },
      width: { base: '100%', md: 'auto' },
      flexWrap: { base: 'wrap', md: 'nowrap' },
      gap: { base: '8px 22px', md: '16px', lg: '22px' },
      paddingTop: { base: '8px', md: 0 },
      fontSize: '14px',
      lineHeight: '24px',
      whiteSpace: 'nowrap',
    },
    preference: {
      color: 'ink2',
      textDecoration: 'none',
      cursor: 'pointer',
      background: 'none',
      _hover: { color: 'accent' },
    },
    menu: { display: { base: 'block', md: 'none' }, textStyle: 'control', paddingBlock: '6px', cursor: 'pointer' },
    panel: {
      position: 'absolute',
      top: '100%',
      right: { base: '20px', md: 'auto' },
      zIndex: 5,
      minWidth: '232px',
      background: 'paper',
      border: '1px solid',
      borderColor: 'control',
      borderRadius: 'control',
      padding: '12px 16px 14px',
      marginTop: '4px',
      textStyle: 'small',
      color: 'ink',
      display: 'grid',
      '&[hidden]': { display: 'none' },
      gap: '8px',
      whiteSpace: 'normal',
    },
  },
});

export const runningHeadRecipe = defineSlotRecipe({
  slots: ['root', 'path', 'guide', 'folio'],
  base: {
    root: {
      display: 'grid',
      gridTemplateColumns: { base: 'minmax(0, 1fr) auto', md: '1fr auto 224px', lg: '1fr auto 296px' },
      columnGap: { base: '12px', md: '32px', lg: '56px' },
      paddingInline: edge,
      paddingTop: { base: '10px', md: '12px' },
      paddingBottom: '8px',
      marginTop: '6px',
      textStyle: 'margin',
      color: 'ink2',
      borderBottom: '1px solid',
      borderColor: 'rule',
      position: 'sticky',
      top: 0,
      background: 'paper',
      zIndex: 3,
      fontFeatureSettings: '"tnum"',
    },
    path: {
      paddingLeft: { base: 0, md: '32px', lg: '48px' },
      whiteSpace: 'nowrap',
      overflow: 'hidden',
      textOverflow: 'ellipsis',
      '& ol': { display: 'flex', listStyle: 'none' },
      '& li + li::before': { content: '"/"', marginInline: '0.55em', color: 'ink3' },
      '& a': { textDecoration: 'none', _hover: { textDecoration: 'underline' } },
      '& [aria-current]': { color: 'ink', fontWeight: 500 },
      // A narrow head keeps the name of the parent alone.
      '& li:not([data-narrow])': { display: { base: 'none', md: 'inline' } },
      '& li[data-narrow]::before': { display: { base: 'none', md: 'inline' } },
    },
    guide: { display: { base: 'none', md: 'block' }, fontStyle: 'italic', textAlign: 'right' },
    folio: {
      color: 'ink',
      display: 'flex',
      gap: '14px',
      justifyContent: 'space-between',
      '& > :last-child:not(:first-of-type)': { display: { base: 'none', lg: 'inline' } },
    },
  },
});

export const sectionRecipe = defineSlotRecipe({
  slots: ['leaf', 'root', 'number', 'column', 'heading', 'margin'],
  base: {
    leaf: {
      paddingInline: edge,
      paddingBottom: { base: '48px', md: '72px' },
      minHeight: '50vh',
      _focusVisible: { outline: 'none' },
    },
    root: {
      display: { base: 'block', md: 'grid' },
      gridTemplateColumns: { md: '32px minmax(0, 1fr) 32px 224px', lg: '48px minmax(0, 1fr) 56px 296px' },
      paddingTop: { base: '36px', md: '52px' },
      scrollMarginTop: '24px',
    },
    number: {
      gridColumn: 1,
      float: { base: 'left', md: 'none' },
      marginRight: { base: '10px', md: 0 },
      fontSize: '16px',
      lineHeight: '28px',
      color: 'ink3',
      fontFeatureSettings: '"tnum"',
    },
    column: {
      gridColumn: 2,
      minWidth: 0,
      '& > h2 + *': { marginTop: '12px' },
      '& > p': { maxWidth: '640px' },
      '& > p + p': { marginTop: '10px' },
    },
    heading: { textStyle: 'section', '& a': { textDecoration: 'none' } },
    margin: { gridColumn: 4, marginTop: { base: '20px', md: 0 }, textStyle: 'margin', color: 'ink2' },
  },
  variants: {
    gap: {
      title: { root: {} },
      small: { root: { paddingTop: { base: '28px', md: '40px' } } },
      tight: { root: { paddingTop: { base: '28px', md: '34px' } } },
      normal: {},
    },
  },
  defaultVariants: { gap: 'normal' },
});

export const marginBlockRecipe = defineSlotRecipe({
  slots: ['root', 'heading', 'list'],
  base: {
    root: {
      borderTop: '1px solid',
      borderColor: 'rule',
      padding: { base: '9px 0 12px', md: '9px 0 14px' },
      _first: { borderColor: 'ink' },
      '& p + p': { marginTop: '6px' },
    },
    heading: { fontSize: '13px', lineHeight: '20px', color: 'ink', fontWeight: 600, marginBottom: '4px' },
    list: {
      display: 'grid',
      gridTemplateColumns: { base: '104px minmax(0, 1fr)', md: '80px minmax(0, 1fr)', lg: '88px minmax(0, 1fr)' },
      columnGap: '8px',
      fontFeatureSettings: '"tnum"',
      '& dt': { color: 'ink3' },
      '& dd': { color: 'ink', overflowWrap: 'anywhere' },
    },
  },
  variants: {
    kind: {
      facts: {},
      // A word or link at the left, its size or figure at the right.
      files: {
        list: {
          gridTemplateColumns: '1fr auto',
          lineHeight: { base: '36px', md: '24px' },
          '& dt': { color: 'ink' },
          '& dd': { color: 'ink3', textAlign: 'right' },
        },
      },
      news: {
        list: {
          gridTemplateColumns: '52px minmax(0, 1fr)',
          rowGap: '5px',
          '& dd': { color: 'ink2' },
          '& dd a': { color: 'ink' },
        },
      },
    },
  },
  defaultVariants: { kind: 'facts' },
});

export const footerRecipe = defineSlotRecipe({
  slots: ['root'],
  base: {
    root: {
      display: { base: 'block', md: 'flex' },
      justifyContent: 'space-between',
      gap: '24px',
      marginInline: { base: '20px', md: '32px', lg: '72px', xl: 'calc((100% - 1296px) / 2)' },
      padding: { base: '14px 0 28px', md: '14px 0 40px 32px', lg: '14px 0 40px 48px' },
      borderTop: '1px solid',
      borderColor: 'rule',
      textStyle: 'margin',
      color: 'ink2',
      '& span': { marginLeft: { md: '12px' }, display: { base: 'block', md: 'inline' } },
    },
  },
});
