import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { type Actor, done, Group, type Made, problemsOf } from './actors.js';

const CREATE = `mutation ($input: SubstanceInput!) { createSubstance(input: $input) {
  substance { id name casNumber lockVersion synonyms } problems { code path } } }`;
const UPDATE = `mutation ($input: UpdateSubstanceInput!) { updateSubstance(input: $input) {
  substance { id name lockVersion } problems { code path } } }`;
const SEARCH = `query ($search: String, $first: Int, $after: String) { substances(search: $search, first: $first, after: $after) {
  totalCount pageInfo { hasNextPage endCursor } edges { node { name } } } }`;

/** Invented: nobody has met it. CAS RN 999-99-5 has a valid check digit and no meaning. */
const INVENTED = {
  name: 'inventane',
  formula: 'C9H9',
  molarMass: 0.117,
  casNumber: '999-99-5',
  synonyms: ['madeupane'],
};

describe('substances', () => {
  let group: Group;
  let researcher: Actor;

  beforeAll(async () => {
    group = await Group.start();
    researcher = await group.join('researcher', 'RESEARCHER');
  });
  afterAll(() => group.stop());

  const search = async (variables: object) => (await group.visitor.ask(SEARCH, variables))['substances'];
  const names = async (text: string) =>
    ((await search({ search: text, first: 5 }))['edges'] as Made[]).map((edge) => edge['node'].name as string);

  // Names, formulas and CAS RNs of argon, water and carbon dioxide, from memory.
  it.each([
    ['name', 'argon', 'argon'],
    ['name in capitals', 'ARGON', 'argon'],
    ['formula', 'h2o', 'water'],
    ['CAS RN', '124-38-9', 'carbon dioxide'],
    ['beginning of a CAS RN', '124-38', 'carbon dioxide'],
    ['name with blanks around', '  water ', 'water'],
  ])('are found by %s, best first', async (_, text, name) => {
    expect((await names(text))[0]).toBe(name);
  });

  it('are found by no pattern but by what they are called', async () => {
    expect(await names('%')).toEqual([]);
    expect(await names('a_gon')).toEqual([]);
  });

  it('come in pages: all of the library, by name, none twice', async () => {
    const found: string[] = [];
    let after: string | null = null;
    let page: Made;
    do {
      page = await search({ first: 30, after });
      found.push(...(page['edges'] as Made[]).map((edge) => edge['node'].name as string));
      after = page['pageInfo'].endCursor;
    } while (page['pageInfo'].hasNextPage);
    expect(found).toHaveLength(page['totalCount']);
    expect(new Set(found).size).toBe(found.length);
    expect(found.length).toBeGreaterThanOrEqual(40);
    expect(await search({ first: 0 })).toMatchObject({ edges: [], totalCount: found.length });
    expect(await group.visitor.codeOf(SEARCH, { first: 101 })).toBe('BAD_USER_INPUT');
  });

  it('are made and changed by researchers, and an older view changes nothing', async () => {
    const made = await done(researcher, CREATE, { input: INVENTED });
    expect(made).toMatchObject({ name: 'inventane', casNumber: '999-99-5', lockVersion: 1 });
    expect(await names('madeupane')).toEqual(['inventane']);
    const input = { ...INVENTED, id: made['id'], lockVersion: 1, name: 'inventene' };
    expect(await done(researcher, UPDATE, { input })).toMatchObject({ name: 'inventene', lockVersion: 2 });
    expect(await researcher.codeOf(UPDATE, { input: { ...input, name: 'inventyne' } })).toBe('CONFLICT');
    expect(await researcher.codeOf(UPDATE, { input: { ...input, id: 'nothing' } })).toBe('NOT_FOUND');
  });

  it.each([
    ['a name that is taken, in other letters', { name: 'Argon' }, 'DUPLICATE name'],
    ['a CAS RN that is taken', { casNumber: '7440-37-1' }, 'DUPLICATE casNumber'],
    ['a wrong check digit', { casNumber: '7440-37-2' }, 'BAD_INPUT casNumber'],
    ['no name', { name: ' ' }, 'BAD_INPUT name'],
    ['no formula', { formula: '' }, 'BAD_INPUT formula'],
    ['a molar mass in g/mol', { molarMass: 39.948 }, 'BAD_INPUT molarMass'],
    ['no molar mass', { molarMass: 0 }, 'BAD_INPUT molarMass'],
  ])('are refused with %s', async (_, fault, expected) => {
    const input = { ...INVENTED, name: 'another', casNumber: null, ...fault };
    expect(await problemsOf(researcher, CREATE, { input })).toEqual([expected]);
  });

  it('are made by nobody without the role', async () => {
    const modeller = await group.join('modeller', 'MODELLER');
    expect(await modeller.codeOf(CREATE, { input: INVENTED })).toBe('FORBIDDEN');
    expect(await group.visitor.codeOf(CREATE, { input: INVENTED })).toBe('UNAUTHENTICATED');
  });
});
