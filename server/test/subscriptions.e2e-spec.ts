import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { SubscriptionsService } from '../src/subscriptions/subscriptions.service.js';
import { codeOf, RunningServer, type SignedIn } from './running-server.js';

const SUBSCRIBE = `mutation ($id: ID!) {
  subscribeToSheet(sheetId: $id) { subscription { sheetId since } problems { code } }
}`;
const UNSUBSCRIBE = `mutation ($id: ID!) {
  unsubscribeFromSheet(sheetId: $id) { subscription { sheetId } problems { code } }
}`;

describe('following a sheet', () => {
  let server: RunningServer;
  let modeller: SignedIn;
  let sheetId: string;
  const subscribers = () =>
    server.app.get(SubscriptionsService, { strict: false }).subscribersOf(server.dataSource.manager, sheetId);

  beforeAll(async () => {
    server = await RunningServer.start();
    await server.addPerson('modeller@group.example', 'MODELLER');
    modeller = await server.signIn('modeller@group.example');
    const [row] = await server.sql<{ id: string }>(
      `WITH s AS (INSERT INTO substances (name, formula, molar_mass_kg_mol)
                  VALUES ('one gas', 'X', 0.01), ('another gas', 'Y', 0.02) RETURNING id),
            p AS (INSERT INTO gas_pairs (first_id, second_id) SELECT min(id::text)::uuid, max(id::text)::uuid FROM s RETURNING id)
       INSERT INTO data_sheets (pair_id) SELECT id FROM p RETURNING id`,
    );
    sheetId = row!.id;
  });
  afterAll(() => server.stop());

  it('begins once, however often it is asked for, and ends', async () => {
    const first = await server.ask(SUBSCRIBE, { id: sheetId }, modeller.accessToken);
    const second = await server.ask(SUBSCRIBE, { id: sheetId }, modeller.accessToken);
    expect(first.data!.subscribeToSheet).toEqual({
      subscription: { sheetId, since: expect.any(String) },
      problems: [],
    });
    expect(second.data).toEqual(first.data);
    expect((await server.ask('{ subscriptions { sheetId } }', {}, modeller.accessToken)).data!.subscriptions).toEqual([
      { sheetId },
    ]);
    expect(await subscribers()).toEqual([
      { personId: modeller.personId, email: 'modeller@group.example', name: 'modeller' },
    ]);

    const ended = await server.ask(UNSUBSCRIBE, { id: sheetId }, modeller.accessToken);
    expect(ended.data!.unsubscribeFromSheet).toEqual({ subscription: { sheetId }, problems: [] });
    expect(await subscribers()).toEqual([]);
    const again = await server.ask(UNSUBSCRIBE, { id: sheetId }, modeller.accessToken);
    expect(again.data!.unsubscribeFromSheet).toEqual({ subscription: null, problems: [{ code: 'WRONG_STATE' }] });
  });

  it('needs a person and a sheet', async () => {
    expect(codeOf(await server.ask(SUBSCRIBE, { id: sheetId }))).toBe('UNAUTHENTICATED');
    expect(codeOf(await server.ask('{ subscriptions { sheetId } }'))).toBe('UNAUTHENTICATED');
    expect(codeOf(await server.ask(SUBSCRIBE, { id: crypto.randomUUID() }, modeller.accessToken))).toBe('NOT_FOUND');
    expect(codeOf(await server.ask(SUBSCRIBE, { id: 'DS-0001' }, modeller.accessToken))).toBe('NOT_FOUND');
  });

  it('tells nobody who is disabled', async () => {
    await server.ask(SUBSCRIBE, { id: sheetId }, modeller.accessToken);
    await server.sql('UPDATE people SET disabled_at = now() WHERE id = $1', [modeller.personId]);
    expect(await subscribers()).toEqual([]);
  });
});
