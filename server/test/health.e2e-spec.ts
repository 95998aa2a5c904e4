import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import request from 'supertest';
import { StorageService } from '../src/storage/storage.service.js';
import { startTestApp, type TestApp } from './app.js';

describe('the health of the server', () => {
  let testApp: TestApp;

  beforeAll(async () => {
    testApp = await startTestApp();
  });

  afterAll(() => testApp.close());

  it('is alive and ready with database and file storage', async () => {
    const server = testApp.app.getHttpServer();
    expect((await request(server).get('/health/live')).body).toEqual({ status: 'ok' });
    const ready = await request(server).get('/health/ready');
    expect(ready.status).toBe(200);
    expect(ready.body.info).toEqual({ database: { status: 'up' }, storage: { status: 'up' } });
  });

  it('says what is down with 503', async () => {
    const storage = testApp.app.get(StorageService);
    const ping = storage.ping.bind(storage);
    storage.ping = () => Promise.reject(new Error('unreachable'));
    const response = await request(testApp.app.getHttpServer()).get('/health/ready');
    storage.ping = ping;
    expect(response.status).toBe(503);
    expect(JSON.stringify(response.body)).toContain('storage');
    expect(response.headers['content-type']).toContain('application/problem+json');
  });
});
