/** Words around every page: masthead, navigation, footer, errors. */
export const appStrings = {
  masthead: {
    home: 'Diffolio, to the sheets',
    main: 'Main',
    find: 'Find a gas pair or substance',
    nightEdition: 'Night edition',
    dayEdition: 'Day edition',
    signIn: 'Sign in',
    signOut: 'Sign out',
    contents: 'Contents',
  },
  navigation: {
    home: 'Home',
    sheets: 'Sheets',
    pairs: 'Pairs',
    series: 'Series',
    substances: 'Substances',
    apiGuide: 'API guide',
    api: 'API',
    people: 'People',
    mail: 'Mail',
  },
  units: {
    menu: 'Units',
    temperature: 'Temperature',
    pressure: 'Pressure',
    diffusivity: 'Diffusivity',
    note: 'Of this page and all others, on this machine. PDF, JSON and CSV keep theirs.',
  },
  footer: {
    invented:
      'Numbers, laboratories and people of a demonstration are invented and say so. Constants of pure substances follow nature.',
    advice: 'data, not advice: see the cautions on each sheet',
  },
  errors: {
    notFoundTitle: 'Not found',
    notFound: 'Nothing stands at this address, or it is not yours to see.',
    toSheets: 'To the sheets',
    failedTitle: 'This page failed',
    failed: 'Something in this page went wrong. What you had saved is safe; load the page again.',
    again: 'Load the page again',
    forbidden: 'Your roles do not open this page.',
  },
} as const;
