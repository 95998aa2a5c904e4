const segment = encodeURIComponent;

/** Every address of the client, built in one place. */
export const paths = {
  catalogue: (search?: string) => (search ? `/?search=${segment(search)}` : '/'),
  sheet: (code: string) => `/sheets/${segment(code)}`,
  version: (code: string, number: string) => `/sheets/${segment(code)}/${segment(number)}`,
  versionFile: (code: string, number: string, format: 'json' | 'csv' | 'pdf') =>
    `/sheets/${segment(code)}/${segment(number)}.${format}`,
  release: (contentHash: string, format: 'json' | 'pdf') => `/releases/${segment(contentHash)}.${format}`,
  signIn: (next?: string) => (next ? `/sign-in?next=${segment(next)}` : '/sign-in'),
  invitation: (token: string) => `/invitation/${segment(token)}`,
  forgottenPassword: () => '/reset-password',
  resetPassword: (token: string) => `/reset-password/${segment(token)}`,
  apiGuide: (code?: string, number?: string) =>
    code ? `/api-guide?sheet=${segment(code)}${number ? `&version=${segment(number)}` : ''}` : '/api-guide',
  explorer: () => '/graphql',
  home: () => '/home',
  substances: (search?: string) => (search ? `/substances?search=${segment(search)}` : '/substances'),
  newSubstance: () => '/substances/new',
  substance: (id: string) => `/substances/${segment(id)}`,
  editSubstance: (id: string) => `/substances/${segment(id)}/edit`,
  pairs: () => '/pairs',
  pair: (id: string) => `/pairs/${segment(id)}`,
  seriesList: () => '/series',
  newSeries: (pairId?: string) => (pairId ? `/bring-in?pair=${segment(pairId)}` : '/bring-in'),
  series: (id: string) => `/series/${segment(id)}`,
  editSeries: (id: string) => `/series/${segment(id)}/edit`,
  fit: (id: string) => `/fits/${segment(id)}`,
  compareFits: (ids: readonly string[]) => `/fits/compare?fits=${ids.map(segment).join(',')}`,
  draftVersion: (fitId: string) => `/fits/${segment(fitId)}/draft`,
  editVersion: (id: string) => `/versions/${segment(id)}/edit`,
  review: (id: string) => `/versions/${segment(id)}/review`,
  releaseVersion: (id: string) => `/versions/${segment(id)}/release`,
  withdrawVersion: (id: string) => `/versions/${segment(id)}/withdraw`,
  people: () => '/people',
  mail: () => '/mail',
  jobs: () => '/jobs',
} as const;

/** An address of this client to go on to, or the fallback: never another site. */
export const safeNext = (next: string | null, fallback: string): string =>
  next !== null && /^\/(?![/\\])/.test(next) ? next : fallback;
