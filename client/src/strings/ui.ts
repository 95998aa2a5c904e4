/** Words of the parts that every page shares. */
export const uiStrings = {
  filter: 'Filter',
  copy: 'Copy',
  copied: 'Copied.',
  allColumns: 'Show all columns',
  fewerColumns: 'Show fewer columns',
  nothingMatches: 'No row matches the filter.',
  figure: 'Figure',
  data: 'Data',
  hideData: 'Hide data',
  readingHint: 'Point at a value, or walk the values with the arrow keys.',
  picture: 'the picture',
  skip: 'Skip to the content',
} as const;
