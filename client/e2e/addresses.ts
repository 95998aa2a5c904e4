import { type APIRequestContext } from '@playwright/test';
import { DEMO_PASSWORD, type DemoAccount, emailOf } from './visitors';

const EVERYONE = ['/', '/sign-in', '/reset-password', '/api-guide', '/substances', '/nowhere'];
const MEMBERS = ['/home', '/pairs', '/series', '/bring-in', '/substances/new'];

const FIRST_OF_EACH = `
  query FirstOfEach {
    substances(search: "ethanol", first: 1) { edges { node { id } } }
    dataSheets(first: 100) { edges { node { code pair { id } versions { id number status } } } }
  }`;

const WORK_OF_A_PAIR = `
  query WorkOfAPair($id: ID!) {
    node(id: $id) { ... on GasPair { series(first: 1) { edges { node { id } } } fits { id } } }
  }`;

interface Sheet {
  readonly code: string;
  readonly pair: { readonly id: string };
  readonly versions: readonly { readonly id: string; readonly number: string; readonly status: string }[];
}

/** Addresses that a person of the demo can open and those before could not, one of each kind; versions in each state. */
export async function findAddresses(request: APIRequestContext, account: DemoAccount | null): Promise<string[]> {
  const ask = await asking(request, account);
  const { substances, dataSheets } = await ask(FIRST_OF_EACH, {});
  const sheets: Sheet[] = dataSheets.edges.map(({ node }: { node: Sheet }) => node);
  const substance = `/substances/${substances.edges[0].node.id}`;
  const versions = sheets.flatMap(({ code, versions: all }) => all.map((version) => ({ ...version, code })));
  const inState = (...states: string[]) =>
    states.flatMap((state) => versions.find(({ status }) => status === state) ?? []);
  const shown = inState('RELEASED', 'SUPERSEDED', 'WITHDRAWN').map(({ code, number }) => `/sheets/${code}/${number}`);
  const open = [...EVERYONE, substance, ...shown];
  if (account === null) return open;
  if (account === 'administrator') return ['/home', '/people', '/mail', '/jobs'];

  const pairId = sheets[0]?.pair.id ?? '';
  const { node } = await ask(WORK_OF_A_PAIR, { id: pairId });
  const fits: string[] = node.fits.map(({ id }: { id: string }) => id);
  const series: string = node.series.edges[0].node.id;
  const work = [
    ...MEMBERS,
    `${substance}/edit`,
    `/pairs/${pairId}`,
    `/bring-in?pair=${pairId}`,
    `/series/${series}`,
    `/fits/${fits[0]}`,
    `/fits/compare?fits=${fits.slice(0, 2).join(',')}`,
  ];
  if (account === 'researcher') return work;
  const reviewed = inState('IN_REVIEW').map(({ id }) => `/versions/${id}/review`);
  const released = inState('APPROVED').map(({ id }) => `/versions/${id}/release`);
  if (account === 'editor2') return ['/home', ...reviewed, ...released];
  const edited = inState('DRAFT', 'RETURNED').map(({ id }) => `/versions/${id}/edit`);
  const withdrawn = inState('RELEASED').map(({ id }) => `/versions/${id}/withdraw`);
  return ['/home', `/series/${series}`, `/fits/${fits[0]}/draft`, ...edited, ...withdrawn];
}

/** Asks GraphQL as a person of the demo, or as nobody. */
async function asking(request: APIRequestContext, account: DemoAccount | null) {
  const headers: Record<string, string> = {};
  if (account !== null) {
    const answer = await request.post('/api/auth/sign-in', {
      data: { email: emailOf(account), password: DEMO_PASSWORD },
    });
    const { accessToken } = await answer.json();
    headers['Authorization'] = `Bearer ${accessToken}`;
  }
  return async (query: string, variables: object) => {
    const answer = await request.post('/graphql', { headers, data: { query, variables } });
    const { data, errors } = await answer.json();
    if (errors) throw new Error(JSON.stringify(errors));
    return data;
  };
}
